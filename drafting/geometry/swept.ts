// The parts that a union needs: the whole library weighs twice as much in a browser.
import { ClipType, FillRule } from 'clipper2-ts/dist/Core.js'
import { ClipperD } from 'clipper2-ts/dist/Engine.js'
import type { Path, Point } from '../contract'
import { flatten } from './flatten'
import { polyline } from './path'
import { add, unit } from './point'

/** mm that the swept outline may stray from the true one. */
const FINENESS = 0.005
/** Decimals of a millimetre that the clipping keeps. */
const DECIMALS = 4

type Polygon = readonly Point[]

/**
 * The parallel of an open path as the rim of the area that a bar of the distance's length sweeps beside it: a polyline, the
 * last resort where the parallel of curves cannot be untangled. Never fails; an empty sweep gives the path's chord.
 */
export const sweptOffset = (path: Path, distance: number): Path => {
  const points = flatten(path, FINENESS)
  const rim = largest(unionOf(sweptAreas(points, distance)))
  const first = points[0]!
  const last = points[points.length - 1]!
  if (rim.length < 3) return polyline([first, last])
  const ahead = beside(first, points[1] ?? last, distance)
  const behind = beside(last, last, distance, points[points.length - 2] ?? first)
  // Clockwise the rim runs along the far side from start to end when that lies to the left of travel.
  const round = distance > 0 ? rim : [...rim].reverse()
  const from = nearestIndex(round, ahead)
  const to = nearestIndex(round, behind)
  const stretch: Point[] = []
  for (let i = from; ; i = (i + 1) % round.length) {
    stretch.push(round[i]!)
    if (i === to) break
  }
  return polyline(stretch.length > 1 ? stretch : [ahead, behind])
}

/**
 * What a bar beside each chord sweeps, as areas that are simple and clockwise: long runs in which it moves forward as one,
 * single triangles where it moves back. Wedges fill the outer corners.
 */
export const sweptAreas = (points: readonly Point[], distance: number): Polygon[] => {
  const areas: Polygon[] = []
  let inner: Point[] = []
  let outer: Point[] = []
  let heading: Point | undefined
  let previous: Point | undefined
  const close = (): void => {
    if (inner.length > 1) areas.push(clockwise([...inner, ...outer.reverse()]))
    inner = []
    outer = []
  }
  for (let i = 1; i < points.length; i++) {
    const from = points[i - 1]!
    const to = points[i]!
    if (from.x === to.x && from.y === to.y) continue
    const along = unit({ x: to.x - from.x, y: to.y - from.y })
    const near = beside(from, to, distance)
    const far = beside(to, to, distance, from)
    const last = outer[outer.length - 1]
    if (last && previous) {
      const forward = (far.x - last.x) * along.x + (far.y - last.y) * along.y > 0
      const smooth = along.x * previous.x + along.y * previous.y > 0.8
      const onward = along.x * heading!.x + along.y * heading!.y > -0.5
      if (forward && smooth && onward) {
        // One point on the bisector instead of two that may overlap.
        outer[outer.length - 1] = beside(from, add(from, add(along, previous)), distance)
      } else {
        areas.push(clockwise([from, last, near]))
        close()
      }
    }
    if (inner.length === 0) {
      heading = along
      inner.push(from)
      outer.push(near)
    }
    inner.push(to)
    outer.push(far)
    previous = along
  }
  close()
  return areas
}

/** All the areas as one, outlines only. */
export const unionOf = (areas: readonly Polygon[]): Polygon[] => {
  const union = new ClipperD(DECIMALS)
  union.addSubjectPaths(areas.map((area) => area.map(({ x, y }) => ({ x, y }))))
  const outlines: Point[][] = []
  union.execute(ClipType.Union, FillRule.NonZero, outlines)
  return outlines.map((outline) => outline.map(({ x, y }) => ({ x, y })))
}

/** The outline around most area, clockwise on the sheet. */
export const largest = (outlines: readonly Polygon[]): Polygon => {
  let best: Polygon = []
  let most = 0
  for (const outline of outlines) {
    const area = Math.abs(areaOf(outline))
    if (area > most) {
      most = area
      best = outline
    }
  }
  return clockwise(best)
}

const areaOf = (polygon: Polygon): number => {
  let sum = 0
  for (let i = 0; i < polygon.length; i++) {
    const a = polygon[i]!
    const b = polygon[(i + 1) % polygon.length]!
    sum += a.x * b.y - b.x * a.y
  }
  return sum / 2
}

const clockwise = (polygon: Polygon): Polygon => (areaOf(polygon) < 0 ? [...polygon].reverse() : polygon)

/** The point beside `at` on the left of the direction towards `to` (or from `back`). */
const beside = (at: Point, to: Point, distance: number, back: Point = at): Point => {
  const along = unit({ x: to.x - back.x, y: to.y - back.y })
  return { x: at.x + along.y * distance, y: at.y - along.x * distance }
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
