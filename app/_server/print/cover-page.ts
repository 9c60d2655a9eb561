import 'server-only'
import type { Draft, Nest, Path } from '@/drafting/contract'
import { safeMargin, trueMeasure } from '@/drafting/drawing'
import type { Measured, Paper, PrintScale, Tiling } from '@/drafting/drawing'
import { drawCautions, drawLegend, drawPieces } from './cover-lists'
import { drawSquares } from './cover-squares'
import type { PageContent } from './page-content'
import type { PatternTitle } from './pattern-title'
import type { TypeSetter } from './type-setter'

export interface CoverContext {
  readonly draft: Draft
  /** Whose sizes are listed. */
  readonly nest?: Nest
  readonly title: PatternTitle
  readonly paper: Paper
  readonly tiling: Tiling
  readonly allowances: boolean
  readonly scale?: PrintScale
  /** What the printer made of 100 mm before it was corrected for. */
  readonly measured?: Measured
  readonly type: TypeSetter
  /** Of the pieces as they lie on the sheet, for the map. */
  readonly outlines: readonly Path[]
}

const scaleWords: Readonly<Record<PrintScale, string>> = {
  full: 'full',
  half: 'half',
  quarter: 'quarter',
  fifth: 'fifth',
}

/** The first page, always upright: test squares with how to print, the page map, the lines, the pieces and the cautions. */
export function drawCover(content: PageContent, context: CoverContext): void {
  const { paper, title, tiling } = context
  // Lines have a width of their own.
  const edge = safeMargin(paper, context.measured ?? trueMeasure, 10) + 0.5
  const left = edge
  const right = paper.width - edge
  const printed = tiling.pages.filter((page) => !page.blank).length
  content.text(
    context.type.shortened(title.name, 8, right - left, 600),
    { x: left, y: 17 },
    { size: 8, weight: 600 },
  )
  const facts = [
    title.garment,
    title.version,
    title.date,
    `${paper.name}, ${printed} ${printed === 1 ? 'sheet' : 'sheets'} after this one`,
    context.allowances ? 'allowances included' : 'nett: no allowances',
    context.scale && context.scale !== 'full'
      ? `drawn at ${scaleWords[context.scale]} size: not for cutting`
      : '',
  ].filter(Boolean)
  content.text(
    context.type.shortened(facts.join(' · '), 3.6, right - left),
    { x: left, y: 22.5 },
    { size: 3.6, dye: 'walnut' },
  )
  content.line({ x: left, y: 26 }, { x: right, y: 26 }, { stroke: 'ink', width: 0.35 })
  const bottomOfSquares = drawSquares(content, context, { x: left, y: 30.5 })
  const column = { x: left + 101.6 + 7, width: right - left - 101.6 - 7 }
  let y = 33.5
  y = drawLegend(content, context, column.x, y)
  y = drawPieces(content, context, column, y + 4)
  drawCautions(content, context, column, y + 4)
  content.text(
    title.maker,
    { x: left, y: Math.min(bottomOfSquares + 6, paper.height - edge - 1) },
    { size: 3, dye: 'walnut' },
  )
}
