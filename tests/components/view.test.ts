import { describe, expect, it } from 'vitest'
import { fitView, panBy, toScreen, toSheet, zoomAt } from '@/components/sheet/view'

const start = { scale: 0.5, x: 30, y: -20 }

describe('the view of the sheet', () => {
  it('keeps the place under the pointer while zooming in and out', () => {
    const pointer = { x: 411, y: 277 }
    const under = toSheet(start, pointer)
    let view = start
    for (const factor of [1.1, 1.7, 0.3, 4, 0.9]) view = zoomAt(view, pointer, factor)
    const now = toScreen(view, under)
    expect(Math.hypot(now.x - pointer.x, now.y - pointer.y)).toBeLessThan(1e-6)
  })

  it('does not slide when the zoom has reached its end', () => {
    const end = zoomAt(start, { x: 0, y: 0 }, 1e9)
    expect(zoomAt(end, { x: 300, y: 300 }, 2)).toEqual(end)
  })

  it('moves by as many pixels as the fingers did', () => {
    expect(panBy(start, 12, -7)).toEqual({ scale: 0.5, x: 42, y: -27 })
  })

  it('fits everything inside the window, centred', () => {
    const bounds = { min: { x: -100, y: 0 }, max: { x: 900, y: 1200 } }
    const view = fitView(bounds, { width: 800, height: 600 }, 40)
    const low = toScreen(view, bounds.min)
    const high = toScreen(view, bounds.max)
    expect(low.y).toBeCloseTo(40, 6)
    expect(high.y).toBeCloseTo(560, 6)
    expect((low.x + high.x) / 2).toBeCloseTo(400, 6)
  })
})
