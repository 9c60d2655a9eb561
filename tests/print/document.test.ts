import { PDFDocument } from 'pdf-lib'
import { beforeAll, describe, expect, test, vi } from 'vitest'
import { patternPdf } from '@/app/_server/print/pattern-pdf'
import type { PatternRequest } from '@/app/_server/print/pattern-pdf'
import { paperOf } from '@/drafting/drawing'
import { sampleDraft } from '../support/sample-draft'
import { checkedByQpdf, pageText, words } from './support/rendered'

const request: PatternRequest = {
  draft: sampleDraft(),
  title: {
    name: 'Ọlá’s dress, 7 3/8 & ₦ <b>',
    garment: 'Flared dress',
    version: 'version 3',
    date: '1 Dec 2026',
    maker: 'Invented workroom',
  },
  paper: paperOf('a4'),
  orientation: 'fewest',
  allowances: true,
  savedAt: new Date('2026-12-01T12:00:00Z'),
}

describe('the document', () => {
  let pdf: Uint8Array
  beforeAll(async () => {
    pdf = await patternPdf(request)
  })

  test('qpdf finds nothing wrong', () => {
    expect(checkedByQpdf(pdf)).toContain('No syntax or stream encoding errors found')
  })

  test('names in any of our letters, fractions and currency read as they were written', () => {
    const front = pageText(pdf, 1)
    expect(front).toContain('Ọlá’s dress, 7 3⁄8 & ₦ <b>')
    expect(front).toContain('version 3 · 1 Dec 2026')
  })

  test('the first page says how to print, what the lines mean and which pieces there are', () => {
    const front = pageText(pdf, 1)
    for (const said of [
      '10 cm on each side',
      '4 in on each side',
      'never “Fit to page”',
      'cut here',
      'place on the fold',
      'back notch',
      'Front panel',
      'Cut 2 in main cloth, a left and a right',
      'Cut 1 in interfacing',
      'flames',
    ])
      expect(front).toContain(said)
  })

  test('each page says which it is, and the first page maps them all', () => {
    const [front = [], ...sheets] = words(pdf)
    const isName = (text: string) => /^[A-Z]\d+$/.test(text)
    const named = sheets.map((page) => page.filter(({ text }) => isName(text)).map(({ text }) => text))
    expect(named.every((names) => names.length === 1)).toBe(true)
    const mapped = front.filter(({ text, y }) => isName(text) && y > 130).map(({ text }) => text)
    expect(mapped.sort()).toEqual(named.flat().sort())
  })

  test('the label of a piece stands on the sheets', () => {
    const all = words(pdf)
      .slice(1)
      .flatMap((page) => page.map(({ text }) => text))
    expect(all).toContain('Waistband')
    expect(all.join(' ')).toContain('Cut 1 on the fold in main cloth')
  })

  test('the same request gives the same bytes, in this process and in a fresh one', async () => {
    expect(Buffer.from(await patternPdf(request)).equals(pdf)).toBe(true)
    vi.resetModules()
    const fresh = await import('@/app/_server/print/pattern-pdf')
    expect(Buffer.from(await fresh.patternPdf(request)).equals(pdf)).toBe(true)
  })

  test('a nett pattern says so', async () => {
    const nett = await patternPdf({ ...request, allowances: false })
    expect(pageText(nett, 1)).toContain('nett: no allowances')
    expect(
      words(nett)
        .flat()
        .map(({ text }) => text),
    ).toContain('Nett:')
  })

  test('viewers are asked not to scale, and pages have the size of their paper', async () => {
    const document = await PDFDocument.load(pdf)
    expect(document.catalog.getViewerPreferences()?.getPrintScaling()).toBe('None')
    for (const page of document.getPages()) {
      const sides = [page.getWidth(), page.getHeight()].map((points) => Math.round((points / 72) * 25.4))
      expect(sides.sort()).toEqual([210, 297])
    }
  })
})
