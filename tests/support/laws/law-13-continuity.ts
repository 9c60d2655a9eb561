import type { Draft, DraftOrder, Path, Point } from '@/drafting/contract'
import { mix } from './curves'
import { garmentOf, offers, styleOf } from './formulas'
import { Chain } from './outline'
import { chordsOf } from './curves'
import { drafted, withMeasurement, withStyle } from './redraft'
import { Findings, type OrderLaw } from './violation'

/** No point moves farther than this when a length changes by a tenth of a millimetre. */
const farthest = 5
const change = 0.1

/** A length changed by a tenth of a millimetre moves no point of any piece by more than 5 mm. */
export const continuity: OrderLaw = (order, engine) => {
  const found = new Findings(13)
  const quiet: DraftOrder = { ...order, explain: false }
  const before = drafted(quiet, engine)
  if (!before) return found.all
  const garment = garmentOf(order, engine.garments)
  for (const id of [...garment.needs, ...garment.estimates]) {
    const mm = order.measurements[id]
    if (mm === undefined) continue
    for (const by of [change, -change])
      compare(found, before, drafted(withMeasurement(quiet, id, mm + by), engine), id)
  }
  for (const value of garment.design) {
    const now = styleOf(order, garment, value.id)
    if (value.kind !== 'length' || typeof now !== 'number' || !offers(order, garment, value.id)) continue
    for (const by of [change, -change])
      compare(found, before, drafted(withStyle(quiet, value.id, now + by), engine), value.id)
  }
  return found.all
}

function compare(found: Findings, before: Draft, after: Draft | undefined, by: string): void {
  if (!after) return
  for (const piece of before.pieces) {
    const other = after.pieces.find((one) => one.id === piece.id)
    if (!other) continue
    for (const mark of piece.marks) {
      const now = other.marks.find((one) => one.id === mark.id)
      if (now)
        found.atMost(
          `${piece.id}.${mark.id}`,
          `jumps with ${by} by`,
          Math.hypot(now.at.x - mark.at.x, now.at.y - mark.at.y),
          farthest,
        )
    }
    for (const edge of piece.edges) {
      const now = other.edges.find((one) => one.id === edge.id)
      if (!now) found.add(`${piece.id}.${edge.id}`, `is gone after ${by} changed`)
      else found.atMost(`${piece.id}.${edge.id}`, `jumps with ${by} by`, apart(edge.path, now.path), farthest)
    }
    found.atMost(`${piece.id} cut line`, `jumps with ${by} by`, apart(piece.cutLine, other.cutLine), farthest)
  }
}

/** The farthest that places of one path lie from the other, both ways, mm. */
function apart(one: Path, other: Path): number {
  const same = one.segments.length === other.segments.length
  if (same) {
    const moved = one.segments.map((segment, index) => pointsOf(segment, other.segments[index]))
    const most = Math.max(...moved)
    if (most <= farthest) return most
  }
  const [a, b] = [chordsOf(one, 0.2), chordsOf(other, 0.2)]
  const [chainA, chainB] = [new Chain(a), new Chain(b)]
  return Math.max(
    ...halfway(a).map((point) => chainB.gap(point)),
    ...halfway(b).map((point) => chainA.gap(point)),
  )
}

function halfway(points: readonly Point[]): Point[] {
  return points.flatMap((point, index) => {
    const before = points[index - 1]
    return before ? [mix(before, point, 0.5), point] : [point]
  })
}

type Segment = Path['segments'][number]

function pointsOf(one: Segment, other: Segment | undefined): number {
  if (!other || one.kind !== other.kind) return Infinity
  const pairs: (readonly [Point, Point])[] = [
    [one.from, other.from],
    [one.to, other.to],
  ]
  if (one.kind === 'cubic' && other.kind === 'cubic') {
    pairs.push([one.control1, other.control1], [one.control2, other.control2])
  }
  return Math.max(...pairs.map(([a, b]) => Math.hypot(a.x - b.x, a.y - b.y)))
}
