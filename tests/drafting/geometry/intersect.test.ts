import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Path, Point } from '../../../drafting/contract'
import * as geometry from '../../../drafting/geometry'
import { anyCubic, anyPath } from './arbitrary'
import { dense, gapTo } from './reference'

const { arcPath, closedPath, cubic, intersections, line, openPath, polyline, selfIntersections } = geometry
const p = (x: number, y: number): Point => ({ x, y })

/** Where the chords of two fine polylines cross. */
const chordCrossings = (a: Path, b: Path): Point[] => {
  const first = dense(a, 0.5)
  const second = dense(b, 0.5)
  const found: Point[] = []
  for (let i = 1; i < first.length; i++) {
    for (let j = 1; j < second.length; j++) {
      const [p0, p1, q0, q1] = [first[i - 1]!, first[i]!, second[j - 1]!, second[j]!]
      const d = (p1.x - p0.x) * (q1.y - q0.y) - (p1.y - p0.y) * (q1.x - q0.x)
      const t = ((q0.x - p0.x) * (q1.y - q0.y) - (q0.y - p0.y) * (q1.x - q0.x)) / d
      const u = ((q0.x - p0.x) * (p1.y - p0.y) - (q0.y - p0.y) * (p1.x - p0.x)) / d
      if (t >= 0 && t < 1 && u >= 0 && u < 1)
        found.push(p(p0.x + t * (p1.x - p0.x), p0.y + t * (p1.y - p0.y)))
    }
  }
  return found
}

describe('where paths meet', () => {
  test('every meeting lies on both paths at the distances it gives, in order along the first', () => {
    fc.assert(
      fc.property(anyPath, anyPath, (a, b) => {
        const found = intersections(a, b)
        found.forEach((one, i) => {
          expect(geometry.distance(geometry.pointAt(a, one.a), one.point)).toBeLessThan(1e-6)
          expect(geometry.distance(geometry.pointAt(b, one.b), one.point)).toBeLessThan(1e-6)
          if (i > 0) expect(one.a).toBeGreaterThanOrEqual(found[i - 1]!.a)
        })
      }),
    )
  })

  test('no crossing of two curves is missed', () => {
    fc.assert(
      fc.property(anyCubic, anyCubic, (a, b) => {
        const first = openPath([a])
        const second = openPath([b])
        const found = intersections(first, second)
        for (const at of chordCrossings(first, second)) {
          expect(Math.min(...found.map(({ point }) => geometry.distance(point, at)))).toBeLessThan(2)
        }
      }),
      { numRuns: 40 },
    )
  })

  test('circles that touch meet once, ones that cross twice, ones apart never', () => {
    const half = arcPath(p(0, 0), 100, -90, 90)
    expect(intersections(half, arcPath(p(200, 0), 100, 90, 270))).toHaveLength(1)
    expect(intersections(half, arcPath(p(180, 0), 100, 90, 270))).toHaveLength(2)
    expect(intersections(half, arcPath(p(200.01, 0), 100, 90, 270))).toHaveLength(0)
  })

  test('a line touching a curve, and ends that lie on the other path, count', () => {
    const arch = openPath([cubic(p(0, 0), p(0, -100), p(100, -100), p(100, 0))])
    expect(intersections(arch, polyline([p(-50, -75), p(150, -75)]))).toHaveLength(1)
    expect(intersections(arch, polyline([p(0, 0), p(0, 50)]))).toHaveLength(1)
    expect(intersections(polyline([p(0, 0), p(10, 0)]), polyline([p(10, 0), p(10, 5)]))).toMatchObject([
      { a: 10, b: 0 },
    ])
  })

  test('lines along one another give the ends of what they share', () => {
    const found = intersections(polyline([p(0, 0), p(10, 0)]), polyline([p(4, 0), p(20, 0)]))
    expect(found.map(({ a, b }) => [a, b])).toEqual([
      [4, 0],
      [10, 6],
    ])
  })

  test('a curve against itself ends, finite, within its own time', () => {
    fc.assert(
      fc.property(anyCubic, (curve) => {
        const found = intersections(openPath([curve]), openPath([curve]))
        expect(found.every(({ a, b }) => Number.isFinite(a) && Number.isFinite(b))).toBe(true)
      }),
      { numRuns: 20 },
    )
  })
})

describe('where a path meets itself', () => {
  test('the loop of a single curve', () => {
    const [loop, ...more] = selfIntersections(
      openPath([cubic(p(0, 0), p(200, 100), p(-100, 100), p(100, 0))]),
    )
    expect(loop!.point.x).toBeCloseTo(50, 9)
    expect(loop!.a).toBeLessThan(loop!.b)
    expect(more).toEqual([])
  })

  test('joints do not count, smooth or sharp, open or closed', () => {
    const circle = closedPath(arcPath(p(0, 0), 80, 0, 360).segments)
    expect(selfIntersections(circle)).toEqual([])
    const wedge = closedPath(polyline([p(0, 0), p(100, 1), p(100, -1), p(0, 0)]).segments)
    expect(selfIntersections(wedge)).toEqual([])
  })

  test('a figure of eight is found once', () => {
    const eight = closedPath(polyline([p(0, 0), p(100, 100), p(100, 0), p(0, 100), p(0, 0)]).segments)
    expect(selfIntersections(eight)).toMatchObject([{ point: p(50, 50) }])
  })

  test('a corner that touches a far edge is found', () => {
    const path = polyline([p(0, 0), p(100, 0), p(100, 50), p(50, 0), p(20, 60)])
    expect(selfIntersections(path).some(({ point }) => geometry.distance(point, p(50, 0)) < 1e-6)).toBe(true)
  })

  test('what random paths cross of themselves lies on them twice', () => {
    fc.assert(
      fc.property(anyPath, (path) => {
        for (const { a, b, point } of selfIntersections(path)) {
          expect(b - a).toBeGreaterThan(0)
          expect(geometry.distance(geometry.pointAt(path, a), point)).toBeLessThan(1e-5)
          expect(geometry.distance(geometry.pointAt(path, b), point)).toBeLessThan(1e-5)
          expect(gapTo(dense(path, 0.5), point)).toBeLessThan(0.01)
        }
      }),
      { numRuns: 60 },
    )
  })
})

test('a line laid on a straight curve is no trouble', () => {
  const straight = openPath([cubic(p(0, 0), p(10, 0), p(20, 0), p(30, 0))])
  expect(
    intersections(openPath([line(p(10, 0), p(60, 0))]), straight).every(({ a }) => Number.isFinite(a)),
  ).toBe(true)
})
