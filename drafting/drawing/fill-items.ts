import type { Draft, DrawingItem, Piece } from '../contract'
import { pathItem } from './items'
import type { DrawingOptions } from './options'
import { stitchLine } from '../pieces/stitch-line'
import type { StyleName } from './styles'

/** A whisper of a dye by part, so that a sleeve is not taken for a facing; the name on the piece carries the meaning. */
function tint(piece: Piece): StyleName {
  if (piece.id.includes('facing')) return 'tint-weld'
  if (piece.id.includes('sleeve') || piece.id.includes('cuff')) return 'tint-madder'
  return /pocket|band|tie|collar/.test(piece.id) ? 'tint-fern' : 'tint-indigo'
}

/** The cloth of a piece: its dye within the stitch line, and a neutral tint out to the cut line. */
export function fillItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  const cloth = pathItem(piece, 'fill', 'piece', tint(piece), stitchLine(piece))
  if (options.allowances === false) return [cloth]
  return [cloth, pathItem(piece, 'allowance-fill', 'piece', 'allowance-fill', piece.cutLine)]
}
