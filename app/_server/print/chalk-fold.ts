import 'server-only'
import type { Piece, Point } from '@/drafting/contract'
import type { ChalkFold } from '@/drafting/chalk/folds'
import type { Style } from '@/drafting/drawing'
import { bounds } from '@/drafting/geometry/path'
import { transformPath } from '@/drafting/geometry/transform'
import { stitchLine } from '@/drafting/pieces/stitch-line'
import type { Block } from './blocks'
import type { PageContent } from './page-content'

const cloth: Style = { stroke: 'ink', width: 0.3 }
const folded: Style = { stroke: 'indigo', width: 1, dash: [5, 1.2, 0.8, 1.2] }
const lies: Style = { stroke: 'madder', width: 0.4 }
const arrow: Style = { stroke: 'ink', width: 0.35 }

/** mm */
const width = 62
const height = 46
/** Between two layers that show at the open side, mm. */
const step = 1.6

/**
 * The cloth as it lies on the table: its layers, which side is a fold, which way the grain runs, and the piece on it. The picture is
 * the piece's own outline; the cloth is drawn round it.
 */
export function foldPicture(fold: ChalkFold, piece: Piece): Block {
  return { height: height + 6, draw: (content, at) => drawFold(content, at, fold, piece) }
}

function drawFold(content: PageContent, at: Point, { layers, onFold }: ChalkFold, piece: Piece): void {
  const left = at.x + 2
  const top = at.y + 1
  // Layers stand out a little at the open side, like the edges of folded cloth.
  for (let layer = layers - 1; layer >= 0; layer -= 1) {
    const out = layer * step
    content.boxes([{ x: left, y: top }], width - 14 + out, height - 8, cloth)
  }
  if (layers > 1) content.line({ x: left, y: top }, { x: left, y: top + height - 8 }, folded)
  if (layers === 4 && !onFold) content.line({ x: left, y: top }, { x: left + width - 14, y: top }, folded)
  drawPiece(content, { x: left, y: top }, piece, onFold)
  const grain = left + width - 20
  content.line({ x: grain, y: top + 8 }, { x: grain, y: top + height - 16 }, arrow)
  for (const [y, way] of [
    [top + 8, 1],
    [top + height - 16, -1],
  ] as const) {
    content.line({ x: grain, y }, { x: grain - 1, y: y + way * 2 }, arrow)
    content.line({ x: grain, y }, { x: grain + 1, y: y + way * 2 }, arrow)
  }
  const said = { size: 3, dye: 'walnut' } as const
  content.text('grain', { x: grain + 1.6, y: top + height / 2 - 3 }, said)
  const under = top + height - 3
  content.text(layers > 1 ? 'fold' : 'selvedge', { x: left, y: under }, said)
  content.text('selvedge', { x: left + width - 14, y: under }, { ...said, align: 'end' })
  content.text(
    `${layers} ${layers === 1 ? 'layer' : 'layers'}`,
    { x: left + (width - 14) / 2, y: under },
    { ...said, align: 'middle' },
  )
}

/** The piece laid with its grain upright, against the fold or clear of it. */
function drawPiece(content: PageContent, corner: Point, piece: Piece, onFold: boolean): void {
  const line = stitchLine(piece)
  const { from, to } = piece.grain
  const lying = Math.abs(to.x - from.x) > Math.abs(to.y - from.y)
  const upright = lying ? transformPath({ a: 0, b: 1, c: -1, d: 0, e: 0, f: 0 }, line) : line
  const { min, max } = bounds(upright)
  const scale = Math.min((width - 26) / (max.x - min.x), (height - 14) / (max.y - min.y))
  const e = corner.x + (onFold ? 0 : 4) - min.x * scale
  const f = corner.y + 3 - min.y * scale
  content.path(transformPath({ a: scale, b: 0, c: 0, d: scale, e, f }, upright), lies)
}
