import 'server-only'
import { PDFDocument } from 'pdf-lib'
import type { Draft } from '@/drafting/contract'
import { coverPaper, layOut } from '@/drafting/drawing'
import type { LaidOut, LayOutRequest } from '@/drafting/drawing'
import { drawCover } from './cover-page'
import { addPage, describe } from './document'
import { PageContent } from './page-content'
import type { Pen } from './page-content'
import { placedItems } from './page-items'
import { addPdfLayers } from './pdf-layers'
import type { PatternTitle } from './pattern-title'
import { addStamps } from './stamps'
import { captionWidth, drawTile, textsOf } from './tile-page'
import { TypeSetter } from './type-setter'

/** What is drawn for whom, and how it is wanted on paper. */
export interface PatternRequest extends LayOutRequest {
  readonly title: PatternTitle
  /** All lines black, for printers without colour. Default false. */
  readonly black?: boolean
  /** Lines nearly twice their weight, for printers that run dry. Default false. */
  readonly bold?: boolean
  /** When the revision was saved: the document says so, and nothing in it depends on the clock. */
  readonly savedAt: Date
}

/** Of bold lines, as a multiple of their weight. */
const boldWeight = 1.8

/**
 * The paper pattern: a first page that proves the scale, then the drawing at its true size in pages that tape together. The same
 * request gives the same bytes.
 *
 * @param signal stops the work between pages
 */
export async function patternPdf(request: PatternRequest, signal?: AbortSignal): Promise<Uint8Array> {
  await mayGoOn(signal)
  return documentOf(request, layOut(request), signal)
}

/** Lets a message come in that nobody waits any more. @throws the signal's reason */
async function mayGoOn(signal: AbortSignal | undefined): Promise<void> {
  if (!signal) return
  await new Promise((resolve) => setImmediate(resolve))
  signal.throwIfAborted()
}

/** So many pages are drawn between two looks at whether anybody still waits. */
const pagesAtOnce = 20

/** Writes a drawing that has been laid out in pages. */
export async function documentOf(
  request: PatternRequest,
  laidOut: Pick<LaidOut, 'drawing' | 'tiling' | 'outlines'>,
  signal?: AbortSignal,
): Promise<Uint8Array> {
  const { drawing, tiling, outlines } = laidOut
  const { title } = request
  const pen = { black: request.black ?? false, weight: request.bold ? boldWeight : 1 }
  const document = await PDFDocument.create({ updateMetadata: false })
  describe(document, { title: title.name, subject: subjectOf(title), savedAt: request.savedAt })
  const saved = [title.version, title.date].filter(Boolean).join(' · ')
  const texts = [
    ...textsOf(drawing),
    title.name,
    saved,
    title.garment,
    title.maker,
    ...request.draft.pieces.map(({ name }) => name),
    ...(request.nest?.sizes ?? []).map(({ name }) => name),
  ]
  const type = await TypeSetter.for(document, texts)
  const resources = document.context.nextRef()
  const add = (width: number, height: number, own: Pen, draw: (content: PageContent) => void) => {
    const content = new PageContent(height, type, own)
    draw(content)
    addPage(document, resources, width, height, content.bytes())
  }

  const paper = coverPaper(request.paper)
  add(paper.width, paper.height, { ...pen, weight: 1 }, (content) =>
    drawCover(content, { ...request, draft: wanted(request), paper, tiling, type, outlines }),
  )
  const printed = tiling.pages.filter((page) => !page.blank)
  const context = {
    tiling,
    items: placedItems(drawing),
    caption: [title.name, saved].map((line) => type.shortened(line, 3, captionWidth)),
    sheets: new Map(printed.map((page, index) => [page.name, index + 1])),
  }
  for (const [index, page] of printed.entries()) {
    if (index % pagesAtOnce === 0) await mayGoOn(signal)
    add(tiling.width, tiling.height, pen, (content) => drawTile(content, page, context))
  }

  const fonts = Object.fromEntries(type.fonts().map(({ name, font }) => [name, font.ref]))
  document.context.assign(
    resources,
    document.context.obj({
      Font: fonts,
      XObject: addStamps(document, tiling, type, pen),
      Properties: addPdfLayers(document),
    }),
  )
  return document.save({ addDefaultPage: false, objectsPerTick: Infinity })
}

/** The draft with the pieces that are printed. */
function wanted({ draft, pieces }: PatternRequest): Draft {
  return pieces ? { ...draft, pieces: draft.pieces.filter(({ id }) => pieces.includes(id)) } : draft
}

const subjectOf = ({ garment, version }: PatternTitle) => [garment, version].filter(Boolean).join(', ')
