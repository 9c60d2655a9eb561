import type { Path, Point } from '../../../drafting/contract'
import type { CutLine } from '../../../drafting/pieces/cut-line'
import type { Shape } from './pieces'
import { dense, gapTo, parallelPoints, polygonArea, polygonContains, polygonIsSimple } from './reference'

/** mm: how far a cut may be from its allowance. */
const TOLERANCE = 0.02

/** Everything wrong with a cut line, in words, found by the slow reference alone. */
export const cutLineFaults = (shape: Shape, { cuts, cutLine, clipped }: CutLine): string[] => {
  const faults: string[] = []
  if (cuts.length !== shape.edges.length) faults.push('not one cut for each edge')
  const points = dense(cutLine, 1)
  if (!points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))) return [...faults, 'not finite']
  faults.push(...jointFaults(cuts, cutLine))
  if (polygonArea(points) <= 0) faults.push('not clockwise')
  if (!polygonIsSimple(points.slice(1))) faults.push('crosses itself')
  for (const edge of shape.edges) {
    const lost = dense(edge.path, 2).filter(
      (p) => !polygonContains(points, p) && gapTo(points, p) > TOLERANCE,
    )
    if (lost.length > 0) faults.push(`${edge.id} lies outside the cut line at ${place(lost[0]!)}`)
  }
  const count = shape.edges.length
  shape.edges.forEach((edge, index) => {
    if (edge.role === 'dart' || clipped.includes(edge.id)) return
    const before = shape.edges[(index + count - 1) % count]!
    const after = shape.edges[(index + 1) % count]!
    const mitred = edge.startCorner === 'mitre' && after.startCorner === 'mitre'
    const widest = Math.max(before.allowance, edge.allowance, after.allowance)
    const margin = (mitred ? 2.6 : 4) * widest + 1
    const others = shape.edges.filter((one) => one !== edge && one.allowance > 0)
    const taken = (p: Point): boolean =>
      others.some((one) => gapTo(dense(one.path, 1), p) < one.allowance - TOLERANCE)
    faults.push(...allowanceFaults(edge.id, edge.path, edge.allowance, cuts[index]!, margin, taken))
  })
  return faults
}

const jointFaults = (cuts: readonly Path[], cutLine: Path): string[] => {
  const faults: string[] = []
  const same = (a: Point, b: Point): boolean => a.x === b.x && a.y === b.y
  const check = (name: string, segments: Path['segments'], round: boolean): void => {
    segments.forEach((segment, i) => {
      const next = segments[i + 1] ?? (round ? segments[0]! : undefined)
      if (next && !same(segment.to, next.from)) faults.push(`${name} is open at ${place(segment.to)}`)
    })
  }
  check(
    'the chain of cuts',
    cuts.flatMap((cut) => cut.segments),
    true,
  )
  check('the cut line', cutLine.segments, true)
  return faults
}

/** Away from its corners an edge's cut is the allowance from it, all along, save where another's allowance covers it. */
const allowanceFaults = (
  id: string,
  path: Path,
  allowance: number,
  cut: Path,
  margin: number,
  taken: (p: Point) => boolean,
): string[] => {
  const stitch = dense(path, 0.5)
  const from = stitch[0]!
  const to = stitch[stitch.length - 1]!
  const clear = (p: Point): boolean =>
    Math.hypot(p.x - from.x, p.y - from.y) > margin && Math.hypot(p.x - to.x, p.y - to.y) > margin
  const own = dense(cut, 1)
  const faults: string[] = []
  for (const { at, from: foot } of parallelPoints(path, allowance, 3)) {
    if (!clear(at) || !clear(foot) || gapTo(stitch, at) < allowance - 0.005) continue
    const gap = gapTo(own, at)
    if (gap > TOLERANCE && !taken(at))
      return [...faults, `the cut of ${id} is ${gap.toFixed(3)} from where it belongs, ${place(at)}`]
  }
  for (const p of own) {
    if (!clear(p)) continue
    const gap = gapTo(stitch, p)
    if (gap < allowance - TOLERANCE)
      return [...faults, `the cut of ${id} is only ${gap.toFixed(3)} away at ${place(p)}`]
  }
  return faults
}

const place = (p: Point): string => `${p.x.toFixed(2)}, ${p.y.toFixed(2)}`
