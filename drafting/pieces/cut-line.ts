import type { Path, Point, Segment } from '../contract'
import { endOf, endTangent, startOf, startTangent } from '../geometry/ends'
import { selfIntersections } from '../geometry/intersect'
import { offsetPath } from '../geometry/offset'
import { cutOf } from './chain'
import { dartCap } from './dart-cap'
import { foldCorner } from './fold-corner'
import { mitre, step } from './mitre'
import type { OutlineDart, OutlineEdge, Side, Turn } from './outline-edge'
import { square } from './square'
import { withTrueEnds } from './true-ends'
import { turned } from './turned'
import { isSound, untangle } from './untangle'

export type { OutlineDart, OutlineEdge } from './outline-edge'

/** The cut line of a piece: each edge's own stretch of it, all of them joined, and the edges whose allowance fell short. */
export interface CutLine {
  /** One for each edge, in order; each starts at exactly the coordinates where the one before it ends. */
  readonly cuts: readonly Path[]
  /** Closed, clockwise. */
  readonly cutLine: Path
  /** Ids of edges that are tighter or closer together than their allowance; what could be kept was. */
  readonly clipped: readonly string[]
}

/**
 * The line to cut a piece along, from its stitch edges in order (closed, clockwise; each edge ends where the next starts)
 * and the darts among them. Each edge's cut is its parallel at its allowance, with its start corner in front. Two
 * neighbouring edges of role 'dart' are crossed by a cap. Never throws: an allowance that is negative or no number counts
 * as 0.
 */
export const cutLine = (edges: readonly OutlineEdge[], darts: readonly OutlineDart[] = []): CutLine => {
  const clipped = new Set<string>()
  const sides = edges.map((edge) => sideOf(edge, clipped))
  const turns = corners(sides, darts, clipped)
  if (!turns) return asStitched(edges)
  const cuts: Path[] = []
  let tangled = false
  for (let i = 0; i < edges.length; i++) {
    const turn = turns[i]!
    const next = turns[(i + 1) % edges.length]!
    tangled ||= turn.enter !== undefined && next.leave !== undefined && next.leave <= turn.enter
    cuts.push(cutOf(hasOwnCut(sides[i]!) ? sides[i] : undefined, turn, next))
  }
  const line = joined(cuts)
  // Where no allowance fell short the parallels and corners cannot leave the stitch line outside: only crossings are left.
  const sound = !tangled && (clipped.size > 0 ? isSound(sides, cuts) : selfIntersections(line).length === 0)
  if (sound) return { cuts, cutLine: line, clipped: [...clipped] }
  const loose = untangle(sides, cuts)
  for (const id of loose.clipped) clipped.add(id)
  return { cuts: loose.cuts, cutLine: joined(loose.cuts), clipped: [...clipped] }
}

const joined = (cuts: readonly Path[]): Path => {
  const segments: Segment[] = []
  for (const cut of cuts) for (const segment of cut.segments) if (!isDot(segment)) segments.push(segment)
  return { segments, closed: true }
}

const isDot = (segment: Segment): boolean =>
  segment.kind === 'line' && segment.from.x === segment.to.x && segment.from.y === segment.to.y

/** What cannot have a cut line of its own (no edge with any length) keeps its stitch line. */
const asStitched = (edges: readonly OutlineEdge[]): CutLine => {
  const cuts = edges.map((edge) => edge.path)
  return { cuts, cutLine: joined(cuts), clipped: [] }
}

const sideOf = (edge: OutlineEdge, clipped: Set<string>): Side => {
  const wanted = edge.role === 'fold' || edge.role === 'dart' || !(edge.allowance > 0) ? 0 : edge.allowance
  const allowance = Number.isFinite(wanted) ? wanted : 0
  const parallel = offsetPath(edge.path, allowance)
  if (parallel.clipped) clipped.add(edge.id)
  const offset = parallel.clipped ? withTrueEnds(edge.path, parallel.path, allowance) : parallel.path
  return {
    edge,
    allowance,
    offset,
    tight: parallel.clipped,
    start: startOf(offset),
    end: endOf(offset),
    leaving: startTangent(edge.path),
    arriving: endTangent(edge.path),
  }
}

const hasOwnCut = (side: Side): boolean => side.edge.role !== 'dart'

const hasLength = (path: Path): boolean =>
  path.segments.some((segment) => segment.kind === 'cubic' || !isDot(segment))

/** The turn at the start of every edge; undefined when no edge has any length. */
const corners = (
  sides: readonly Side[],
  darts: readonly OutlineDart[],
  clipped: Set<string>,
): Turn[] | undefined => {
  const active: number[] = []
  for (let i = 0; i < sides.length; i++) if (hasLength(sides[i]!.edge.path)) active.push(i)
  if (active.length === 0) return undefined
  const turns: Turn[] = new Array<Turn>(sides.length)
  const count = active.length
  for (let n = 0; n < count; n++) {
    const index = active[n]!
    if (turns[index]) continue
    const a = sides[active[(n + count - 1) % count]!]!
    const b = sides[index]!
    const cap = capAt(sides, active, n, darts)
    if (cap) {
      turns[index] = cap.into
      turns[active[(n + 1) % count]!] = cap.middle
      turns[active[(n + 2) % count]!] = cap.outOf
      continue
    }
    const turn = cornerBetween(a, b, startOf(b.edge.path))
    if (turn.failed) clipped.add(b.edge.id)
    turns[index] = turn
  }
  // An edge without length is a point of the next one's corner.
  for (let i = sides.length - 1, next = turns[active[0]!]!; i >= 0; i--) {
    const own = turns[i]
    if (own) next = own
    else turns[i] = { joint: next.joint, leave: next.leave, lead: [] }
  }
  return turns
}

const capAt = (
  sides: readonly Side[],
  active: readonly number[],
  n: number,
  darts: readonly OutlineDart[],
): ReturnType<typeof dartCap> => {
  const count = active.length
  if (count < 4) return undefined
  const at = (k: number): Side => sides[active[(n + k + count) % count]!]!
  const first = at(0)
  const second = at(1)
  if (first.edge.role !== 'dart' || second.edge.role !== 'dart') return undefined
  const before = at(-1)
  const after = at(2)
  if (before.edge.role === 'dart' || after.edge.role === 'dart') return undefined
  const dart = darts.find((one) => one.edges?.[0] === first.edge.id || one.edges?.[1] === first.edge.id)
  return dartCap(before, [first.edge, second.edge], after, dart?.pressTo ?? 'centre')
}

const cornerBetween = (a: Side, b: Side, at: Point): Turn => {
  if (a.edge.role === 'fold' || b.edge.role === 'fold') return foldCorner(a, b, at)
  switch (b.edge.startCorner) {
    case 'mitre':
      return mitre(a, b, at)
    case 'square':
      return square(a, b, at)
    case 'turned':
      return turned(a, b, at)
    case 'step':
      return step(a, b, at)
  }
}
