import type { Path, Point, Segment } from '../contract'
import { lengthsOf, pathLength, tangentOn } from '../geometry/along'
import { flatten } from '../geometry/flatten'
import { selfIntersections, type Intersection } from '../geometry/intersect'
import { nearestOn } from '../geometry/nearest'
import { containsPoint, isClockwise, openPath, polyline, slicePath, startOf } from '../geometry/path'
import { line } from '../geometry/segment'
import { largest, sweptAreas, unionOf } from '../geometry/swept'
import type { Side } from './outline-edge'

/** A stretch of the cut line that is taken out; `at` is the one point it shrinks to. */
interface Loop {
  readonly from: number
  readonly to: number
  readonly at: Point
}

interface Untangled {
  readonly cuts: readonly Path[]
  readonly clipped: readonly string[]
}

/** A cut line may come this much (mm) nearer than the allowance by fitting alone. */
const NEAR = 0.05

/**
 * Makes a cut line simple where allowances of different edges run into one another (a slit narrower than its allowances):
 * loops between two places where it meets itself at the full distance are taken out. Where that does not settle it, the cut
 * line is the rim of all the allowances swept out as areas.
 */
export const untangle = (sides: readonly Side[], cuts: readonly Path[]): Untangled => {
  const chain: Path = { segments: cuts.flatMap((cut) => cut.segments), closed: true }
  const loops = loopsOf(sides, chain)
  if (loops.length > 0) {
    const loose = without(sides, cuts, chain, loops)
    if (isSound(sides, loose.cuts)) return loose
  }
  return swept(sides, cuts)
}

/** The loops to take out, longest first and none inside another. */
const loopsOf = (sides: readonly Side[], chain: Path): Loop[] => {
  const whole = pathLength(chain)
  const found = selfIntersections(chain)
    .filter((one) => isFree(sides, one.point))
    .map((one) => loopAt(one, whole))
    .sort((a, b) => span(b, whole) - span(a, whole))
  const kept: Loop[] = []
  for (const loop of found) {
    if (kept.every((other) => outside(loop, other, whole))) kept.push(loop)
  }
  return kept
}

/** The shorter way round between the two passes; it may run over the chain's start, then `to` is the smaller. */
const loopAt = (one: Intersection, whole: number): Loop =>
  one.b - one.a <= whole / 2
    ? { from: one.a, to: one.b, at: one.point }
    : { from: one.b, to: one.a, at: one.point }

const span = (loop: Loop, whole: number): number => (loop.to - loop.from + whole) % whole

const outside = (loop: Loop, other: Loop, whole: number): boolean => {
  const start = (loop.from - other.from + whole) % whole
  const end = (loop.to - other.from + whole) % whole
  const size = span(other, whole)
  return start >= size - 1e-6 && end >= size - 1e-6
}

/** Whether a point lies in no edge's allowance (strips with square ends) and outside the stitch line. */
const isFree = (sides: readonly Side[], point: Point): boolean => {
  for (const { edge, allowance } of sides) {
    if (allowance === 0) continue
    const near = nearestOn(edge.path, point)
    if (near.gap >= allowance - NEAR) continue
    const tangent = tangentOn(edge.path, near.distance)
    const x = point.x - near.point.x
    const y = point.y - near.point.y
    const along = tangent.x * x + tangent.y * y
    if (near.distance <= 0 && along <= NEAR) continue
    if (near.distance >= pathLength(edge.path) && along >= -NEAR) continue
    return false
  }
  return true
}

/** Every cut less the loops; an edge that is swallowed whole keeps one point. */
const without = (
  sides: readonly Side[],
  cuts: readonly Path[],
  chain: Path,
  loops: readonly Loop[],
): Untangled => {
  const whole = pathLength(chain)
  const gaps = loops
    .flatMap((loop) =>
      loop.from <= loop.to
        ? [loop]
        : [
            { ...loop, to: whole },
            { ...loop, from: 0 },
          ],
    )
    .sort((a, b) => a.from - b.from)
  const ends = lengthsOf(chain)
  const kept: Path[] = []
  const clipped: string[] = []
  let last = 0
  let count = 0
  cuts.forEach((cut, index) => {
    count += cut.segments.length
    const from = last
    const to = ends[count - 1]!
    last = to
    const parts: Segment[] = []
    let at = from
    let point: Point | undefined
    for (const gap of gaps) {
      if (gap.to <= from + 1e-9 || gap.from >= to - 1e-9) continue
      if (gap.from > at) append(parts, slicePath(chain, at, gap.from), gap.at)
      at = Math.max(at, gap.to)
      point = gap.at
    }
    if (point) clipped.push(sides[index]!.edge.id)
    if (at < to) append(parts, point || at > from ? slicePath(chain, at, to) : cut, undefined, point)
    kept.push(parts.length > 0 ? openPath(parts) : dot(point ?? cut.segments[0]!.from))
  })
  return { cuts: stitched(kept), clipped }
}

const dot = (at: Point): Path => openPath([line(at, at)])

/** Appends a stretch, its ends brought to the points they are meant to be. */
const append = (parts: Segment[], stretch: Path, to: Point | undefined, from?: Point): void => {
  const { segments } = stretch
  segments.forEach((segment, index) => {
    const start = index === 0 ? (parts[parts.length - 1]?.to ?? from) : undefined
    const end = index === segments.length - 1 ? to : undefined
    parts.push(start || end ? { ...segment, from: start ?? segment.from, to: end ?? segment.to } : segment)
  })
}

/** Makes each cut start at exactly the point where the one before it ends. */
const stitched = (cuts: readonly Path[]): Path[] => {
  let end = cuts[cuts.length - 1]!.segments.at(-1)!.to
  return cuts.map((cut) => {
    const [first, ...rest] = cut.segments
    const moved = first!.from === end ? cut : openPath([{ ...first!, from: end }, ...rest])
    const isPoint =
      cut.segments.length === 1 && first!.from.x === first!.to.x && first!.from.y === first!.to.y
    const kept = isPoint ? dot(end) : moved
    end = kept.segments.at(-1)!.to
    return kept
  })
}

/** Simple, clockwise, and around the stitch line wherever it does not run along it. */
export const isSound = (sides: readonly Side[], cuts: readonly Path[]): boolean => {
  const path: Path = { segments: cuts.flatMap((cut) => cut.segments), closed: true }
  if (!isClockwise(path) || selfIntersections(path).length > 0) return false
  for (const { edge } of sides) {
    for (const point of flatten(edge.path, 1)) {
      if (!containsPoint(path, point) && nearestOn(path, point).gap > NEAR) return false
    }
  }
  return true
}

/** The rim of the piece and all its allowances as one area, cut up again at the places nearest to its corners. */
const swept = (sides: readonly Side[], cuts: readonly Path[]): Untangled => {
  const outline = sides.flatMap(({ edge }) => flatten(edge.path, 0.005).slice(1))
  const areas = sides.flatMap(({ edge, allowance }) =>
    allowance > 0 ? sweptAreas(flatten(edge.path, 0.005), allowance) : [],
  )
  const rim = largest(unionOf([outline, ...areas]))
  if (rim.length < 3) return { cuts, clipped: sides.map(({ edge }) => edge.id) }
  const starts = sides.map(({ edge }) => nearestIndex(rim, startOf(edge.path)))
  const origin = starts[0]!
  let at = 0
  const places = starts.map((start) => {
    // Never back: an edge that is swallowed keeps one point.
    const ahead = (start - origin + rim.length) % rim.length
    at = Math.max(at, ahead)
    return at
  })
  const pointAt = (place: number): Point => rim[(origin + place) % rim.length]!
  const kept = places.map((from, index) => {
    const to = index + 1 < places.length ? places[index + 1]! : rim.length
    const points: Point[] = []
    for (let place = from; place <= to; place++) points.push(pointAt(place))
    return points.length > 1 ? polyline(points) : dot(pointAt(from))
  })
  return { cuts: kept, clipped: sides.filter(({ allowance }) => allowance > 0).map(({ edge }) => edge.id) }
}

const nearestIndex = (points: readonly Point[], to: Point): number => {
  let best = 0
  let least = Infinity
  points.forEach((point, index) => {
    const gap = (point.x - to.x) ** 2 + (point.y - to.y) ** 2
    if (gap < least) {
      least = gap
      best = index
    }
  })
  return best
}
