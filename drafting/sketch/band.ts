import type { Piece, Point } from '../contract'
import { bounds, closedPath, cubic, endOf, line, startOf } from '../geometry'
import { gatheredTo, isGathered, isSkirt } from './body'
import type { SketchLine } from './sketch-line'

/** The waistband, folded, over the waist of the front. */
export function bandOver(fronts: readonly Piece[], band: Piece): readonly SketchLine[] {
  const skirt = fronts.find(isSkirt)
  const waist = skirt?.edges.filter(({ role }) => role === 'waist') ?? []
  const ends = waist.flatMap(({ path }) => [startOf(path), endOf(path)])
  if (!skirt || ends.length === 0) return []
  const centre = ends.reduce((one, other) => (other.x < one.x ? other : one))
  const side = ends.reduce((one, other) => (other.x > one.x ? other : one))
  const { min, max } = bounds(band.cutLine)
  const depth = Math.min(max.y - min.y, max.x - min.x) / 2
  const out = side.x * (isGathered(skirt) ? gatheredTo : 1)
  const low = [
    { x: out, y: side.y },
    { x: -out, y: side.y },
  ] as const
  const over = ({ x, y }: Point): Point => ({ x, y: y - depth })
  const bend: Point = { x: 0, y: 2 * centre.y - side.y }
  return [
    {
      kind: 'shape',
      path: closedPath([
        bow(over(low[1]), over(bend), over(low[0])),
        line(over(low[0]), low[0]),
        bow(low[0], bend, low[1]),
        line(low[1], over(low[1])),
      ]),
    },
  ]
}

/** A parabola drawn as a cubic. */
function bow(from: Point, control: Point, to: Point) {
  const towards = (end: Point) => ({
    x: end.x + (control.x - end.x) * (2 / 3),
    y: end.y + (control.y - end.y) * (2 / 3),
  })
  return cubic(from, towards(from), towards(to), to)
}
