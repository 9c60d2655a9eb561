/** A pattern of 40 pages with 30 curves clipped on each: our own content streams against the operators of pdf-lib. */
import {
  appendBezierCurve,
  clip,
  endPath,
  moveTo,
  PDFDocument,
  popGraphicsState,
  pushGraphicsState,
  rectangle,
  rgb,
  setLineWidth,
  setStrokingColor,
  stroke,
} from 'pdf-lib'
import type { PDFOperator } from 'pdf-lib'
import { documentOf } from '@/app/_server/print/pattern-pdf'
import { pointsPerMm } from '@/app/_server/print/page-content'
import type { Drawing, DrawingItem, Segment } from '@/drafting/contract'
import { paperOf, tilePages } from '@/drafting/drawing'
import { sampleDraft } from '../support/sample-draft'
import { bench } from './support/bench'

const paper = paperOf('a4')
const columns = 8
const rows = 5
const printable = { width: 190, height: 277 }
const overlap = 12
const sheet = {
  width: columns * (printable.width - overlap) + overlap - 2,
  height: rows * (printable.height - overlap) + overlap - 2,
}

/** Curves that each cross two pages, 15 begun on every page: about 30 to be clipped on each. */
function curves(): readonly Segment[] {
  return Array.from({ length: columns * rows * 15 }, (_, index) => {
    const cell = Math.floor(index / 15)
    const x = (cell % columns) * (printable.width - overlap) + 20 + (index % 15) * 4
    const y = Math.floor(cell / columns) * (printable.height - overlap) + 15 + (index % 15) * 14
    const to = { x: Math.min(sheet.width, x + 190), y: Math.min(sheet.height, y + 60) }
    return {
      kind: 'cubic',
      from: { x, y },
      control1: { x: x + 60, y: y - 10 },
      control2: { x: x + 120, y: y + 70 },
      to,
    }
  })
}

const drawn = curves()
const drawing: Drawing = {
  items: drawn.map((segment, index): DrawingItem => {
    const path = { segments: [segment], closed: false }
    return { kind: 'path', path, layer: 'cut', style: 'cut', piece: 'bench', id: `bench/cut/${index}` }
  }),
  bounds: { min: { x: 0, y: 0 }, max: { x: sheet.width, y: sheet.height } },
}
const tiling = tilePages(drawing, { paper, orientation: 'portrait', overlap })
const printed = tiling.pages.filter((page) => !page.blank)
const request = {
  draft: { ...sampleDraft(), pieces: [] },
  title: { name: 'Bench', garment: 'Bench', maker: 'Nobody' },
  paper,
  orientation: 'portrait' as const,
  allowances: true,
  savedAt: new Date(0),
}

/** The same pages, each curve that may reach into one drawn there, with nothing written on them. */
async function byOperators(): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false })
  for (const { window } of printed) {
    const page = document.addPage([paper.width * pointsPerMm, paper.height * pointsPerMm])
    const x = (value: number) => (value - window.x + tiling.margin) * pointsPerMm
    const y = (value: number) => (paper.height - (value - window.y + tiling.margin)) * pointsPerMm
    const operators: PDFOperator[] = [
      pushGraphicsState(),
      rectangle(
        x(window.x),
        y(window.y + window.height),
        window.width * pointsPerMm,
        window.height * pointsPerMm,
      ),
      clip(),
      endPath(),
    ]
    for (const segment of drawn) {
      if (segment.kind !== 'cubic') continue
      const { from, control1, control2, to } = segment
      if (to.x < window.x || from.x > window.x + window.width) continue
      if (to.y + 10 < window.y || from.y - 10 > window.y + window.height) continue
      operators.push(
        setStrokingColor(rgb(0.1, 0.13, 0.25)),
        setLineWidth(1.7),
        moveTo(x(from.x), y(from.y)),
        appendBezierCurve(x(control1.x), y(control1.y), x(control2.x), y(control2.y), x(to.x), y(to.y)),
        stroke(),
      )
    }
    page.pushOperators(...operators, popGraphicsState())
  }
  return document.save({ objectsPerTick: Infinity })
}

const laidOut = { drawing, tiling, outlines: [] }
const ours = await documentOf(request, laidOut)
const empty = await documentOf(request, {
  ...laidOut,
  tiling: { ...tiling, pages: tiling.pages.slice(0, 1) },
})
const plain = await byOperators()
const kilobytes = (bytes: number) => (bytes / 1024).toFixed(2)

await bench('pdf, plain pdf-lib operators, lines only', byOperators, {
  seconds: 2,
  note: `${printed.length} pages, ${kilobytes(plain.length / printed.length)} KB a page`,
})
await bench('pdf, 40 pages with marks, map and names', () => documentOf(request, laidOut), {
  seconds: 3,
  aim: 30,
  against: 'pdf, plain pdf-lib operators, lines only',
  note: `${printed.length} pages, ${kilobytes((ours.length - empty.length) / (printed.length - 1))} KB a page, ${kilobytes(ours.length)} KB in all`,
})
