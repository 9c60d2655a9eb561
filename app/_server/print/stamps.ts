import 'server-only'
import { PDFName, PDFRawStream } from 'pdf-lib'
import type { PDFDocument, PDFRef } from 'pdf-lib'
import type { Style, Tiling } from '@/drafting/drawing'
import { PageContent } from './page-content'
import type { Pen } from './page-content'
import { drawMap } from './page-map'
import type { TypeSetter } from './type-setter'

/** Room for the map on a sheet, mm. */
export const mapRoom = { width: 26, height: 22 }

const mark: Style = { stroke: 'ink', width: 0.2 }
const radius = 3
const arm = 4.5

/** What all sheets carry alike, drawn once: the match mark about its middle, and the map from its upper left corner. */
export function addStamps(
  document: PDFDocument,
  tiling: Tiling,
  type: TypeSetter,
  pen: Pen,
): Record<string, PDFRef> {
  return {
    Mark: add(document, type, pen, (content) => {
      content.circle({ x: 0, y: 0 }, radius, mark)
      content.line({ x: -arm, y: 0 }, { x: arm, y: 0 }, mark)
      content.line({ x: 0, y: -arm }, { x: 0, y: arm }, mark)
    }),
    Map: add(document, type, pen, (content) => drawMap(content, tiling, { x: 0, y: 0 }, mapRoom)),
  }
}

function add(
  document: PDFDocument,
  type: TypeSetter,
  pen: Pen,
  draw: (content: PageContent) => void,
): PDFRef {
  // Marks are read by their middles: they stay fine however bold the pattern is.
  const content = new PageContent(null, type, { ...pen, weight: 1 })
  draw(content)
  const bytes = content.bytes()
  const { context } = document
  const box = context.obj([-arm - 1, -arm - 1, mapRoom.width + 1, mapRoom.height + 1])
  const form = context.obj({ Type: 'XObject', Subtype: 'Form', Filter: 'FlateDecode', Length: bytes.length })
  form.set(PDFName.of('BBox'), box)
  return context.register(PDFRawStream.of(form, bytes))
}
