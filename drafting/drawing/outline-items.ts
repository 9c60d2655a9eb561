import type { Draft, DrawingItem, Edge, Path, Piece, Segment } from '../contract'
import { pathItem } from './items'
import type { DrawingOptions } from './options'

const isFold = (edge: Edge) => edge.role === 'fold' || edge.finish === 'fold'

/** A hem is stitched where it is turned up, so it is drawn as a turn. */
function styleOfEdge(edge: Edge, nett: boolean) {
  if (nett) return 'nett'
  return edge.finish === 'turned' ? 'turn' : 'stitch'
}

/** One line an edge, so that each can be found, picked and lit. Edges on the fold are not sewn; those without allowance are the cut line. */
export function stitchItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  const nett = options.allowances === false
  return piece.edges
    .filter((edge) => !isFold(edge) && (nett || edge.allowance > 0 || edge.role === 'dart'))
    .map((edge) => pathItem(piece, 'stitch', edge.id, styleOfEdge(edge, nett), edge.path))
}

/** The cut line in runs from fold to fold: one closed run when nothing lies on the fold. None in a nett pattern. */
export function cutItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  if (options.allowances === false) return []
  const first = piece.edges.findIndex(isFold)
  if (first < 0) return [pathItem(piece, 'cut', '0', 'cut', piece.cutLine)]
  const fromFold = [...piece.edges.slice(first), ...piece.edges.slice(0, first)]
  const runs: Segment[][] = []
  for (const edge of fromFold) {
    if (isFold(edge)) runs.push([])
    else runs.at(-1)?.push(...edge.cut.segments)
  }
  return runs
    .filter((run) => run.length > 0)
    .map((segments, index): DrawingItem => {
      const path: Path = { segments, closed: false }
      return pathItem(piece, 'cut', String(index), 'cut', path)
    })
}
