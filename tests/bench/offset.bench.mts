import { Bezier } from 'bezier-js'
import { EndType, inflatePathsD, JoinType } from 'clipper2-ts'
import type { Path, Point } from '../../drafting/contract'
import { flatten, offsetPath, openPath } from '../../drafting/geometry'
import { cubic } from '../../drafting/geometry/segment'
import { cutLine } from '../../drafting/pieces/cut-line'
import { bodice, circlePanel, keyhole, sleeve, type Shape } from '../drafting/geometry/pieces'
import { dense, gapTo, parallelPoints } from '../drafting/geometry/reference'
import { bench } from './support/bench'

/** Allowances of 15 mm all round where a peer can do no better; ours get one for each edge as well. */
const even = [15, 15, 15, 15, 15, 15]
const pieces: readonly [string, Shape, Shape][] = [
  ['bodice', bodice(even), bodice([6, 12, 10, 20, 40])],
  ['sleeve', sleeve(even), sleeve([12, 15, 40, 15])],
  ['skirt panel', circlePanel(even), circlePanel([10, 15, 30, 20])],
  ['keyhole front', keyhole([5, 5, 5, 5, 5, 5]), keyhole([15, 5, 15, 20, 40, 20])],
]

/**
 * How far a parallel is from where it belongs, at worst: too near its source anywhere, or missing where the source's own
 * parallel is not swallowed. What a mitre adds outside is no error.
 */
const errorOf = (parallel: readonly Point[], source: Path, distance: number): number => {
  const fine = dense(source, 0.05)
  const near = parallel.map((at) => distance - gapTo(fine, at))
  const missing = parallelPoints(source, distance, 2)
    .filter(({ at }) => gapTo(fine, at) > distance - 0.001)
    .map(({ at }) => gapTo(parallel, at))
  return Math.max(...near, ...missing)
}

const words = (error: number, count: number, unit: string): string =>
  `off by ≤ ${error.toFixed(4)} mm, ${count} ${unit}`

for (const [name, { edges, darts }, uneven] of pieces) {
  const distance = edges[0]!.allowance
  const outline = openPath(edges.flatMap(({ path }) => path.segments))

  const inflate = () =>
    inflatePathsD([flatten(outline, 0.02).slice(1)], distance, JoinType.Miter, EndType.Polygon, 2.5, 4, 0.02)
  const [inflated] = inflate()
  const closed = inflated ? [...inflated, inflated[0]!] : []
  await bench(`offset, ${name}, clipper2-ts`, inflate, {
    note: words(errorOf(closed, outline, distance), closed.length, 'points'),
  })

  const beziers = edges.flatMap(({ path }) =>
    path.segments.map((s) =>
      s.kind === 'cubic'
        ? new Bezier(s.from, s.control1, s.control2, s.to)
        : new Bezier(s.from, s.from, s.to, s.to),
    ),
  )
  const curved = beziers.filter((_, i) => outline.segments[i]!.kind === 'cubic')
  const parallels = () => curved.map((one) => [one.offset(-distance)].flat() as unknown as Bezier[])
  const bezierError = Math.max(
    ...parallels().map((parts, i) => {
      const points = parts.flatMap((part) => {
        const [from, control1, control2, to] = part.points
        return from && control1 && control2 && to
          ? dense(openPath([cubic(from, control1, control2, to)]), 0.5)
          : []
      })
      const [from, control1, control2, to] = curved[i]!.points
      return errorOf(points, openPath([cubic(from!, control1!, control2!, to!)]), distance)
    }),
  )
  await bench(`offset, ${name}, bezier-js (curves only)`, parallels, {
    note: words(bezierError, parallels().flat().length, 'segments'),
  })

  const offsets = () => edges.map(({ path, allowance }) => offsetPath(path, allowance))
  const own = Math.max(
    ...edges.map(({ path, allowance }) =>
      allowance > 0 ? errorOf(dense(offsetPath(path, allowance).path, 0.5), path, allowance) : 0,
    ),
  )
  const segments = offsets().reduce((sum, { path }) => sum + path.segments.length, 0)
  await bench(`offset, ${name}, ours`, offsets, {
    aim: 0.02,
    against: `offset, ${name}, clipper2-ts`,
    note: words(own, segments, 'segments'),
  })
  await bench(`cut line, ${name}, ours, an allowance for each edge`, () => cutLine(uneven.edges, darts), {
    aim: 0.03,
    against: `offset, ${name}, clipper2-ts`,
    note: `${cutLine(uneven.edges, darts).cutLine.segments.length} segments with corners and checks`,
  })
}
