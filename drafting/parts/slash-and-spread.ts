import type { Point } from '../contract'
import {
  applyTo,
  compose,
  identity,
  intersections,
  rotation,
  transformPath,
  type Transform,
} from '../geometry'
import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'
import { backFullness, frontFullness } from './sleeve-head'
import { fitHead } from './solve-head'
import type { Halves, SleeveCorners } from './sleeves/sleeve-kind'

/** How near to the underarm a cut may come: nearer, the flare would hang under the arm. Common practice. */
const clearOfUnderarm = 35

/**
 * Cuts a sleeve from the hem up to the stitch line of its head, with the grain, and spreads each cut at the hem: the strips
 * turn about the ends of the cuts, the middle one stays on the grain.
 *
 * @param by the number of cuts or its name, and the names of the spread of each, of the spread of those behind where it is
 *   another, and of the length of the sleeve.
 * @returns the ids of the corners after spreading.
 */
export function fanOut(
  pen: Pen,
  sleeve: PiecePen,
  head: Halves,
  by: {
    readonly cuts: string | number
    readonly spread: string
    readonly backSpread?: string
    readonly length: string
  },
): SleeveCorners {
  const cuts = typeof by.cuts === 'number' ? by.cuts : Math.round(pen.value(by.cuts))
  const hem = sleeve.at('hemLevel').y
  const front = sleeve.at('frontUnderarm')
  const back = sleeve.at('backUnderarm')
  const places = cutPlaces(cuts, back.x + clearOfUnderarm, front.x - clearOfUnderarm)
  const hinges = places.map((x) => hingeAt(x, sleeve, head))
  const shortest = Math.min(...hinges.map((hinge) => hem - hinge.y))
  const spreadBy = (index: number): string =>
    by.backSpread !== undefined && index < cuts / 2 ? by.backSpread : by.spread
  const spreads = places.map((_, index) => pen.length(spreadBy(index)))
  const tooWide = spreads.findIndex((spread) => spread > shortest)
  if (tooWide >= 0) {
    pen.refuse({
      field: spreadBy(tooWide),
      code: 'impossible-shape',
      message: `Each cut is only ${pen.say(shortest)} long: spread it less than that, or lengthen the sleeve.`,
      max: shortest,
    })
  }
  const angles = hinges.map(
    (hinge, index) => (2 * Math.asin((spreads[index] as number) / 2 / (hem - hinge.y)) * 180) / Math.PI,
  )
  const turns = stripTurns(hinges, angles)

  const names = [
    by.spread,
    ...(by.backSpread === undefined ? [] : [by.backSpread]),
    ...(typeof by.cuts === 'string' ? [by.cuts] : []),
    by.length,
    'biceps',
    'frontHeadEase',
    'backHeadEase',
  ]
  const through = ['frontUnderarm', 'backUnderarm', 'hemLevel']
  places.forEach((x, index) => {
    const foot = { x, y: hem }
    const left = applyTo(turns[index] as Transform, foot)
    const right = applyTo(turns[index + 1] as Transform, foot)
    sleeve.place(`cut${index + 1}Left`, left, {
      say: `Cut ${index + 1}: from the hem up to the stitching line of the head, not through it`,
      uses: names,
      through,
      stepKind: 'turn',
    })
    sleeve.turnOpen(`cut${index + 1}Right`, `cut${index + 1}Left`, right, {
      say: 'Spread the cut at the hem',
      by: spreadBy(index),
      length: spreads[index] as number,
      uses: names,
      through,
      draws: transformPath(turns[index] as Transform, straight(hinges[index] as Point, foot)),
      ...(index === cuts - 1 ? { drag: [by.spread] } : {}),
      ...(index === 0 && by.backSpread !== undefined ? { drag: [by.backSpread] } : {}),
    })
  })
  pen.tag({
    piece: 'sleeve',
    from: `cut${cuts}Left`,
    to: `cut${cuts}Right`,
    label: 'Spread',
    value: by.spread,
  })
  if (by.backSpread !== undefined) {
    pen.tag({
      piece: 'sleeve',
      from: 'cut1Left',
      to: 'cut1Right',
      label: 'Spread behind',
      value: by.backSpread,
    })
  }
  const corner = (id: string, at: Point, turn: Transform, say: string): string => {
    sleeve.place(id, applyTo(turn, at), { say, uses: names, through, stepKind: 'turn' })
    return id
  }
  const first = turns[0] as Transform
  const last = turns[cuts] as Transform
  return {
    crown: 'crown',
    front: corner('frontUnderarmSpread', front, last, 'Mark the front underarm where it has turned to'),
    back: corner('backUnderarmSpread', back, first, 'Mark the back underarm where it has turned to'),
    frontHem: corner(
      'frontHemSpread',
      { x: front.x, y: hem },
      last,
      'Mark the front hem where it has turned to',
    ),
    backHem: corner(
      'backHemSpread',
      { x: back.x, y: hem },
      first,
      'Mark the back hem where it has turned to',
    ),
  }
}

/** Evenly between two limits, each cut in the middle of its strip. */
function cutPlaces(cuts: number, from: number, to: number): number[] {
  return Array.from({ length: cuts }, (_, index) => from + ((index + 0.5) / cuts) * (to - from))
}

/** The point of the unspread head straight above a cut. */
function hingeAt(x: number, sleeve: PiecePen, head: Halves): Point {
  const onFront = x >= 0
  const half = onFront
    ? fitHead({ x: 0, y: 0 }, sleeve.at('frontUnderarm'), { x: 1, y: 0 }, head.front, frontFullness)
    : fitHead(
        { x: 0, y: 0 },
        { x: -sleeve.at('backUnderarm').x, y: sleeve.at('backUnderarm').y },
        { x: 1, y: 0 },
        head.back,
        backFullness,
      )
  const deep = sleeve.at('hemLevel').y
  const met =
    half && intersections(half, straight({ x: Math.abs(x), y: -10 }, { x: Math.abs(x), y: deep }))[0]
  return { x, y: met ? met.point.y : 0 }
}

/**
 * How each strip turns, from the back to the front: the middle strip stays, or, with an odd number of cuts, the middle cut
 * opens alike to both sides, so that the grain halves it. Each strip farther out turns with its neighbour and then about the
 * hinge between them.
 */
function stripTurns(hinges: readonly Point[], angles: readonly number[]): Transform[] {
  const cuts = hinges.length
  const turns: Transform[] = new Array<Transform>(cuts + 1)
  const odd = cuts % 2 === 1
  const middle = Math.floor(cuts / 2)
  if (odd) {
    const hinge = hinges[middle] as Point
    const half = (angles[middle] as number) / 2
    turns[middle] = rotation(half, hinge)
    turns[middle + 1] = rotation(-half, hinge)
  } else {
    turns[middle] = identity
  }
  for (let strip = odd ? middle + 2 : middle + 1; strip <= cuts; strip += 1) {
    const before = turns[strip - 1] as Transform
    turns[strip] = compose(before, rotation(-(angles[strip - 1] as number), hinges[strip - 1] as Point))
  }
  for (let strip = middle - 1; strip >= 0; strip -= 1) {
    const before = turns[strip + 1] as Transform
    turns[strip] = compose(before, rotation(angles[strip] as number, hinges[strip] as Point))
  }
  return turns
}
