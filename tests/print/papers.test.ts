import { PDFDocument, PDFDict, PDFName, PDFArray, PDFHexString } from 'pdf-lib'
import { describe, expect, test } from 'vitest'
import { patternPdf } from '@/app/_server/print/pattern-pdf'
import type { PatternRequest } from '@/app/_server/print/pattern-pdf'
import { draftGarment } from '@/drafting'
import { layOut, paperOf } from '@/drafting/drawing'
import { boundsOf } from '@/drafting/drawing/bounds'
import { sanityBodies } from '../support/bodies'
import { checkedByQpdf, pageText, rendered, words } from './support/rendered'

const draft = draftGarment({ garment: 'flared-dress', measurements: sanityBodies.one, explain: false })
const request: PatternRequest = {
  draft,
  title: { name: 'Trial', garment: 'Flared dress', maker: 'Invented workroom' },
  paper: paperOf('a4'),
  orientation: 'fewest',
  allowances: true,
  savedAt: new Date('2026-01-01T12:00:00Z'),
}
const inMm = (points: number) => (points / 72) * 25.4

async function pageSizes(pdf: Uint8Array) {
  const document = await PDFDocument.load(pdf)
  return document.getPages().map((page) => [inMm(page.getWidth()), inMm(page.getHeight())] as const)
}

describe('a roll', () => {
  test('takes the whole dress on one sheet as wide as the roll and no longer than the pieces', async () => {
    const asked = { ...request, paper: paperOf('roll', 914) }
    const [cover, sheet, ...more] = await pageSizes(await patternPdf(asked))
    expect(cover?.map(Math.round)).toEqual([210, 297])
    expect(more).toEqual([])
    expect(sheet?.[1]).toBeCloseTo(914, 1)
    const { drawing } = layOut(asked)
    const long = drawing.bounds.max.x - drawing.bounds.min.x
    expect(sheet?.[0]).toBeGreaterThan(long + 20)
    expect(sheet?.[0]).toBeLessThan(long + 25)
  })

  test('is cut into sheets that tape together when the pattern is longer than a sheet may be', () => {
    const { tiling } = layOut({ ...request, paper: { ...paperOf('roll', 400), height: 900 } })
    const printed = tiling.pages.filter((page) => !page.blank)
    expect(printed.length).toBeGreaterThan(2)
    expect(Math.max(tiling.width, tiling.height)).toBeLessThanOrEqual(900)
    expect(printed.every((page) => page.marks.length > 0)).toBe(true)
  })
})

test('large papers take fewer sheets, and their first page is an A4 one', async () => {
  const sheets = (id: Parameters<typeof paperOf>[0]) =>
    layOut({ ...request, paper: paperOf(id) }).tiling.pages.filter((page) => !page.blank).length
  const counts = (['a4', 'a3', 'a2', 'a1', 'a0'] as const).map(sheets)
  expect([...counts].sort((a, b) => b - a)).toEqual(counts)
  expect(counts[4]).toBeLessThanOrEqual(2)
  const [cover, sheet] = await pageSizes(await patternPdf({ ...request, paper: paperOf('a0') }))
  expect(cover?.map(Math.round)).toEqual([210, 297])
  expect([...(sheet ?? [])].sort((a, b) => a - b).map(Math.round)).toEqual([841, 1189])
})

test.each([
  ['half', 0.5],
  ['quarter', 0.25],
  ['fifth', 0.2],
] as const)(
  'at %s size every line is that much shorter, and the first page says so',
  async (scale, factor) => {
    const asked = { ...request, scale, pieces: ['front'] }
    const [small, full] = [asked, { ...request, pieces: ['front'] }].map((each) => {
      const { outlines } = layOut(each)
      const ys = (outlines[0]?.segments ?? []).map(({ from }) => from.y)
      return Math.max(...ys) - Math.min(...ys)
    })
    expect(small).toBeCloseTo((full ?? 0) * factor, 6)
    expect(pageText(await patternPdf(asked), 1)).toContain(`drawn at ${scale} size: not for cutting`)
  },
)

test('the pieces that are chosen are printed and listed, and no others', async () => {
  const pdf = await patternPdf({ ...request, pieces: ['sleeve'] })
  expect(pageText(pdf, 1)).toContain('Sleeve')
  expect(pageText(pdf, 1)).not.toContain('Back neck facing')
  const sheets = words(pdf)
    .slice(1)
    .flat()
    .map(({ text }) => text)
  expect(sheets).toContain('Sleeve')
  expect(sheets).not.toContain('Front')
})

test('a sheet says which one lies beyond each of its edges', async () => {
  const { tiling } = layOut(request)
  const printed = tiling.pages.filter((page) => !page.blank)
  const said = words(await patternPdf(request)).slice(1)
  printed.forEach((page, index) => {
    const beyond = printed.filter(
      (other) => Math.abs(other.row - page.row) + Math.abs(other.column - page.column) === 1,
    )
    const written = (said[index] ?? []).flatMap(({ text }) => /^[↑↓]([A-Z]+\d+)$/.exec(text)?.[1] ?? [])
    expect(written.sort(), page.name).toEqual(beyond.map(({ name }) => name).sort())
  })
})

test('edge to edge, every side that meets another sheet is trimmed, and the first page says how', async () => {
  const pdf = await patternPdf({ ...request, join: 'butt' })
  expect(pageText(pdf, 1)).toContain('edge to edge')
  expect(checkedByQpdf(pdf)).toContain('No syntax or stream encoding errors found')
})

test('bold lines take more ink, and nothing else changes its place', async () => {
  const small = { ...request, pieces: ['back-neck-facing'] }
  const ink = async (asked: PatternRequest) => {
    const [, sheet] = rendered(await patternPdf(asked))
    return (sheet?.dark ?? new Uint8Array()).reduce((sum, dark) => sum + (dark > 120 ? 1 : 0), 0)
  }
  expect(await ink({ ...small, bold: true })).toBeGreaterThan((await ink(small)) * 1.2)
})

test('readers can switch off cutting lines, stitching lines and the rest by their plain names', async () => {
  const document = await PDFDocument.load(await patternPdf(request))
  const groups = document.catalog
    .lookup(PDFName.of('OCProperties'), PDFDict)
    .lookup(PDFName.of('OCGs'), PDFArray)
  const names = Array.from({ length: groups.size() }, (_, index) =>
    groups.lookup(index, PDFDict).lookup(PDFName.of('Name'), PDFHexString).decodeText(),
  )
  expect(names).toEqual([
    'Cutting lines',
    'Stitching lines',
    'Grain and folds',
    'Inner lines, notches and marks',
    'Names of the pieces',
    'Sheet names, joins and match marks',
  ])
})

test('labels keep off the joins between sheets wherever their piece has room beside them', () => {
  let labels = 0
  let cut = 0
  for (const measurements of [sanityBodies.one, sanityBodies.two]) {
    for (const garment of ['flared-dress', 'bodice', 'a-line-skirt', 'gathered-skirt']) {
      const drafted = draftGarment({ garment, measurements, explain: false })
      const { drawing, tiling } = layOut({ ...request, draft: drafted, title: { name: 'Trial' } })
      const half = tiling.overlap / 2
      const upright = tiling.pages.filter(({ column }) => column > 0).map(({ window }) => window.x + half)
      const level = tiling.pages.filter(({ row }) => row > 0).map(({ window }) => window.y + half)
      for (const piece of drafted.pieces) {
        const own = drawing.items.filter((item) => item.layer === 'label' && item.piece === piece.id)
        const { min, max } = boundsOf(own)
        labels += 1
        if (upright.some((x) => x > min.x && x < max.x) || level.some((y) => y > min.y && y < max.y)) cut += 1
      }
    }
  }
  // Facings and other slim pieces have no room; without moving, more than a third are cut.
  expect(cut / labels).toBeLessThan(0.15)
})

test('a pattern that nobody waits for any more is stopped', async () => {
  const stop = new AbortController()
  const made = patternPdf(request, stop.signal)
  stop.abort(new Error('gone'))
  await expect(made).rejects.toThrow('gone')
})
