import 'server-only'
import { PDFDocument, PDFName, PDFRawStream, PrintScaling } from 'pdf-lib'
import type { PDFRef } from 'pdf-lib'
import type { Draft } from '@/drafting/contract'
import { layOut } from '@/drafting/drawing'
import type { LaidOut, Orientation, Paper } from '@/drafting/drawing'
import { drawCover } from './cover-page'
import { PageContent, pointsPerMm } from './page-content'
import { placedItems } from './page-items'
import type { PatternTitle } from './pattern-title'
import { addStamps } from './stamps'
import { captionWidth, drawTile, textsOf } from './tile-page'
import { TypeSetter } from './type-setter'

export interface PatternRequest {
  readonly draft: Draft
  readonly title: PatternTitle
  readonly paper: Paper
  readonly orientation: Orientation
  /** false prints the nett pattern. */
  readonly allowances: boolean
  /** When the revision was saved: the document says so, and nothing in it depends on the clock. */
  readonly savedAt: Date
}

/**
 * The paper pattern: a first page that proves the scale, then the drawing at its true size in pages that tape together. The same
 * request gives the same bytes.
 */
export async function patternPdf(request: PatternRequest): Promise<Uint8Array> {
  return documentOf(request, layOut(request))
}

/** Writes a drawing that has been laid out in pages. */
export async function documentOf(request: PatternRequest, laidOut: LaidOut): Promise<Uint8Array> {
  const { drawing, tiling, outlines } = laidOut
  const { title, paper } = request
  const document = await PDFDocument.create({ updateMetadata: false })
  describe(document, request)
  const saved = [title.version, title.date].filter(Boolean).join(' · ')
  const texts = [
    ...textsOf(drawing),
    title.name,
    saved,
    title.garment,
    title.maker,
    ...request.draft.pieces.map(({ name }) => name),
  ]
  const type = await TypeSetter.for(document, texts)
  const resources = document.context.nextRef()
  const add = (width: number, height: number, draw: (content: PageContent) => void) => {
    const content = new PageContent(height, type)
    draw(content)
    addPage(document, resources, width, height, content.bytes())
  }

  add(paper.width, paper.height, (content) => drawCover(content, { ...request, tiling, type, outlines }))
  const printed = tiling.pages.filter((page) => !page.blank)
  const context = {
    tiling,
    items: placedItems(drawing),
    caption: [title.name, saved].map((line) => type.shortened(line, 3, captionWidth)),
    sheets: new Map(printed.map((page, index) => [page.name, index + 1])),
  }
  for (const page of printed) {
    add(tiling.width, tiling.height, (content) => drawTile(content, page, context))
  }

  const fonts = Object.fromEntries(type.fonts().map(({ name, font }) => [name, font.ref]))
  document.context.assign(
    resources,
    document.context.obj({ Font: fonts, XObject: addStamps(document, tiling, type) }),
  )
  return document.save({ addDefaultPage: false, objectsPerTick: Infinity })
}

function describe(document: PDFDocument, { title, savedAt }: PatternRequest): void {
  document.setTitle(title.name, { showInWindowTitleBar: true })
  document.setSubject([title.garment, title.version].filter(Boolean).join(', '))
  document.setCreator('Chalkfold')
  document.setProducer('Chalkfold')
  document.setCreationDate(savedAt)
  document.setModificationDate(savedAt)
  document.setLanguage('en')
  const preferences = document.catalog.getOrCreateViewerPreferences()
  preferences.setPrintScaling(PrintScaling.None)
  preferences.setPickTrayByPDFSize(true)
}

function addPage(
  document: PDFDocument,
  resources: PDFRef,
  width: number,
  height: number,
  bytes: Uint8Array,
): void {
  const page = document.addPage([width * pointsPerMm, height * pointsPerMm])
  const { context } = document
  const stream = PDFRawStream.of(context.obj({ Filter: 'FlateDecode', Length: bytes.length }), bytes)
  page.node.set(PDFName.of('Contents'), context.register(stream))
  page.node.set(PDFName.of('Resources'), resources)
}
