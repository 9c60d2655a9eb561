import 'server-only'
import { PDFName, PDFRawStream, PrintScaling } from 'pdf-lib'
import type { PDFDocument, PDFRef } from 'pdf-lib'
import { pointsPerMm } from './page-content'

/** Says what a document is, and asks readers not to scale it. Nothing in it depends on the clock. */
export function describe(
  document: PDFDocument,
  { title, subject, savedAt }: { readonly title: string; readonly subject: string; readonly savedAt: Date },
): void {
  document.setTitle(title, { showInWindowTitleBar: true })
  document.setSubject(subject)
  document.setCreator('Chalkfold')
  document.setProducer('Chalkfold')
  document.setCreationDate(savedAt)
  document.setModificationDate(savedAt)
  document.setLanguage('en')
  const preferences = document.catalog.getOrCreateViewerPreferences()
  preferences.setPrintScaling(PrintScaling.None)
  preferences.setPickTrayByPDFSize(true)
}

/**
 * Adds a page with its content stream.
 * @param resources what all pages share
 * @param width and height of the paper, mm
 * @param bytes the deflated stream; see PageContent
 */
export function addPage(
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
