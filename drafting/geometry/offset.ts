import type { CubicSegment, Path, Point, Segment } from '../contract'
import { movesAlong } from './intersect'
import { offsetCubic, offsetTightCubic } from './offset-cubic'
import { trimLoops, type RawOffset } from './offset-loops'
import { cubic, line, tangentAt } from './segment'

/** A corner's mitre reaches at most so many times the distance; beyond that it is cut off square to its bisector. */
export const MITRE_LIMIT = 2.5

/** Joints that open by less than this (mm) are closed by moving the next curve's start. */
const SMOOTH = 1e-4

/** A parallel path, and whether some stretch of the original is too tight or too narrow to keep its full distance. */
export interface Offset {
  readonly path: Path
  readonly clipped: boolean
}

/**
 * The path at a fixed distance (mm) beside an open path: positive to the left of travel, which is outside a clockwise
 * outline. Within 0.02 mm of the true parallel; lines stay lines, smooth joints stay exact, outer corners are mitred (up to
 * 2.5 × the distance), inner ones trimmed. Where the original is tighter than the distance the loop is cut away and
 * `clipped` is true. Distance 0, or one that is no number, gives the path itself.
 */
export const offsetPath = (path: Path, distance: number): Offset => {
  if (distance === 0 || !Number.isFinite(distance) || path.segments.length === 0)
    return { path, clipped: false }
  const raw = rawOffset(path, distance)
  if (raw.segments.length === 0) return { path, clipped: true }
  const simple = raw.gaps.length === 0 && runsForward(raw.segments)
  if (simple) return { path: { segments: raw.segments, closed: false }, clipped: false }
  return trimLoops(path, distance, raw)
}

/** Whether all segments move forward along one direction: such a path cannot meet itself. */
const runsForward = (segments: readonly Segment[]): boolean => {
  const from = segments[0]!.from
  const to = segments[segments.length - 1]!.to
  const x = to.x - from.x
  const y = to.y - from.y
  for (const segment of segments) if (!movesAlong(segment, x, y)) return false
  return true
}

/** Every segment moved aside, with outer corners made but loops still in. */
const rawOffset = (path: Path, distance: number): RawOffset => {
  const raw: RawOffset = { segments: [], gaps: [], corners: [] }
  const { segments } = raw
  let end: Point | undefined
  let tangent: Point | undefined
  for (const source of path.segments) {
    if (source.kind === 'line' && source.from.x === source.to.x && source.from.y === source.to.y) continue
    const leaving = tangentAt(source, 0)
    const arriving = source.kind === 'line' ? leaving : tangentAt(source, 1)
    const straightOn = end && tangent ? joint(raw, end, tangent, leaving, source.from, distance) : false
    if (end) end = segments[segments.length - 1]!.to
    if (source.kind === 'line') {
      const to = aside(source.to, leaving, distance)
      if (straightOn) segments[segments.length - 1] = line(segments[segments.length - 1]!.from, to)
      else segments.push(line(end ?? aside(source.from, leaving, distance), to))
    } else if (!offsetCubic(source, distance, end, segments)) {
      const from = end ?? aside(source.from, leaving, distance)
      bridge(raw, offsetTightCubic(source, distance), from, aside(source.to, arriving, distance))
    }
    end = segments[segments.length - 1]!.to
    tangent = arriving
  }
  return raw
}

const aside = (at: Point, tangent: Point, distance: number): Point => ({
  x: at.x + tangent.y * distance,
  y: at.y - tangent.x * distance,
})

/** The forward runs of a curve that is too tight, with straight bridges over what turns back. */
const bridge = (raw: RawOffset, runs: readonly (readonly CubicSegment[])[], from: Point, to: Point): void => {
  const { segments } = raw
  let end = from
  const over = (next: Point): void => {
    if (Math.abs(next.x - end.x) + Math.abs(next.y - end.y) <= SMOOTH) return
    raw.gaps.push({ index: segments.length, tight: true })
    segments.push(line(end, next))
    end = next
  }
  for (const run of runs) {
    over(run[0]!.from)
    for (const piece of run) {
      segments.push(cubic(end, piece.control1, piece.control2, piece.to))
      end = piece.to
    }
  }
  over(to)
}

/**
 * Turns the corner between two source segments, so that the next one starts where the last segment ends. Answers true
 * when that segment is straight and in line with what follows, so that a line may take it over.
 */
const joint = (
  raw: RawOffset,
  end: Point,
  arriving: Point,
  leaving: Point,
  at: Point,
  distance: number,
): boolean => {
  const start = aside(at, leaving, distance)
  const turn = arriving.x * leaving.y - arriving.y * leaving.x
  const along = arriving.x * leaving.x + arriving.y * leaving.y
  if (along > 0 && Math.abs(start.x - end.x) + Math.abs(start.y - end.y) <= SMOOTH) return false
  if (turn * distance > 0 || (along < 0 && Math.abs(turn) < 1e-12)) {
    mitre(raw, end, arriving, leaving, start, Math.abs(distance))
    return true
  }
  raw.gaps.push({ index: raw.segments.length, tight: false })
  raw.segments.push(line(end, start))
  return false
}

/** Runs both sides on until they meet, or to a cut square to the bisector where that would be too far. */
const mitre = (
  raw: RawOffset,
  end: Point,
  arriving: Point,
  leaving: Point,
  start: Point,
  reach: number,
): void => {
  const { segments, corners } = raw
  const along = arriving.x * leaving.x + arriving.y * leaving.y
  // Of half the turn: the mitre reaches distance / cos from the corner.
  const cos = Math.sqrt(Math.max(0, (1 + along) / 2))
  const sin = Math.sqrt(Math.max(0, (1 - along) / 2))
  const limited = cos * MITRE_LIMIT < 1
  const run = limited ? (reach * (MITRE_LIMIT - cos)) / sin : (reach * sin) / cos
  const first = { x: end.x + arriving.x * run, y: end.y + arriving.y * run }
  const last = segments[segments.length - 1]!
  if (last.kind === 'line') segments[segments.length - 1] = line(last.from, first)
  else segments.push(line(end, first))
  corners.push(segments.length)
  if (!limited) {
    segments.push(line(first, start))
    return
  }
  const second = { x: start.x - leaving.x * run, y: start.y - leaving.y * run }
  segments.push(line(first, second), line(second, start))
}
