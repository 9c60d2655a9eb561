import type { Piece, Point } from '../contract'
import { bounds, flatten } from '../geometry/path'
import { stitchLine } from '../pieces/stitch-line'

export interface LabelPlace {
  readonly at: Point
  /** 0, or −90 to read from below upwards. */
  readonly turn: number
  readonly scale: number
}

type Stroke = readonly [Point, Point]

/** Rows that are tried, as shares of the piece's height; the first that fits is taken, so that a label seldom jumps. */
const rows = [0.4, 0.5, 0.32, 0.6, 0.7, 0.24, 0.8, 0.16, 0.88]
const scales = [1, 0.75, 0.55, 0.4, 0.28]
/** Clear of the lines around it, mm. */
const clearance = 3
/** Curves may be this far off, mm: within the clearance. */
const tolerance = 1.5

/**
 * Where a label of so many mm fits inside the stitch line of a piece, clear of its grain line, inner lines and darts: upright
 * if it can be, else turned, else smaller. When nothing fits, the middle of the piece at the smallest size.
 */
export function labelPlace(piece: Piece, width: number, height: number): LabelPlace {
  const outline = stitchLine(piece)
  const wall = strokes(flatten(outline, tolerance))
  const inner = innerStrokes(piece)
  let turnedWall: readonly Stroke[] | undefined
  let turnedInner: readonly Stroke[] | undefined
  for (const scale of scales) {
    const upright = search(wall, inner, width * scale, height * scale)
    if (upright) return { at: upright, turn: 0, scale }
    turnedWall ??= wall.map(turnedStroke)
    turnedInner ??= inner.map(turnedStroke)
    const turned = search(turnedWall, turnedInner, width * scale, height * scale)
    if (turned) return { at: turnedBack(turned), turn: -90, scale }
  }
  const box = bounds(outline)
  const middle = { x: (box.min.x + box.max.x) / 2, y: (box.min.y + box.max.y) / 2 }
  return { at: middle, turn: 0, scale: scales.at(-1) ?? 1 }
}

function innerStrokes(piece: Piece): readonly Stroke[] {
  const paths = [...piece.lines.map((line) => line.path), ...piece.darts.flatMap((dart) => dart.legs)]
  return [[piece.grain.from, piece.grain.to], ...paths.flatMap((path) => strokes(flatten(path, tolerance)))]
}

function strokes(points: readonly Point[]): Stroke[] {
  return points.slice(1).map((to, index): Stroke => [points[index] ?? to, to])
}

/** A quarter turn clockwise, in which a label that reads upwards lies level. */
const turned = (point: Point): Point => ({ x: -point.y, y: point.x })
const turnedBack = (point: Point): Point => ({ x: point.y, y: -point.x })
const turnedStroke = ([from, to]: Stroke): Stroke => [turned(from), turned(to)]

function search(
  wall: readonly Stroke[],
  inner: readonly Stroke[],
  width: number,
  height: number,
): Point | null {
  const { left, right, top, bottom } = boxOf(wall)
  if (right - left < width + 2 * clearance) return null
  const half = height / 2 + clearance
  for (const row of rows) {
    const y = top + (bottom - top) * row
    if (y - half < top || y + half > bottom) continue
    const gap = widestGap(wall, inner, y, half)
    if (gap && gap.to - gap.from >= width + 2 * clearance) return { x: (gap.from + gap.to) / 2, y }
  }
  return null
}

function boxOf(wall: readonly Stroke[]) {
  let left = Infinity
  let right = -Infinity
  let top = Infinity
  let bottom = -Infinity
  for (const [{ x, y }] of wall) {
    if (x < left) left = x
    if (x > right) right = x
    if (y < top) top = y
    if (y > bottom) bottom = y
  }
  return { left, right, top, bottom }
}

/** The widest stretch of the band y ± half that no line enters and that lies inside the wall. */
function widestGap(wall: readonly Stroke[], inner: readonly Stroke[], y: number, half: number) {
  const blocked: { from: number; to: number }[] = []
  for (const strokes of [wall, inner]) {
    for (const stroke of strokes) {
      const span = shadow(stroke, y - half, y + half)
      if (span) blocked.push(span)
    }
  }
  blocked.sort((a, b) => a.from - b.from)
  let best: { from: number; to: number } | null = null
  let reach = blocked[0]?.to ?? 0
  for (const span of blocked) {
    const wide = span.from - reach
    if (wide > (best ? best.to - best.from : 0) && isInside(wall, (reach + span.from) / 2, y)) {
      best = { from: reach, to: span.from }
    }
    reach = Math.max(reach, span.to)
  }
  return best
}

/** The stretch of x that a stroke covers within the band, or null when it stays outside. */
function shadow([from, to]: Stroke, top: number, bottom: number): { from: number; to: number } | null {
  const falls = from.y <= to.y
  const upper = falls ? from : to
  const lower = falls ? to : from
  if (lower.y < top || upper.y > bottom) return null
  const rise = lower.y - upper.y
  const run = lower.x - upper.x
  const a = rise === 0 ? upper.x : upper.x + (run * (Math.max(top, upper.y) - upper.y)) / rise
  const b = rise === 0 ? lower.x : upper.x + (run * (Math.min(bottom, lower.y) - upper.y)) / rise
  return a < b ? { from: a, to: b } : { from: b, to: a }
}

function isInside(wall: readonly Stroke[], x: number, y: number): boolean {
  let inside = false
  for (const [from, to] of wall) {
    if (from.y > y === to.y > y) continue
    if (from.x + ((to.x - from.x) * (y - from.y)) / (to.y - from.y) > x) inside = !inside
  }
  return inside
}
