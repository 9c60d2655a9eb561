import type { DesignValue, Point, RuleDefinition } from '../../contract'
import { pathLength } from '../../geometry'
import { length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { solveBetween } from '../../pen/solve'
import { fanOut } from '../slash-and-spread'
import { cuffOf } from './cuff'
import { flip, squareTo } from './draw-sleeve'
import { dippedHem } from './dropped-hem'
import { setIn } from './set-in'
import { smoothEase, type SetInKind, type Sleeve, type SleeveCorners } from './sleeve-kind'

const worn = { id: 'sleeve', is: ['bishop'] }

/** Common practice, no published source: four cuts, 15–25 cm in all and more behind, the hem 2–3 cm lower at the back. */
const design: readonly DesignValue[] = [
  length('bishopFront', 'Spread at each cut in front', 'sleeve', { default: 38, min: 25, max: 45 }, worn),
  length('bishopBack', 'Spread at each cut behind', 'sleeve', { default: 52, min: 45, max: 65 }, worn),
  length(
    'bishopBlouse',
    'Longer than the arm, to fall over',
    'sleeve',
    { default: 30, min: 10, max: 60 },
    worn,
  ),
  length('bishopDip', 'Hem lower at the back', 'sleeve', { default: 25, min: 15, max: 35 }, worn),
  length('cuffDepth', 'Cuff, finished depth', 'sleeve', { default: 50, min: 30, max: 80 }, worn),
  length('cuffEase', 'Ease of the cuff', 'sleeve', { default: 25, min: 15, max: 50 }, worn),
  length('cuffLap', 'Lap of the cuff', 'sleeve', { default: 20, min: 15, max: 30 }, worn),
  length('cuffSlit', 'Slit above the cuff', 'sleeve', { default: 75, min: 60, max: 100 }, worn),
]

const rules: readonly RuleDefinition[] = [
  lengthRule(
    'bishopLength',
    'Bishop sleeve: length without its cuff',
    'armLength - cuffDepth + bishopBlouse',
  ),
  lengthRule('cuffRound', 'Cuff without its lap', 'wrist + cuffEase'),
  lengthRule('cuffFold', 'Cuff, cut depth', 'cuffDepth * 2'),
  lengthRule('bishopGather', 'Gathers into the cuff', 'biceps + (bishopFront + bishopBack) * 2 - cuffRound'),
]

const kind: SetInKind = {
  length: 'bishopLength',
  lengthField: 'bishopBlouse',
  ease: smoothEase,
  join: 'eased',
  hem: 'dipped',
  blame: {
    field: 'bishopFront',
    head: 'So much spread flattens the sleeve head until it no longer fits its armhole. Spread the cuts less.',
    hem: 'The hem of this sleeve cannot be drawn to the length that its cuff gathers. Spread the cuts alike.',
  },
  corners: (pen, sleeve, head) => {
    const fan = fanOut(pen, sleeve, head, {
      cuts: 4,
      spread: 'bishopFront',
      backSpread: 'bishopBack',
      length: 'bishopLength',
    })
    return gatherable(pen, sleeve, fan)
  },
  finish: (pen, sleeve) => {
    const hem = sleeve.edge('hem')
    const [toSlit] = hem.path.segments
    if (toSlit) cuffOf(pen, sleeve, pathLength({ closed: false, segments: [toSlit] }))
  },
}

/** A bishop sleeve: spread at the hem and more behind, where it dips, and gathered into a cuff that laps over a slit. */
export const bishop: Sleeve = { design, rules, turnedUp: false, draw: setIn(kind) }

/** Brings both ends of the hem in until it is as long as its cuff and the gathers, its lowest point at the back quarter. */
function gatherable(pen: Pen, sleeve: PiecePen, fan: SleeveCorners): SleeveCorners {
  const seam = { front: sleeve.at(fan.front), back: flip(sleeve.at(fan.back)) }
  const foot = { front: sleeve.at(fan.frontHem), back: flip(sleeve.at(fan.backHem)) }
  const wanted = pen.lengthRounded('cuffRound', 'up') + pen.value('bishopGather')
  const middle = (sleeve.at('cut2Left').x + sleeve.at('cut1Right').x) / 2
  const lowest = { x: middle, y: sleeve.at('hemLevel').y + pen.length('bishopDip') }
  const moved = (side: 'front' | 'back', by: number): Point => {
    const out = squareTo(seam[side], foot[side])
    return { x: foot[side].x - out.x * by, y: foot[side].y - out.y * by }
  }
  const over = (by: number): number => {
    const [front, back] = [moved('front', by), moved('back', by)]
    const [ahead, behind] = [squareTo(seam.front, front), squareTo(seam.back, back)]
    const inwards = { x: -ahead.x, y: -ahead.y }
    return pathLength(dippedHem(front, inwards, lowest, flip(back), { x: -behind.x, y: behind.y })) - wanted
  }
  const taper = solveBetween(over, -40, 100, 1e-9)
  if (taper === undefined)
    pen.refuse({ field: kind.blame.field, code: 'impossible-shape', message: kind.blame.hem })
  const names = ['cuffRound', 'bishopGather', 'bishopDip', 'bishopLength']
  const through = [fan.front, fan.back, fan.frontHem, fan.backHem]
  sleeve.place('droppedHem', lowest, {
    say: 'At the back quarter drop the hem, so that it falls over the cuff behind',
    uses: names,
    through: [...through, 'cut1Right', 'cut2Left'],
    drag: ['bishopDip'],
  })
  const options = {
    say: 'Come in at the hem until it has the length that the cuff gathers',
    uses: names,
    through: [...through, 'droppedHem'],
    stepKind: 'solve',
  } as const
  sleeve.place('frontHem', moved('front', taper), options)
  sleeve.place('backHem', flip(moved('back', taper)), options)
  return { ...fan, frontHem: 'frontHem', backHem: 'backHem' }
}
