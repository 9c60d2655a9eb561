import type { DesignValue, Point, RuleDefinition } from '../../contract'
import { pathLength } from '../../geometry'
import { length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { solveBetween } from '../../pen/solve'
import { bandOf } from './band'
import { droppedHem } from './dropped-hem'
import { setIn } from './set-in'
import type { SetInKind, Sleeve, SleeveCorners } from './sleeve-kind'

const worn = { id: 'sleeve', is: ['puff'] }

/** Common practice, no published source: spread 5–10 cm in all, head raised 2.5–5, hem dropped 1.5–2, band 2–3 of ease. */
const design: readonly DesignValue[] = [
  length('puffUnder', 'Puff below the underarm', 'sleeve', { default: 90, min: 70, max: 200 }, worn),
  length('puffSpread', 'Spread of the puff', 'sleeve', { default: 80, min: 50, max: 100 }, worn),
  length('puffRaise', 'Head raised by', 'sleeve', { default: 40, min: 25, max: 50 }, worn),
  length('puffDrop', 'Hem dropped by', 'sleeve', { default: 18, min: 15, max: 20 }, worn),
  length('puffBandEase', 'Ease of the arm band', 'sleeve', { default: 25, min: 20, max: 40 }, worn),
  length('puffBandDepth', 'Arm band, finished depth', 'sleeve', { default: 25, min: 15, max: 40 }, worn),
]

const rules: readonly RuleDefinition[] = [
  lengthRule('puffLength', 'Puff sleeve: length', 'headHeight + puffUnder'),
  lengthRule('puffHalf', 'Puff: spread of each half', 'puffSpread / 2'),
  lengthRule('frontPuffEase', 'Gathers in the front', 'frontHeadEase + puffSpread * 0.5 + puffRaise * 0.6'),
  lengthRule('backPuffEase', 'Gathers in the back', 'backHeadEase + puffSpread * 0.5 + puffRaise * 0.6'),
  lengthRule('puffBand', 'Arm band', 'upperArm + puffBandEase'),
  lengthRule('puffBandFold', 'Arm band, cut depth', 'puffBandDepth * 2'),
  lengthRule('puffGather', 'Gathers into the arm band', 'biceps + puffSpread - puffBand'),
]

const kind: SetInKind = {
  length: 'puffLength',
  lengthField: 'puffUnder',
  ease: { front: 'frontPuffEase', back: 'backPuffEase' },
  join: 'gathered',
  hem: 'gathered',
  blame: {
    field: 'puffSpread',
    head: 'The head of this puff cannot be drawn to the gathers that it is to have. Spread it less or raise it more.',
    hem: 'The hem of this puff cannot be drawn to the length that its band gathers. Spread it more.',
  },
  corners: spreadAlike,
  finish: (pen) =>
    bandOf(pen, { length: 'puffBand', depth: 'puffBandDepth', fold: 'puffBandFold', gather: 'puffGather' }),
}

/** A puff sleeve: spread evenly from the head to the hem, its head raised, gathered into the armhole and into a band. */
export const puff: Sleeve = { design, rules, turnedUp: false, draw: setIn(kind) }

/** Where the five cuts stand: at the centre and two each side, shares of that side's girth. Common practice. */
const cuts = [-0.44, -0.22, 0, 0.22, 0.44]

function spreadAlike(pen: Pen, sleeve: PiecePen): SleeveCorners {
  const names = ['puffHalf', 'biceps', 'puffLength']
  const across = ['frontUnderarm', 'backUnderarm', 'hemLevel']
  const hem = sleeve.at('hemLevel').y
  const each = (2 * pen.length('puffHalf')) / cuts.length
  cuts.forEach((share, index) => {
    const girth = Math.abs(sleeve.at(share < 0 ? 'backUnderarm' : 'frontUnderarm').x)
    const left = share * girth + (index - cuts.length / 2) * each
    const say = `Cut ${index + 1}: from the head to the hem, with the grain; move the strips apart alike above and below`
    sleeve.place(
      `cut${index + 1}Left`,
      { x: left, y: hem },
      { say, uses: names, through: across, stepKind: 'turn' },
    )
    sleeve.place(
      `cut${index + 1}Right`,
      { x: left + each, y: hem },
      { say: 'Its other side', uses: names, through: across, stepKind: 'turn' },
    )
  })
  sleeve.go('raisedCrown', 'crown', 'up', 'puffRaise', { say: 'Raise the head', drag: ['puffRaise'] })
  sleeve.go('frontSpread', 'frontUnderarm', 'right', 'puffHalf', {
    say: 'The front underarm has moved out by half the spread',
    drag: ['puffSpread'],
  })
  sleeve.go('backSpread', 'backUnderarm', 'left', 'puffHalf', {
    say: 'The back underarm has moved out by half the spread',
  })
  sleeve.go('droppedHem', 'hemLevel', 'down', 'puffDrop', {
    say: 'Drop the hem in the middle, so that it can fall over the band',
    drag: ['puffDrop'],
  })
  const wanted = pen.lengthRounded('puffBand', 'up') + pen.value('puffGather')
  const ends = (taper: number): readonly [Point, Point] => [
    { x: sleeve.at('frontSpread').x - taper, y: hem },
    { x: sleeve.at('backSpread').x + taper, y: hem },
  ]
  const over = (taper: number): number =>
    pathLength(droppedHem(...ends(taper), sleeve.at('droppedHem'))) - wanted
  const taper = solveBetween(over, -20, 60, 1e-9)
  if (taper === undefined)
    pen.refuse({ field: kind.blame.field, code: 'impossible-shape', message: kind.blame.hem })
  const [front, back] = ends(taper)
  const options = {
    say: 'Come in at the hem until it has the length that the band gathers',
    uses: ['puffBand', 'puffGather', 'puffDrop'],
    through: ['frontSpread', 'backSpread', 'droppedHem'],
    stepKind: 'solve',
  } as const
  sleeve.place('frontHem', front, options)
  sleeve.place('backHem', back, options)
  pen.tag({ piece: 'sleeve', from: 'crown', to: 'raisedCrown', label: 'Raised', value: 'puffRaise' })
  pen.tag({ piece: 'sleeve', from: 'hemLevel', to: 'droppedHem', label: 'Hem dropped', value: 'puffDrop' })
  return {
    crown: 'raisedCrown',
    front: 'frontSpread',
    back: 'backSpread',
    frontHem: 'frontHem',
    backHem: 'backHem',
  }
}
