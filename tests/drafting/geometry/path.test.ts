import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Path, Point } from '../../../drafting/contract'
import * as geometry from '../../../drafting/geometry'
import { anyCubic, anyPath, anyPoint } from './arbitrary'
import { chordLength, dense, gapTo, polygonArea, polygonContains } from './reference'

const { line, cubic, openPath, closedPath } = geometry
const p = (x: number, y: number): Point => ({ x, y })

describe('lengths', () => {
  test('a quarter circle of radius 100 mm has its length to a thousandth of the arc error', () => {
    const arc = geometry.arcPath(p(0, 0), 100, 0, 90)
    expect(Math.abs(geometry.pathLength(arc) - 50 * Math.PI)).toBeLessThan(0.001)
  })

  test.each([
    ['a cusp', cubic(p(0, 0), p(100, 100), p(0, 100), p(100, 0)), 182.842712474619],
    ['a curve that doubles back on a line', cubic(p(0, 0), p(100, 0), p(100, 0), p(0, 0)), 150],
    ['controls on the end points', cubic(p(0, 0), p(0, 0), p(100, 0), p(100, 0)), 100],
    ['no extent at all', cubic(p(5, 5), p(5, 5), p(5, 5), p(5, 5)), 0],
  ])('%s is measured to 1e-6 mm', (_, curve, length) => {
    expect(Math.abs(geometry.segmentLength(curve) - length)).toBeLessThan(1e-6)
  })

  test('any curve is as long as its finest chords', () => {
    fc.assert(
      fc.property(anyCubic, (curve) => {
        // Chords fall short by a share that falls with the square of their number: extrapolated.
        const coarse = chordLength(dense(openPath([curve]), 0.4))
        const fine = chordLength(dense(openPath([curve]), 0.2))
        expect(Math.abs(geometry.segmentLength(curve) - fine)).toBeLessThan(
          2 * Math.abs(fine - coarse) + 1e-6,
        )
      }),
      { numRuns: 100 },
    )
  })

  test('the parameter at a distance leads back to the distance', () => {
    fc.assert(
      fc.property(anyCubic, fc.double({ min: 0, max: 1, noNaN: true }), (curve, share) => {
        const distance = geometry.segmentLength(curve) * share
        const [before] = geometry.splitSegment(curve, geometry.parameterAt(curve, distance))
        expect(Math.abs(geometry.segmentLength(before) - distance)).toBeLessThan(1e-6)
      }),
    )
  })

  test('a point past either end is that end', () => {
    const path = openPath([line(p(0, 0), p(10, 0)), cubic(p(10, 0), p(20, 0), p(20, 10), p(20, 20))])
    expect(geometry.pointAt(path, -3)).toEqual(p(0, 0))
    expect(geometry.pointAt(path, 1e9)).toEqual(p(20, 20))
    expect(geometry.pointAt(path, 4)).toEqual(p(4, 0))
  })
})

describe('cutting and joining', () => {
  test('slices put together again are the path: same length, same points, exact ends', () => {
    fc.assert(
      fc.property(anyPath, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (path, share) => {
        const whole = geometry.pathLength(path)
        const cut = whole * share
        const first = geometry.slicePath(path, 0, cut)
        const second = geometry.slicePath(path, cut, whole)
        expect(geometry.startOf(first)).toEqual(geometry.startOf(path))
        expect(geometry.endOf(second)).toEqual(geometry.endOf(path))
        const both = geometry.joinPaths(first, second)
        expect(Math.abs(geometry.pathLength(both) - whole)).toBeLessThan(1e-6)
        for (const part of [0.2, 0.5, 0.8]) {
          expect(
            geometry.distance(geometry.pointAt(both, part * whole), geometry.pointAt(path, part * whole)),
          ).toBeLessThan(1e-6)
        }
      }),
    )
  })

  test('every joint of a joined path is the very same coordinates', () => {
    const joined = geometry.joinPaths(
      openPath([line(p(0, 0), p(10, 0))]),
      openPath([line(p(10 + 4e-7, -3e-7), p(20, 5))]),
    )
    expect(joined.segments[0]!.to).toEqual(joined.segments[1]!.from)
  })

  test('paths that do not touch are refused with both places named', () => {
    expect(() =>
      geometry.joinPaths(openPath([line(p(0, 0), p(1, 0))]), openPath([line(p(2, 0), p(3, 0))])),
    ).toThrow(/1, 0.*2, 0/)
    expect(() => closedPath([line(p(0, 0), p(1, 0)), line(p(1, 0), p(1, 1))])).toThrow(RangeError)
  })

  test('reversing twice gives the path back, and once its length and closedness', () => {
    fc.assert(
      fc.property(anyPath, (path) => {
        const back = geometry.reversePath(path)
        expect(geometry.reversePath(back)).toEqual(path)
        expect(back.closed).toBe(path.closed)
        expect(geometry.startOf(back)).toEqual(geometry.endOf(path))
        expect(Math.abs(geometry.pathLength(back) - geometry.pathLength(path))).toBeLessThan(1e-6)
      }),
    )
  })
})

describe('shape', () => {
  const round = (path: Path): Path => closedPath(path.segments)

  test('a circle has its area and box, and clockwise is down from the right', () => {
    const circle = round(geometry.arcPath(p(20, 30), 100, 0, 360))
    expect(Math.abs(geometry.signedArea(circle) - Math.PI * 1e4)).toBeLessThan(1)
    expect(geometry.isClockwise(circle)).toBe(true)
    expect(geometry.isClockwise(geometry.reversePath(circle))).toBe(false)
    const box = geometry.bounds(circle)
    expect(Math.abs(box.min.x + 80)).toBeLessThan(0.01)
    expect(Math.abs(box.max.y - 130)).toBeLessThan(0.01)
  })

  test('area, box and inside agree with thousands of chords', () => {
    fc.assert(
      fc.property(anyCubic, anyPoint, (curve, point) => {
        const path = openPath([curve])
        const points = dense(path, 0.2)
        expect(Math.abs(geometry.signedArea(path) - polygonArea(points))).toBeLessThan(1)
        const box = geometry.bounds(path)
        expect(Math.abs(box.min.x - Math.min(...points.map(({ x }) => x)))).toBeLessThan(0.01)
        expect(Math.abs(box.max.y - Math.max(...points.map(({ y }) => y)))).toBeLessThan(0.01)
        const closed = [...points, points[0]!]
        if (gapTo(closed, point) > 0.05) {
          expect(geometry.containsPoint(path, point)).toBe(polygonContains(points, point))
        }
      }),
      { numRuns: 100 },
    )
  })

  test('the flattened path stays within its tolerance, ends included', () => {
    fc.assert(
      fc.property(anyPath, fc.constantFrom(0.01, 0.05, 0.5), (path, tolerance) => {
        const flat = geometry.flatten(path, tolerance)
        expect(flat[0]).toEqual(geometry.startOf(path))
        expect(flat.at(-1)).toEqual(geometry.endOf(path))
        for (const at of dense(path, 7)) expect(gapTo(flat, at)).toBeLessThan(tolerance + 1e-9)
      }),
      { numRuns: 60 },
    )
  })

  test('the nearest place is as near as any of thousands, and where it says', () => {
    fc.assert(
      fc.property(anyPath, anyPoint, (path, point) => {
        const near = geometry.nearestOn(path, point)
        expect(Math.abs(near.gap - gapTo(dense(path, 0.2), point))).toBeLessThan(0.001)
        expect(Math.abs(geometry.distance(near.point, point) - near.gap)).toBeLessThan(1e-9)
        expect(geometry.distance(geometry.pointAt(path, near.distance), near.point)).toBeLessThan(1e-6)
      }),
      { numRuns: 100 },
    )
  })

  test('arcs stay on their circle within 0.01 mm up to a radius of 3 m', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: -360, max: 360, noNaN: true }),
        fc.double({ min: 1, max: 360, noNaN: true }),
        fc.boolean(),
        (radius, from, turn, back) => {
          const arc = geometry.arcPath(p(7, -3), radius, from, back ? from - turn : from + turn)
          for (const at of geometry.flatten(arc, 0.01)) {
            expect(Math.abs(geometry.distance(at, p(7, -3)) - radius)).toBeLessThan(0.01)
          }
          expect(Math.abs(geometry.pathLength(arc) - (radius * turn * Math.PI) / 180)).toBeLessThan(0.02)
        },
      ),
    )
  })
})

describe('transforms', () => {
  test('mirroring in a line twice is no change, and points on the line stay', () => {
    fc.assert(
      fc.property(anyPath, anyPoint, anyPoint, (path, from, to) => {
        fc.pre(geometry.distance(from, to) > 1)
        const mirror = geometry.mirrorIn(from, to)
        const twice = geometry.transformPath(geometry.compose(mirror, mirror), path)
        dense(twice, 50).forEach((at, i) => {
          expect(geometry.distance(at, dense(path, 50)[i]!)).toBeLessThan(1e-6)
        })
        expect(geometry.distance(geometry.applyTo(mirror, from), from)).toBeLessThan(1e-9)
      }),
      { numRuns: 40 },
    )
  })

  test('compose does the second first', () => {
    const both = geometry.compose(geometry.translation(10, 0), geometry.rotation(90, p(0, 0)))
    expect(geometry.applyTo(both, p(1, 0))).toEqual(p(10, 1))
  })

  test('a closed path stays exactly closed', () => {
    const circle = closedPath(geometry.arcPath(p(20, 30), 100, 0, 360).segments)
    const turned = geometry.transformPath(geometry.rotation(33, p(1, 2)), circle)
    expect(turned.closed).toBe(true)
    expect(geometry.endOf(turned)).toEqual(geometry.startOf(turned))
    turned.segments.forEach((segment, i) => {
      expect(segment.from).toEqual(turned.segments.at(i - 1)!.to)
    })
  })

  test('mirrorX keeps the centre line exactly', () => {
    expect(geometry.applyTo(geometry.mirrorX, p(0, 12.3)).x === 0).toBe(true)
  })
})

describe('points', () => {
  test('quarter turns are exact', () => {
    expect(geometry.towards(90)).toEqual(p(0, 1))
    expect(geometry.towards(-90)).toEqual(p(0, -1))
    expect(geometry.rotate(p(11, 2), 90, p(1, 2))).toEqual(p(1, 12))
    expect(geometry.perpendicular(p(1, 0))).toEqual(p(-0, 1))
  })
})
