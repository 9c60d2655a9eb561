import 'server-only'
import { PDFDocument } from 'pdf-lib'
import type { Draft, Unit } from '@/drafting/contract'
import { chalkGuide } from '@/drafting/chalk/guide'
import type { Paper } from '@/drafting/drawing'
import { addPage, describe } from './document'
import { paginated } from './blocks'
import { chalkBlocks } from './chalk-blocks'
import { PageContent } from './page-content'
import type { PatternTitle } from './pattern-title'
import { TypeSetter } from './type-setter'

export interface ChalkRequest {
  /** Drafted on the tape, with its steps. */
  readonly draft: Draft
  readonly title: PatternTitle
  readonly paper: Paper
  readonly unit: Unit
  /** mm between two marks of the tape. */
  readonly tape: number
  readonly savedAt: Date
}

const edge = 12
/** Between the two columns, mm. */
const gutter = 8
/** From the top of the paper to where blocks begin, and what is left below them, mm. */
const top = 20
const bottom = 14

/** The chalk guide on paper, upright, in letters that are read at arm's length. The same request gives the same bytes. */
export async function chalkPdf(request: ChalkRequest): Promise<Uint8Array> {
  const { draft, title, paper, unit, tape } = request
  const guide = chalkGuide(draft, unit, tape)
  const document = await PDFDocument.create({ updateMetadata: false })
  describe(document, {
    title: `${title.name}, chalk guide`,
    subject: title.garment,
    savedAt: request.savedAt,
  })
  const type = await TypeSetter.for(document, [title.name, title.maker, title.garment, title.version ?? ''])
  const width = paper.width - 2 * edge
  const column = (width - gutter) / 2
  const pages = paginated(chalkBlocks(guide, draft, type, column), paper.height - top - bottom, 2)
  const resources = document.context.nextRef()
  const said = [title.name, 'chalk guide', title.version, title.date].filter(Boolean).join(' · ')
  pages.forEach((blocks, index) => {
    const content = new PageContent(paper.height, type)
    const count = `${index + 1} of ${pages.length}`
    const line = type.shortened(said, 3.6, width - 22)
    content.text(line, { x: edge, y: 14 }, { size: 3.6, dye: 'walnut' })
    content.text(count, { x: edge + width, y: 14 }, { size: 3.6, dye: 'walnut', align: 'end' })
    content.line({ x: edge, y: 16 }, { x: edge + width, y: 16 }, { stroke: 'walnut', width: 0.2 })
    for (const { block, column: index, down } of blocks)
      block.draw(content, { x: edge + index * (column + gutter), y: top + down })
    content.text(title.maker, { x: edge, y: paper.height - 11 }, { size: 3, dye: 'walnut' })
    addPage(document, resources, paper.width, paper.height, content.bytes())
  })
  const fonts = Object.fromEntries(type.fonts().map(({ name, font }) => [name, font.ref]))
  document.context.assign(resources, document.context.obj({ Font: fonts }))
  return document.save({ addDefaultPage: false, objectsPerTick: Infinity })
}
