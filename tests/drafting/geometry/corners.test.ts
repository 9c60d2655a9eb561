import { describe, expect, test } from 'vitest'
import type { Corner, EdgeRole, Path, Point } from '../../../drafting/contract'
import * as geometry from '../../../drafting/geometry'
import { cutLine, type OutlineEdge } from '../../../drafting/pieces/cut-line'
import { cutLineFaults } from './cut-line-faults'
import * as shapes from './pieces'
import { dense, gapTo } from './reference'

const { distance, line, openPath } = geometry
const p = (x: number, y: number): Point => ({ x, y })

/** A polygon's edges: corner points with the role, allowance and start corner of the edge that starts there. */
const outline = (...points: [Point, EdgeRole, number, Corner?][]): OutlineEdge[] =>
  points.map(([at, role, allowance, corner], i) =>
    shapes.edge(`edge-${i}`, role, line(at, points[(i + 1) % points.length]![0]), allowance, corner),
  )

const cornersOf = (path: Path): Point[] => path.segments.map(({ from }) => from)
const has = (path: Path, at: Point): boolean => cornersOf(path).some((one) => distance(one, at) < 1e-9)

describe('corners of a cut line', () => {
  test('a rectangle with four allowances is a larger rectangle of four lines', () => {
    const { cutLine: path, cuts } = cutLine(
      outline(
        [p(0, 0), 'waist', 10],
        [p(100, 0), 'seam', 15],
        [p(100, 200), 'hem', 40],
        [p(0, 200), 'seam', 20],
      ),
    )
    expect(cornersOf(path)).toEqual([p(-20, -10), p(115, -10), p(115, 240), p(-20, 240)])
    expect(cuts.map((cut) => cut.segments.length)).toEqual([1, 1, 1, 1])
    expect(path.closed).toBe(true)
  })

  test('no allowances: the stitch line itself', () => {
    const edges = shapes.bodice([0, 0, 0, 0, 0]).edges
    const { cuts, clipped } = cutLine(edges)
    expect(cuts).toEqual(edges.map(({ path }) => path))
    expect(clipped).toEqual([])
  })

  test('a sharp corner reaches no further than 2.5 × the larger allowance, cut square to its bisector', () => {
    const { cutLine: path } = cutLine(
      outline([p(0, 0), 'seam', 10], [p(200, 20), 'seam', 10], [p(0, 40), 'seam', 10]),
    )
    const tip = cornersOf(path).filter(({ x }) => x > 210)
    expect(tip).toHaveLength(2)
    for (const { x, y } of tip) expect(Math.hypot(x - 200, y - 20)).toBeCloseTo(25, 9)
    expect(tip[0]?.x).toBeCloseTo(tip[1]?.x ?? 0, 9)
  })

  test('an inner corner is trimmed where the two cut lines cross', () => {
    const { cutLine: path } = cutLine(
      outline(
        [p(0, 0), 'neckline', 6],
        [p(40, 0), 'neckline', 6],
        [p(40, 50), 'neckline', 6],
        [p(100, 50), 'seam', 10],
        [p(100, 200), 'seam', 10],
        [p(0, 200), 'seam', 10],
      ),
    )
    expect(has(path, p(46, 44))).toBe(true)
  })

  test('a fold is never crossed: its neighbours’ cut lines end exactly on it', () => {
    for (const shape of [shapes.bodice([10, 15, 10, 15, 40], 1.07), shapes.facing([6, 10, 0], 41.3)]) {
      const { cuts, cutLine: path } = cutLine(shape.edges)
      const fold = cuts[shape.edges.findIndex(({ role }) => role === 'fold')]!
      for (const { from, to } of fold.segments) expect([from.x === 0, to.x === 0]).toEqual([true, true])
      expect(fold.segments).toHaveLength(1)
      expect(Math.min(...dense(path, 1).map(({ x }) => x)) === 0).toBe(true)
    }
  })

  test('a hem’s allowance, turned up, lies on the seam’s cut line', () => {
    const sides = [p(220, 500), p(-220, 500)]
    const { cuts } = cutLine(
      outline(
        [p(-150, 0), 'waist', 10],
        [p(150, 0), 'seam', 15],
        [sides[0]!, 'hem', 40, 'turned'],
        [sides[1]!, 'seam', 15, 'turned'],
      ),
    )
    const folded = geometry.transformPath(
      geometry.mirrorIn(sides[0]!, sides[1]!),
      openPath(cuts.flatMap((c) => c.segments)),
    )
    const right = dense(cuts[1]!, 0.5)
    const left = dense(cuts[3]!, 0.5)
    const turnedUp = dense(folded, 0.5).filter(({ y }) => y > 461 && y < 499.9)
    expect(turnedUp.length).toBeGreaterThan(50)
    for (const at of turnedUp) expect(Math.min(gapTo(right, at), gapTo(left, at))).toBeLessThan(1e-6)
    expect(Math.max(...dense(cuts[2]!, 1).map(({ y }) => y))).toBeCloseTo(540, 9)
  })

  test('square: the seam’s allowance ends at right angles where the seam line meets the neighbour’s cut line', () => {
    const seam = geometry.unit(p(40, 300))
    for (const turn of [0, 180]) {
      const { cutLine: path } = cutLine(
        outline(
          [p(0, 0), turn ? 'hem' : 'armhole', 10],
          [p(100, 0), 'seam', 20, 'square'],
          [p(140, 300), 'hem', 30],
          [p(0, 300), 'seam', 15],
        ),
      )
      const onward = p(100 - (seam.x / seam.y) * 10, -10)
      expect(has(path, onward)).toBe(true)
      expect(has(path, p(onward.x + 20 * seam.y, onward.y - 20 * seam.x))).toBe(true)
    }
  })

  test('step: two allowances on a straight line meet in a right-angled step, the wider one kept to its end', () => {
    const { cutLine: path } = cutLine(
      outline(
        [p(0, 0), 'seam', 10],
        [p(50, 0), 'opening', 25, 'step'],
        [p(100, 0), 'seam', 10],
        [p(100, 80), 'seam', 10],
        [p(0, 80), 'seam', 10],
      ),
    )
    expect(has(path, p(50, -10)) && has(path, p(50, -25))).toBe(true)
  })

  test('a slit narrower than its allowances is closed, and said so', () => {
    const shape = shapes.keyhole([15, 10, 15, 15, 30, 15], 25, 12)
    const { clipped, cutLine: path } = cutLine(shape.edges)
    expect(clipped).toEqual(['neckline'])
    expect(geometry.containsPoint(path, p(0, 100))).toBe(true)
  })

  test('a short edge whose neighbours would run into one another beyond it keeps its allowance, and is named', () => {
    const curve = (...at: [Point, Point, Point, Point]) => geometry.cubic(...at)
    const shape: shapes.Shape = {
      name: 'short edge',
      edges: [
        shapes.edge('short', 'seam', line(p(29, 6), p(-21, 57)), 40),
        shapes.edge('nett', 'neckline', curve(p(-21, 57), p(-75, 50), p(-107, 22), p(-112, -35)), 0),
        shapes.edge('long', 'seam', curve(p(-112, -35), p(-71, -80), p(-27, -121), p(22, -158)), 10),
        shapes.edge('top', 'free', curve(p(22, -158), p(45, -193), p(76, -202), p(114, -185)), 25),
        shapes.edge('back', 'hem', curve(p(114, -185), p(54, -137), p(48, -63), p(29, 6)), 5),
      ],
      darts: [],
    }
    const result = cutLine(shape.edges)
    expect(cutLineFaults(shape, result)).toEqual([])
    expect(result.clipped).toContain('short')
    const middle = p(4 + 40 * Math.SQRT1_2, 31.5 + 40 * Math.SQRT1_2)
    expect(gapTo(dense(result.cuts[0]!, 0.5), middle)).toBeLessThan(0.5)
  })

  test('odd input gives finite lines and no error', () => {
    const square = outline(
      [p(0, 0), 'seam', 10],
      [p(100, 0), 'seam', 10],
      [p(100, 100), 'seam', 10],
      [p(0, 100), 'seam', 10],
    )
    const odd: OutlineEdge[][] = [
      [],
      [shapes.edge('dot', 'seam', line(p(0, 0), p(0, 0)), 10)],
      [square[0]!, shapes.edge('dot', 'seam', line(p(100, 0), p(100, 0)), 10), ...square.slice(1)],
      square.map((edge) => ({ ...edge, allowance: -5 })),
      square.map((edge) => ({ ...edge, allowance: Number.NaN })),
      square.map((edge) => ({ ...edge, allowance: 1e4 })),
      square.map((edge) => ({ ...edge, role: 'dart' as const })),
      square.map((edge) => ({ ...edge, role: 'fold' as const })),
      [...square].reverse().map((edge) => ({ ...edge, path: geometry.reversePath(edge.path) })),
      [shapes.edge('ring', 'seam', geometry.arcPath(p(0, 0), 50, 0, 360), 10)],
      [
        shapes.edge('there', 'seam', line(p(0, 0), p(50, 0)), 10),
        shapes.edge('back', 'seam', line(p(50, 0), p(0, 0)), 10),
      ],
    ]
    for (const edges of odd) {
      const { cuts, cutLine: path } = cutLine(edges)
      expect(cuts).toHaveLength(edges.length)
      for (const at of dense(path, 10)) expect(Number.isFinite(at.x) && Number.isFinite(at.y)).toBe(true)
    }
  })

  test('a ring of one edge is a wider ring', () => {
    const { cutLine: path } = cutLine([
      shapes.edge('ring', 'seam', geometry.arcPath(p(0, 0), 50, 0, 360), 10),
    ])
    expect(Math.abs(geometry.signedArea(path) / 3600 - Math.PI)).toBeLessThan(0.001)
    for (const at of dense(path, 1)) expect(Math.abs(geometry.magnitude(at) - 60)).toBeLessThan(0.02)
  })
})

describe('a dart’s cap', () => {
  test.each(['centre', 'side'] as const)(
    'folded and pressed to the %s it lies level with the cut line',
    (pressTo) => {
      const shape = shapes.darted([12, 15, 40], pressTo, 30)
      const { cuts } = cutLine(shape.edges, shape.darts)
      const legs = [shape.edges[1]!.path, shape.edges[2]!.path] as const
      const tip = geometry.endOf(legs[0])
      const left = geometry.startOf(legs[0])
      const right = geometry.endOf(legs[1])
      const middle = p((left.x + right.x) / 2, (left.y + right.y) / 2)
      // As folded on the table: the near half over its own leg, the far half over the middle and then that leg.
      const [near, far, over, seam] =
        pressTo === 'centre'
          ? [cuts[1]!, cuts[2]!, geometry.mirrorIn(left, tip), cuts[0]!]
          : [cuts[2]!, cuts[1]!, geometry.mirrorIn(right, tip), cuts[3]!]
      const across = geometry.mirrorIn(middle, tip)
      const level = dense(seam, 0.2)
      for (const at of dense(geometry.transformPath(over, near), 0.5))
        expect(gapTo(level, at)).toBeLessThan(0.01)
      for (const at of dense(geometry.transformPath(geometry.compose(over, across), far), 0.5)) {
        expect(gapTo(level, at)).toBeLessThan(0.01)
      }
    },
  )

  test('crosses the mouth: the legs are not followed', () => {
    const shape = shapes.darted([12, 15, 40], 'centre', 30)
    const { cutLine: path } = cutLine(shape.edges, shape.darts)
    expect(geometry.containsPoint(path, p(90, 60))).toBe(true)
  })
})
