import 'server-only'
import { cuttingWords, styleOf, styles } from '@/drafting/drawing'
import type { Style, StyleName } from '@/drafting/drawing'
import { arrowhead } from '@/drafting/drawing/arrowhead'
import type { CoverContext } from './cover-page'
import type { PageContent } from './page-content'

const box: Style = { stroke: 'ink', width: 0.2 }
const size = 3.4
const leading = 4.3
/** Length of a line's sample in the legend, mm. */
const sample = 22

interface Column {
  readonly x: number
  readonly width: number
}

const allLines: readonly {
  readonly style: StyleName
  readonly words: string
  readonly of: 'cut' | 'nett' | 'both'
}[] = [
  { style: 'cut', words: 'cut here', of: 'cut' },
  { style: 'nett', words: 'stitching line: add allowances', of: 'nett' },
  { style: 'stitch', words: 'stitch here', of: 'cut' },
  { style: 'turn', words: 'turn up or fold when sewing', of: 'both' },
  { style: 'fold', words: 'place on the fold of the cloth', of: 'both' },
  { style: 'grain', words: 'straight grain', of: 'both' },
  { style: 'inner', words: 'level or placement', of: 'both' },
]

function heading(content: PageContent, text: string, x: number, y: number): number {
  content.text(text, { x, y }, { size: 4.4, weight: 600 })
  return y + 6
}

/** The arrowheads at both ends of the grain's sample. */
function drawHeads(content: PageContent, x: number, y: number): void {
  content.path(arrowhead({ x: x - 0.2, y }, { x: -1, y: 0 }, 3, 1.6), styles.arrowhead)
  content.path(arrowhead({ x: x + sample + 0.2, y }, { x: 1, y: 0 }, 3, 1.6), styles.arrowhead)
}

/** What each kind of line means. Of a nest, each size's. Returns where the next list may start. */
export function drawLegend(
  content: PageContent,
  { allowances, nest }: CoverContext,
  x: number,
  top: number,
): number {
  let y = heading(content, 'Lines', x, top)
  for (const { style, words } of allLines.filter(
    ({ of }) => of === 'both' || (of === 'cut') === allowances,
  )) {
    content.line({ x, y: y - 1.1 }, { x: x + sample, y: y - 1.1 }, styles[style])
    if (style === 'grain') drawHeads(content, x, y - 1.1)
    content.text(words, { x: x + 25, y }, { size })
    y += 5.2
  }
  for (const { name, style } of nest?.sizes ?? []) {
    content.line({ x, y: y - 1.1 }, { x: x + sample, y: y - 1.1 }, styleOf(style))
    content.text(`size ${name}`, { x: x + 25, y }, { size })
    y += 5.2
  }
  for (const [ticks, words] of [
    [1, 'front notch'],
    [2, 'back notch'],
  ] as const) {
    content.line({ x, y: y + 0.6 }, { x: x + sample, y: y + 0.6 }, styles[allowances ? 'cut' : 'nett'])
    for (let tick = 0; tick < ticks; tick += 1) {
      const at = x + 11 + tick * 4 - (ticks - 1) * 2
      content.line({ x: at, y: y + 0.6 }, { x: at, y: y - 2.6 }, styles.notch)
    }
    content.text(words, { x: x + 25, y }, { size })
    y += 5.2
  }
  return y
}

/** Every piece with how it is cut. */
export function drawPieces(
  content: PageContent,
  { draft, type }: CoverContext,
  column: Column,
  top: number,
): number {
  let y = heading(content, 'Pieces', column.x, top)
  for (const piece of draft.pieces) {
    // To be ticked off when it is cut.
    content.boxes([{ x: column.x, y: y - 2.4 }], 2.6, 2.6, box)
    content.text(piece.name, { x: column.x + 4.5, y }, { size, weight: 600 })
    const words = piece.cut.flatMap((cutting) => type.wrap(cuttingWords(cutting), size, column.width - 4.5))
    y = content.lines(words, { x: column.x + 4.5, y: y + leading }, leading, { size }) + 0.9
  }
  return y
}

const cautions = [
  'Cut a toile in cheap cloth before dear cloth.',
  'Shears, rotary cutters and irons hurt: keep them from children and off the edge of the table.',
]
const flaredCaution = 'Keep loose, flared sleeves and hems away from flames and machinery.'

/** Short, where the risk is, once. */
export function drawCautions(
  content: PageContent,
  context: CoverContext,
  column: Column,
  top: number,
): number {
  const flared = context.draft.pieces.some((piece) => /front|skirt|sleeve|panel/.test(piece.id))
  let y = heading(content, 'Take care', column.x, top)
  for (const caution of flared ? [...cautions, flaredCaution] : cautions) {
    y =
      content.lines(context.type.wrap(caution, size, column.width), { x: column.x, y }, leading, { size }) + 1
  }
  return y
}
