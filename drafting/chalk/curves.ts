import type { Draft, Edge, Path, Piece, Point } from '../contract'
import { endOf, pathLength, pointAt, startOf } from '../geometry'
import { distance, lerp } from '../geometry/point'
import { edgeName } from './edge-name'
import type { Say } from './guide'
import { letterAt } from './layings'

/** A line to be chalked between two marks: straight, or a straight line and how deep the curve stands off it. */
export interface ChalkCurve {
  readonly edge: string
  /** 'Draw the armhole: …' */
  readonly words: string
  /** 'From D to I: 8 1/2 in straight' */
  readonly straight: string
  /** Depths off the straight line at a quarter, the middle and three quarters of it, mm, positive into the piece; none for a straight line. */
  readonly depths: readonly number[]
  /** 'Off it inwards: quarter 5/8 in, middle 5/8 in, three quarters 3/8 in' */
  readonly off?: string
}

/** mm: a line that stands off less is chalked along the ruler. */
const flat = 1

/** The edges of a piece in the order of its steps, told as a cutter chalks them freehand. */
export function curvesOf(draft: Draft, piece: Piece, say: Say): readonly ChalkCurve[] {
  return draft.steps.flatMap((step) => {
    const edge = step.piece === piece.id ? piece.edges.find(({ id }) => id === step.edge) : undefined
    return edge ? [curveOf(piece, edge, step.text, say)] : []
  })
}

function curveOf(piece: Piece, edge: Edge, words: string, say: Say): ChalkCurve {
  const { path } = edge
  const [start, end] = [startOf(path), endOf(path)]
  const ends = [start, end].map((at) => letterAt(piece, at))
  const between = ends.every(Boolean) ? `From ${ends[0]} to ${ends[1]}` : `Along ${edgeName(edge.id)}`
  const chord = distance(start, end)
  const depths = depthsOf(path, start, end)
  const deepest = Math.max(...depths.map(({ mm }) => Math.abs(mm)))
  return {
    edge: edge.id,
    words,
    straight: `${between}: ${say(chord)} straight${deepest < flat ? '' : `, ${say(pathLength(path))} along the curve`}`,
    depths: deepest < flat ? [] : depths.map(({ mm }) => mm),
    ...(deepest < flat ? {} : { off: depthWords(depths, say) }),
  }
}

type Depth = { readonly at: string; readonly mm: number }

/** One side said once; a curve that changes sides says it at each depth. */
function depthWords(depths: readonly Depth[], say: Say): string {
  const side = (mm: number) => (mm > 0 ? 'inwards' : 'outwards')
  const seen = new Set(depths.filter(({ mm }) => Math.abs(mm) >= flat).map(({ mm }) => side(mm)))
  const one = seen.size === 1 ? [...seen][0] : undefined
  const each = depths.map(({ at, mm }) => {
    if (Math.abs(mm) < flat) return `${at} none`
    return one ? `${at} ${say(Math.abs(mm))}` : `${at} ${say(Math.abs(mm))} ${side(mm)}`
  })
  return `Off it${one ? ` ${one}` : ''}: ${each.join(', ')}`
}

const places = [
  { at: 'quarter', share: 0.25 },
  { at: 'middle', share: 0.5 },
  { at: 'three quarters', share: 0.75 },
] as const

/** How far the curve stands off its chord, square to it, at shares of the chord, mm: inwards is to the right of the way. */
function depthsOf(path: Path, start: Point, end: Point): readonly Depth[] {
  const chord = distance(start, end)
  if (chord < 1e-6) return [{ at: 'middle', mm: 0 }]
  const along = { x: (end.x - start.x) / chord, y: (end.y - start.y) / chord }
  return places.map(({ at, share }) => {
    const foot = lerp(start, end, share)
    return { at, mm: offAt(path, foot, along) }
  })
}

/** Where the square from a foot on the chord meets the curve: found by walking the curve until it has come as far along. */
function offAt(path: Path, foot: Point, along: Point): number {
  const length = pathLength(path)
  const ahead = (at: Point) => (at.x - foot.x) * along.x + (at.y - foot.y) * along.y
  let from = 0
  let to = length
  for (let round = 0; round < 50; round += 1) {
    const middle = (from + to) / 2
    if (ahead(pointAt(path, middle)) < 0) from = middle
    else to = middle
  }
  const met = pointAt(path, (from + to) / 2)
  return (met.x - foot.x) * -along.y + (met.y - foot.y) * along.x
}
