import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import type { SleeveCorners } from './sleeve-kind'

/** Brings both sides of a straight sleeve in at the hem by a style value, or as far as its girth and length allow. */
export const taperBy =
  (by: string) =>
  (pen: Pen, sleeve: PiecePen): SleeveCorners => {
    const girth = Math.min(pen.length('frontGirth'), pen.length('backGirth')) - 55
    const narrowest = Math.max(0, Math.min(girth, pen.value('underarmLength') * 0.4))
    const tooMuch = pen.length(by) > narrowest
    if (tooMuch) {
      pen.find('taperMost', narrowest, pen.usesOf([by, 'frontGirth', 'backGirth', 'underarmLength']))
      pen.caution(
        'taper-lessened',
        `So much taper is too much for this sleeve: each side comes in ${pen.say(narrowest)}.`,
        by,
      )
    }
    for (const side of ['front', 'back'] as const) {
      sleeve.square(`${side}HemSquare`, `${side}Underarm`, 'hemLevel', {
        say: `Square down from the ${side} underarm to the hem`,
      })
      sleeve.go(
        `${side}Hem`,
        `${side}HemSquare`,
        side === 'front' ? 'left' : 'right',
        tooMuch ? 'taperMost' : by,
        {
          say: 'Come in by the taper',
          drag: [by],
        },
      )
    }
    pen.tag({ piece: 'sleeve', from: 'frontHem', to: 'frontHemSquare', label: 'Taper', value: by })
    return {
      crown: 'crown',
      front: 'frontUnderarm',
      back: 'backUnderarm',
      frontHem: 'frontHem',
      backHem: 'backHem',
    }
  }

/** Where a tapered sleeve cannot be drawn. */
export const taperBlame = (field: string) => ({
  field,
  head: 'So much taper twists the sleeve head until it no longer fits its armhole. Taper less.',
  hem: 'The hem of this sleeve cannot be drawn in one sweep. Taper it less.',
})
