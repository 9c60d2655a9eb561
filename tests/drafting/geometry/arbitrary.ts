import fc from 'fast-check'
import type { CubicSegment, Path, Point } from '../../../drafting/contract'
import { openPath } from '../../../drafting/geometry/path'
import { cubic, line } from '../../../drafting/geometry/segment'

/** mm, in thousandths: points may coincide, but differ by nothing that a drawing could not hold. */
const coordinate = fc.integer({ min: -400_000, max: 400_000 }).map((thousandths) => thousandths / 1000)

export const anyPoint: fc.Arbitrary<Point> = fc.record({ x: coordinate, y: coordinate })

/** Loops, cusps and inflections included. */
export const anyCubic: fc.Arbitrary<CubicSegment> = fc
  .tuple(anyPoint, anyPoint, anyPoint, anyPoint)
  .map(([from, control1, control2, to]) => cubic(from, control1, control2, to))

/** One to four segments, straight or curved, end to end. */
export const anyPath: fc.Arbitrary<Path> = fc
  .tuple(
    anyPoint,
    fc.array(fc.tuple(anyPoint, anyPoint, anyPoint, fc.boolean()), { minLength: 1, maxLength: 4 }),
  )
  .map(([start, parts]) => {
    let from = start
    return openPath(
      parts.map(([control1, control2, to, straight]) => {
        const segment = straight ? line(from, to) : cubic(from, control1, control2, to)
        from = to
        return segment
      }),
    )
  })
