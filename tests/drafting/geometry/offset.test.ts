import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Path, Point } from '../../../drafting/contract'
import * as geometry from '../../../drafting/geometry'
import { sweptOffset } from '../../../drafting/geometry/swept'
import { anyPath } from './arbitrary'
import { dense, gapTo, parallelPoints } from './reference'

const { arcPath, cubic, line, offsetPath, openPath, polyline } = geometry
const p = (x: number, y: number): Point => ({ x, y })
const between = (min: number, max: number): fc.Arbitrary<number> => fc.double({ min, max, noNaN: true })

/** Distance of the two from being exactly apart, both ways; what the source itself covers does not count. */
const error = (source: Path, distance: number): number => {
  const parallel = offsetPath(source, distance)
  expect(parallel.clipped).toBe(false)
  const from = dense(source, 0.1)
  const to = dense(parallel.path, 0.5)
  const off = to.map((at) => Math.abs(gapTo(from, at) - Math.abs(distance)))
  const uncovered = parallelPoints(source, distance, 1)
    .filter(({ at }) => gapTo(from, at) >= Math.abs(distance) - 1e-3)
    .map(({ at }) => gapTo(to, at))
  return Math.max(...off, ...uncovered)
}

describe('a parallel edge', () => {
  test('an armhole and a neckline keep their distance within 0.02 mm, at any allowance, on either side', () => {
    const armhole = fc
      .tuple(between(-40, 0), between(-40, 0), between(40, 90), between(120, 240))
      .map(([a, b, across, down]) =>
        openPath([cubic(p(0, 0), p(a, 0.35 * down), p(b, 0.8 * down), p(across, down))]),
      )
    fc.assert(
      fc.property(armhole, between(1, 20), fc.boolean(), (path, distance, inside) => {
        const tightest = 25
        fc.pre(distance < tightest)
        expect(error(path, inside ? -Math.min(distance, 10) : distance)).toBeLessThan(0.02)
      }),
      { numRuns: 60 },
    )
  })

  test('an arc becomes the arc of the next radius', () => {
    fc.assert(
      fc.property(between(60, 1500), between(-40, 40), between(5, 180), (radius, distance, turn) => {
        fc.pre(Math.abs(distance) > 0.5)
        const { path } = offsetPath(arcPath(p(0, 0), radius, 10, 10 + turn), distance)
        for (const at of dense(path, 2)) {
          expect(Math.abs(geometry.magnitude(at) - radius - distance)).toBeLessThan(0.02)
        }
      }),
    )
  })

  test('a line stays one line, and no distance gives the path itself', () => {
    const path = polyline([p(0, 0), p(100, 0)])
    expect(offsetPath(path, 15).path.segments).toEqual([line(p(0, -15), p(100, -15))])
    expect(offsetPath(path, 0)).toEqual({ path, clipped: false })
    expect(offsetPath(path, 0).path).toBe(path)
  })

  test('a smooth joint stays one exact point, beside the source’s', () => {
    const path = openPath([
      cubic(p(0, 0), p(0, 40), p(10, 80), p(40, 80)),
      cubic(p(40, 80), p(70, 80), p(90, 90), p(99, 99)),
    ])
    const { segments } = offsetPath(path, 12).path
    segments.forEach((segment, i) => {
      if (i > 0) expect(segment.from).toEqual(segments[i - 1]!.to)
    })
    expect(segments.some(({ to }) => geometry.distance(to, p(40, 68)) < 1e-9)).toBe(true)
  })

  test('a V neck is trimmed where its two sides cross', () => {
    const { path, clipped } = offsetPath(polyline([p(0, 0), p(60, 150), p(120, 0)]), 10)
    expect(clipped).toBe(false)
    expect(path.segments).toHaveLength(2)
    expect(path.segments[0]!.to.x).toBeCloseTo(60, 9)
    expect(gapTo([p(0, 0), p(60, 150)], path.segments[0]!.to)).toBeCloseTo(10, 9)
  })

  test('an outer corner is mitred, a sharp one cut off at 2.5 times the distance', () => {
    const square = offsetPath(polyline([p(0, 0), p(100, 0), p(100, 100)]), 10).path
    expect(square.segments).toEqual([line(p(0, -10), p(110, -10)), line(p(110, -10), p(110, 100))])
    const spike = offsetPath(polyline([p(0, 0), p(100, 0), p(0, 10)]), 10).path
    const tip = dense(spike, 0.1).filter(({ x }) => x > 100)
    const reach = Math.max(...tip.map((at) => geometry.distance(at, p(100, 0))))
    expect(reach).toBeGreaterThan(25)
    expect(reach).toBeLessThan(30)
  })

  test('a curve tighter than the distance is clipped, says so, and stays outside it', () => {
    const path = openPath([
      line(p(0, 0), p(50, 0)),
      ...arcPath(p(50, -5), 5, 90, 0).segments,
      line(p(55, -5), p(55, -60)),
    ])
    const { path: parallel, clipped } = offsetPath(path, 15)
    expect(clipped).toBe(true)
    const source = dense(path, 0.1)
    for (const at of dense(parallel, 0.5)) expect(gapTo(source, at)).toBeGreaterThan(15 - 0.02)
    expect(geometry.startOf(parallel)).toEqual(p(0, -15))
    expect(geometry.endOf(parallel)).toEqual(p(40, -60))
  })

  test('swept out as an area it is the same line, in short chords', () => {
    const path = openPath([cubic(p(0, 0), p(-20, 60), p(-30, 150), p(70, 190)), line(p(70, 190), p(70, 120))])
    for (const distance of [12, -12]) {
      const swept = dense(sweptOffset(path, distance), 1)
      const fitted = dense(offsetPath(path, distance).path, 0.5)
      // But for the inner corner's rounding, and the outer one's mitre, which sweeping leaves flat.
      const off = swept.filter((at) => geometry.distance(at, p(70, 190)) > 32).map((at) => gapTo(fitted, at))
      expect(Math.max(...off)).toBeLessThan(0.03)
      expect(geometry.distance(swept[0]!, fitted[0]!)).toBeLessThan(0.03)
      expect(geometry.distance(swept.at(-1)!, fitted.at(-1)!)).toBeLessThan(0.03)
    }
  })

  test('whatever the path, the answer is finite, joined and never throws', () => {
    fc.assert(
      fc.property(anyPath, between(-60, 60), (path, distance) => {
        const { segments } = offsetPath(path, distance).path
        segments.forEach((segment, i) => {
          const ends = [segment.from, segment.to]
          for (const { x, y } of ends) expect(Number.isFinite(x) && Number.isFinite(y)).toBe(true)
          if (i > 0) expect(segment.from).toEqual(segments[i - 1]!.to)
        })
      }),
      { numRuns: 300 },
    )
  })

  test.each([Number.NaN, Number.POSITIVE_INFINITY])('a distance of %d gives the path itself', (distance) => {
    const path = polyline([p(0, 0), p(100, 0)])
    expect(offsetPath(path, distance)).toEqual({ path, clipped: false })
  })
})
