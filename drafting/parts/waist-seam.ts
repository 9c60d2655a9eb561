import type { Run } from '../contract'
import { nothing, type Mask } from '../pen/masks'
import type { Pen } from '../pen/pen'
import type { Bodice } from './bodice'
import { gatheringRule } from './skirts/gathered'
import { placesAround } from './skirts/seams'
import type { DrawnSkirt, SewnTo, UpperHalf } from './skirts/skirt'

const turned = (runs: readonly Run[]): Run[] =>
  [...runs].reverse().map((run) => ({ ...run, reversed: !run.reversed }))
const other = (runs: readonly Run[]): Run[] => runs.map((run) => ({ ...run, mirrored: true }))

/** Length of a run's edge, and what it follows from. */
function edgeOf(pen: Pen, { piece, edge }: Run): { readonly length: number; readonly uses: Mask } {
  const drawn = pen.pieces.find((one) => one.id === piece)
  if (!drawn) throw new Error(`The bodice has no piece “${piece}”.`)
  return { length: drawn.lengthOf(edge), uses: drawn.edge(edge).uses }
}

/** The waist of a drawn bodice as a skirt needs it: the length of each half, and where its darts and seams end. */
export function waistToMeet(pen: Pen, { front, back }: Bodice): SewnTo {
  const half = (runs: readonly Run[]): UpperHalf => {
    const joints: number[] = []
    let length = 0
    for (const run of runs) {
      if (length > 0) joints.push(length)
      length += edgeOf(pen, run).length
    }
    return { length, joints }
  }
  const uses = [...front.waist, ...back.waist].reduce((mask, run) => mask | edgeOf(pen, run).uses, nothing)
  return { front: half(front.waist), back: half(back.waist), uses }
}

/** Darts nearer than this along the seam stand below each other, mm. */
const together = 0.4

/**
 * Sews a skirt to the waist of a bodice. Sides and centre front meet, and the darts of one those of the other where they stand
 * below each other; a gathered skirt is gathered evenly between them.
 */
export function sewWaist(
  pen: Pen,
  { front, back }: Bodice,
  sewnTo: SewnTo,
  skirt: DrawnSkirt,
  gathered: boolean,
): void {
  const ofBodice = placesAround(sewnTo.front, sewnTo.back)
  const matches = skirt.places
    .flatMap(({ key, at }) => {
      const meets = ofBodice.find((place) => place.key === key)
      const dart = /\d$/.test(key)
      return meets && (gathered || !dart || Math.abs(meets.at - at) < together)
        ? [{ a: at, b: meets.at }]
        : []
    })
    .sort((one, next) => one.a - next.a)
  pen.sew({
    id: 'waist',
    name: 'Waist seam',
    a: skirt.waist,
    b: [...back.waist, ...turned(front.waist), ...other(front.waist), ...other(turned(back.waist))],
    matches,
    ...(gathered ? { join: 'gathered' as const, easeFrom: gatheringRule(pen) } : {}),
  })
}
