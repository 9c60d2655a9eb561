import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { smoothEase, type SleeveCorners, type SleeveKind } from './sleeve-kind'

/** A plain sleeve: each side comes in by the taper. */
export const plain: SleeveKind = {
  length: 'sleeveLength',
  lengthField: 'sleeveLength',
  ease: smoothEase,
  join: 'eased',
  hem: 'sweep',
  blame: {
    field: 'sleeveTaper',
    head: 'So much taper twists the sleeve head until it no longer fits its armhole. Taper less.',
    hem: 'The hem of this sleeve cannot be drawn in one sweep. Spread or taper it less.',
  },
  corners: taper,
}

function taper(pen: Pen, sleeve: PiecePen): SleeveCorners {
  const girth = Math.min(pen.length('frontGirth'), pen.length('backGirth')) - 55
  const narrowest = Math.max(0, Math.min(girth, pen.value('underarmLength') * 0.4))
  if (pen.length('sleeveTaper') > narrowest) {
    pen.refuse({
      field: 'sleeveTaper',
      code: 'impossible-shape',
      message: `So much taper is too much for this sleeve. Take in at most ${pen.say(narrowest)} a side.`,
      max: narrowest,
    })
  }
  for (const side of ['front', 'back'] as const) {
    sleeve.square(`${side}HemSquare`, `${side}Underarm`, 'hemLevel', {
      say: `Square down from the ${side} underarm to the hem`,
    })
    sleeve.go(`${side}Hem`, `${side}HemSquare`, side === 'front' ? 'left' : 'right', 'sleeveTaper', {
      say: 'Come in by the taper',
      drag: ['sleeveTaper'],
    })
  }
  pen.tag({ piece: 'sleeve', from: 'frontHem', to: 'frontHemSquare', label: 'Taper', value: 'sleeveTaper' })
  return {
    crown: 'crown',
    front: 'frontUnderarm',
    back: 'backUnderarm',
    frontHem: 'frontHem',
    backHem: 'backHem',
  }
}
