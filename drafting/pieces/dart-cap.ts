import type { Path, Point, Segment } from '../contract'
import { endOf, endTangent, startTangent } from '../geometry/ends'
import { intersections } from '../geometry/intersect'
import { joinPaths, openPath, reversePath, slicePath } from '../geometry/path'
import { line } from '../geometry/segment'
import { mirrorIn, transformPath } from '../geometry/transform'
import { meetLine, type Meeting } from './meet-line'
import type { OutlineDart, OutlineEdge, Side, Turn } from './outline-edge'
import { startingAt, upTo } from './stretch'

/** The turns into the first leg's cut, into the second's, and into the edge after the dart. */
export interface Cap {
  readonly into: Turn
  readonly middle: Turn
  readonly outOf: Turn
}

/**
 * The cut line across a dart's mouth: the shape that lies level with the seam's cut line once the dart is folded along its
 * legs and pressed to one side. The cut line of the side it is pressed to is mirrored in that side's leg as far as the
 * dart's middle line, and from there mirrored in the middle line to the other leg. Undefined where the cut lines beside the
 * dart do not reach its legs.
 */
export const dartCap = (
  before: Side,
  legs: readonly [OutlineEdge, OutlineEdge],
  after: Side,
  pressTo: OutlineDart['pressTo'],
): Cap | undefined => {
  const inward = startTangent(legs[0].path)
  const outward = endTangent(legs[1].path)
  const left = legs[0].path.segments[0]!.from
  const right = endOf(legs[1].path)
  const mouth = Math.hypot(right.x - left.x, right.y - left.y)
  const onLeft = meetLine(before, false, left, inward)
  const onRight = meetLine(after, true, right, outward)
  if (!onLeft || !onRight || mouth < 1e-6) return undefined
  const middle = { x: (left.x + right.x) / 2, y: (left.y + right.y) / 2 }
  const tip = { x: middle.x - (right.y - left.y), y: middle.y + (right.x - left.x) }
  const across = mirrorIn(middle, tip)
  const length = 2 * mouth + 4 * (before.allowance + after.allowance)
  let first: Path | undefined
  let second: Path | undefined
  if (pressedLeft(left, right, pressTo)) {
    const flap = reversePath(upTo(before, onLeft.point, onLeft.along, length))
    first = half(flap, left, inward, middle, tip, onLeft.point)
    second = first && reversePath(transformPath(across, first))
  } else {
    const flap = startingAt(after, onRight.point, onRight.along, length)
    const back = half(flap, right, outward, middle, tip, onRight.point)
    second = back && reversePath(back)
    first = back && transformPath(across, back)
  }
  if (!first || !second) return undefined
  return turns(onLeft, first, second, onRight, after)
}

const turns = (onLeft: Meeting, first: Path, second: Path, onRight: Meeting, after: Side): Cap => {
  // Where the seam bends, the folded edge meets the other leg a hair beside its own cut line: that step is the dart's too.
  const cap: readonly Segment[] = [...second.segments, line(endOf(second), onRight.point)]
  const lead: readonly Segment[] = onRight.along === undefined ? [line(onRight.point, after.start)] : []
  return {
    into: {
      joint: onLeft.point,
      leave: onLeft.along,
      lead: [line(onLeft.point, first.segments[0]!.from), ...first.segments],
    },
    middle: { joint: endOf(first), lead: cap },
    outOf: { joint: onRight.point, lead, enter: onRight.along },
  }
}

/** Whether the dart is pressed towards its first leg. Centre is x = 0; up is the smaller y. */
const pressedLeft = (left: Point, right: Point, pressTo: OutlineDart['pressTo']): boolean => {
  switch (pressTo) {
    case 'centre':
      return Math.abs(left.x) <= Math.abs(right.x)
    case 'side':
      return Math.abs(left.x) >= Math.abs(right.x)
    case 'up':
      return left.y <= right.y
    case 'down':
      return left.y >= right.y
  }
}

/** The flap's cut line folded over a leg, as far as the middle of the dart. */
const half = (
  flap: Path,
  mouth: Point,
  leg: Point,
  middle: Point,
  tip: Point,
  from: Point,
): Path | undefined => {
  const folded = transformPath(mirrorIn(mouth, { x: mouth.x + leg.x, y: mouth.y + leg.y }), flap)
  const end = endOf(folded)
  const onward = endTangent(folded)
  const far = 4 * Math.hypot(middle.x - mouth.x, middle.y - mouth.y) + 100
  const long = joinPaths(
    folded,
    openPath([line(end, { x: end.x + onward.x * far, y: end.y + onward.y * far })]),
  )
  const reach = 2000 / Math.hypot(tip.x - middle.x, tip.y - middle.y)
  const dx = (tip.x - middle.x) * reach
  const dy = (tip.y - middle.y) * reach
  const centre = openPath([
    line({ x: middle.x - dx, y: middle.y - dy }, { x: middle.x + dx, y: middle.y + dy }),
  ])
  const met = intersections(long, centre)[0]
  if (!met || met.a < 1e-9) return undefined
  const [first, ...rest] = slicePath(long, 0, met.a).segments
  if (!first) return undefined
  return openPath([first.kind === 'line' ? line(from, first.to) : { ...first, from }, ...rest])
}
