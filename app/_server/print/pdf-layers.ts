import 'server-only'
import type { PDFDocument, PDFRef } from 'pdf-lib'
import { PDFHexString } from 'pdf-lib'
import type { Layer } from '@/drafting/drawing'

/** The layers of the document, as a reader lists them, each with the layers of the drawing that it shows. */
const groups = [
  { id: 'Cut', name: 'Cutting lines', layers: ['cut'] },
  { id: 'Stitch', name: 'Stitching lines', layers: ['stitch'] },
  { id: 'Grain', name: 'Grain and folds', layers: ['grain', 'fold'] },
  { id: 'Inner', name: 'Inner lines, notches and marks', layers: ['inner', 'notch', 'mark'] },
  { id: 'Label', name: 'Names of the pieces', layers: ['label'] },
  { id: 'Sheet', name: 'Sheet names, joins and match marks', layers: [] },
] as const satisfies readonly { id: string; name: string; layers: readonly Layer[] }[]

export type PdfLayer = (typeof groups)[number]['id']

const groupOf = new Map<string, PdfLayer>(
  groups.flatMap(({ id, layers }) => layers.map((layer): [string, PdfLayer] => [layer, id])),
)

/** The document's layer on which a layer of the drawing is shown. */
export const pdfLayerOf = (layer: string): PdfLayer => groupOf.get(layer) ?? 'Inner'

/** Enters the layers as optional content groups, all on. Returns what pages name them by. */
export function addPdfLayers(document: PDFDocument): Record<string, PDFRef> {
  const { context, catalog } = document
  const refs = groups.map(({ id, name }): [string, PDFRef] => [
    id,
    context.register(context.obj({ Type: 'OCG', Name: PDFHexString.fromText(name) })),
  ])
  const all = refs.map(([, ref]) => ref)
  catalog.set(
    context.obj('OCProperties'),
    context.obj({ OCGs: all, D: { Name: PDFHexString.fromText('All'), Order: all, ON: all } }),
  )
  return Object.fromEntries(refs)
}
