import type { Path, Point } from '../contract'
import { lengthBefore } from '../geometry/along'
import { zeros } from '../geometry/crossings'
import { lengthTo } from '../geometry/length'
import { evaluate } from '../geometry/segment'
import type { Side } from './outline-edge'

/** Where a side's offset, run on straight past its end, meets a line; `along` when that lies on the offset itself. */
export interface Meeting {
  readonly point: Point
  /** mm along the offset; undefined on its straight continuation. */
  readonly along?: number
}

/** mm: longer than any piece. */
const FAR = 5000

/** Where the end (or the start) of an offset, continued straight, first meets the line through a point. */
export const meetLine = (
  side: Side,
  atStart: boolean,
  through: Point,
  direction: Point,
): Meeting | undefined => {
  const from = atStart ? side.start : side.end
  const tx = atStart ? -side.leaving.x : side.arriving.x
  const ty = atStart ? -side.leaving.y : side.arriving.y
  const turn = tx * direction.y - ty * direction.x
  const off = (through.x - from.x) * direction.y - (through.y - from.y) * direction.x
  if (Math.abs(off) < 1e-9) return { point: onLine(from, through, direction) }
  if (Math.abs(turn) > 1e-9) {
    const run = off / turn
    if (run >= 0 && run < FAR) {
      return { point: onLine({ x: from.x + tx * run, y: from.y + ty * run }, through, direction) }
    }
  }
  return meetCurve(side.offset, atStart, through, direction)
}

/** The crossing of a path with the line through a point that lies nearest to the path's start (or end). */
const meetCurve = (path: Path, atStart: boolean, through: Point, direction: Point): Meeting | undefined => {
  const off = (p: Point): number => (p.x - through.x) * direction.y - (p.y - through.y) * direction.x
  const count = path.segments.length
  for (let n = 0; n < count; n++) {
    const index = atStart ? n : count - 1 - n
    const segment = path.segments[index]!
    let t = -1
    const note = (found: number): void => {
      if (t < 0 || (atStart ? found < t : found > t)) t = found
    }
    const d0 = off(segment.from)
    const d3 = off(segment.to)
    if (segment.kind === 'cubic') zeros(d0, off(segment.control1), off(segment.control2), d3, note)
    else if (d0 * d3 <= 0 && d0 !== d3) note(d0 / (d0 - d3))
    if (t >= 0) {
      return {
        point: onLine(evaluate(segment, t), through, direction),
        along: lengthBefore(path, index) + lengthTo(segment, t),
      }
    }
  }
  return undefined
}

/** The point moved the last bit onto the line, exactly where the line is upright or level. */
export const onLine = (p: Point, through: Point, direction: Point): Point => {
  if (direction.x === 0) return { x: through.x, y: p.y }
  if (direction.y === 0) return { x: p.x, y: through.y }
  const along = (p.x - through.x) * direction.x + (p.y - through.y) * direction.y
  return { x: through.x + direction.x * along, y: through.y + direction.y * along }
}
