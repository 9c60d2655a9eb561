import { describe, expect, test } from 'vitest'
import { arrange, drawing, layers, printLayers, styles, toSvg, typesetFractions } from '@/drafting/drawing'
import { bounds, flatten } from '@/drafting/geometry/path'
import { pathLength } from '@/drafting/geometry/path'
import type { DrawingItem } from '@/drafting/contract'
import { sampleDraft } from '../../support/sample-draft'

const at0 = { 'front-panel': { x: 0, y: 0 }, waistband: { x: 0, y: 1000 } }

function found(items: readonly DrawingItem[], id: string) {
  const item = items.find((each) => each.id === id)
  if (!item) throw new Error(`${id} is not drawn`)
  return item
}

function pathOf(items: readonly DrawingItem[], id: string) {
  const item = found(items, id)
  if (item.kind !== 'path') throw new Error(`${id} is a text`)
  return item.path
}

const texts = (items: readonly DrawingItem[]) =>
  items.flatMap((item) => (item.kind === 'text' ? item.text : []))

describe('the display list', () => {
  test('every item has its own id, a known style, a piece and a layer in order', () => {
    const { items } = drawing(sampleDraft(), { layers })
    expect(new Set(items.map((item) => item.id)).size).toBe(items.length)
    for (const item of items) {
      expect(styles).toHaveProperty([item.style])
      expect(['front-panel', 'waistband']).toContain(item.piece)
    }
    const ranks = items.map((item) => (layers as readonly string[]).indexOf(item.layer))
    expect(ranks).toEqual([...ranks].sort((a, b) => a - b))
  })

  test('the cut line runs from fold to fold, and the fold runs on through the allowances at its ends', () => {
    const { items } = drawing(sampleDraft(), { places: at0 })
    const cut = pathOf(items, 'front-panel/cut/0')
    expect(cut.segments[0]?.from).toEqual({ x: 0, y: 25 })
    expect(cut.segments.at(-1)?.to).toEqual({ x: 0, y: 930 })
    expect(pathLength(pathOf(items, 'front-panel/fold/centre'))).toBe(905)
    expect(items.some((item) => item.id === 'front-panel/stitch/centre')).toBe(false)
  })

  test('a nett pattern has no cut line, and says on each piece that allowances are missing', () => {
    const { items } = drawing(sampleDraft(), { places: at0, allowances: false })
    expect(items.some((item) => item.layer === 'cut')).toBe(false)
    expect(found(items, 'front-panel/stitch/side').style).toBe('nett')
    expect(texts(items).filter((text) => text === 'Nett: add allowances')).toHaveLength(2)
    expect(pathLength(pathOf(items, 'front-panel/fold/centre'))).toBe(860)
  })

  test('a front notch is one tick and a back notch two, into the allowance and not deeper than half of it', () => {
    const { items } = drawing(sampleDraft(), { places: at0 })
    const front = bounds(pathOf(items, 'front-panel/notch/hip'))
    expect(front).toEqual({ min: { x: 409, y: 200 }, max: { x: 415, y: 200 } })
    const back = [
      pathOf(items, 'front-panel/notch/knee'),
      pathOf(items, 'front-panel/notch/knee-second'),
    ].map(bounds)
    expect(back.map((box) => box.min.y)).toEqual([598, 602])
    const band = bounds(pathOf(items, 'waistband/notch/middle'))
    expect(band.max.y - band.min.y).toBe(5)
  })

  test('labels say name, cutting, draft, version and date, and lie clear of every line of their piece', () => {
    const title = { name: 'Blue dress', version: 'version 3', date: '1 Dec 2026' }
    const { items } = drawing(sampleDraft(), { places: at0, title })
    expect(found(items, 'front-panel/label/cut-0')).toMatchObject({ text: 'Cut 1 on the fold in main cloth' })
    expect(found(items, 'waistband/label/cut-0')).toMatchObject({
      text: 'Cut 2 in main cloth, a left and a right',
    })
    expect(found(items, 'waistband/label/draft')).toMatchObject({
      text: 'Blue dress · version 3 · 1 Dec 2026',
    })
    const name = found(items, 'front-panel/label/name')
    if (name.kind !== 'text') throw new Error('the name is a text')
    // Between fold and grain, below the hip level.
    expect(name.at.x).toBeGreaterThan(40)
    expect(Math.abs(name.at.x - 200)).toBeGreaterThan(30)
    expect(name.at.y).toBeGreaterThan(210)
  })

  test('lengths are written in the wanted unit, with fractions set as type', () => {
    const inInches = drawing(sampleDraft(), { layers: ['dimension'], unit: 'in', places: at0 })
    expect(texts(inInches.items)).toEqual(['33\u20097⁄8 in'])
    const inCentimetres = drawing(sampleDraft(), { layers: ['dimension'], places: at0 })
    expect(texts(inCentimetres.items)).toEqual(['86 cm'])
  })

  test('a turned piece keeps its size and its texts stay readable', () => {
    const places = { ...at0, waistband: { x: 0, y: 0, turn: 90 } }
    const { items } = drawing(sampleDraft(), { places })
    const box = bounds(pathOf(items, 'waistband/cut/0'))
    expect(Math.round(box.max.y - box.min.y)).toBe(720)
    expect(Math.round(box.max.x - box.min.x)).toBe(80)
    const name = found(items, 'waistband/label/name')
    expect(name.kind === 'text' && Math.abs(name.turn)).toBe(90)
  })

  test('the same draft gives the same bytes', () => {
    const draw = () => JSON.stringify(drawing(sampleDraft(), { layers }))
    expect(draw()).toBe(draw())
  })

  test('bounds hold everything that is drawn', () => {
    const { items, bounds: box } = drawing(sampleDraft())
    for (const item of items) {
      if (item.kind !== 'path') continue
      for (const point of flatten(item.path)) {
        expect(point.x).toBeGreaterThanOrEqual(box.min.x - 0.06)
        expect(point.y).toBeLessThanOrEqual(box.max.y + 0.06)
      }
    }
  })
})

describe('laying pieces side by side', () => {
  test('no two overlap', () => {
    const draft = sampleDraft()
    const places = arrange(draft)
    const boxes = draft.pieces.map((piece) => {
      const { min, max } = bounds(piece.cutLine)
      const place = places[piece.id]
      if (!place) throw new Error(`${piece.id} has no place`)
      return { left: min.x + place.x, right: max.x + place.x, top: min.y + place.y, bottom: max.y + place.y }
    })
    const [a, b] = boxes
    if (!a || !b) throw new Error('two pieces were expected')
    expect(a.right < b.left || b.right < a.left || a.bottom < b.top || b.bottom < a.top).toBe(true)
  })

  test('a small change of size moves nothing', () => {
    const draft = sampleDraft()
    const grown = JSON.parse(JSON.stringify(draft).replaceAll('415', '416')) as typeof draft
    expect(arrange(grown)).toEqual(arrange(draft))
  })

  test('a piece keeps the place it was given until it would lie on another', () => {
    const draft = sampleDraft()
    const kept = { 'front-panel': { x: 300, y: 100 }, waistband: { x: 0, y: -400 } }
    expect(arrange(draft, { kept })).toEqual(kept)
    const crowded = arrange(draft, { kept: { ...kept, waistband: { x: 310, y: 200 } } })
    expect(crowded['front-panel']).toEqual(kept['front-panel'])
    expect(crowded.waistband).not.toEqual({ x: 310, y: 200 })
  })
})

describe('SVG text', () => {
  test('is true to scale: its size in mm is that of its view box', () => {
    const svg = toSvg(drawing(sampleDraft(), { places: at0, layers: printLayers }), { title: 'Dress' })
    const size = /width="([\d.]+)mm" height="([\d.]+)mm" viewBox="[-\d.]+ [-\d.]+ ([\d.]+) ([\d.]+)"/.exec(
      svg,
    )
    expect(size?.[1]).toBe(size?.[3])
    expect(size?.[2]).toBe(size?.[4])
    expect(svg).toContain('<g data-layer="cut"><g data-piece="front-panel">')
    expect(svg).toContain('L415 930')
  })

  test('markup in a name is text', () => {
    const title = { name: '<script>alert("1")</script>' }
    const svg = toSvg(drawing(sampleDraft(), { title }), { title: title.name })
    expect(svg).not.toContain('<script')
    expect(svg).toContain('&lt;script&gt;')
  })
})

describe('fractions', () => {
  test.each([
    ['7 3/8 in', '7\u20093⁄8 in'],
    ['1/2', '1⁄2'],
    ['35 ÷ 6 + 1 1/2 ≈ 7 3/8', '35 ÷ 6 + 1\u20091⁄2 ≈ 7\u20093⁄8'],
    ['12/1/2026', '12/1/2026'],
    ['24/7 dress', '24/7 dress'],
  ])('%s', (typed, set) => expect(typesetFractions(typed)).toBe(set))
})
