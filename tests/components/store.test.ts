import { describe, expect, it } from 'vitest'
import { problemsAt, createStudioStore } from '@/components/studio/store'
import { isStale } from '@/components/studio/state'
import { bibEngine, bibOrder } from './support/bib'

const open = (order = bibOrder) => createStudioStore({ engine: bibEngine, order, unit: 'in' })
const widthOf = (store: ReturnType<typeof open>) =>
  store.get().draft?.dimensions.find((dimension) => dimension.id === 'width')?.length

describe('the studio store', () => {
  it('redraws on every change of a gesture and keeps one undo for the whole of it', () => {
    const store = open()
    store.begin()
    for (const width of [310, 320, 330]) {
      store.put('design.width', width)
      expect(widthOf(store)).toBe(width)
    }
    store.commit('Width')
    expect(store.get().undoes).toBe('Width')
    store.undo()
    expect(widthOf(store)).toBe(300)
    expect(store.get().undoes).toBeUndefined()
  })

  it('comes back to the bytes after as many undos as changes, and forward again', () => {
    const store = open()
    const start = JSON.stringify([store.get().order, store.get().typed])
    for (let turn = 0; turn < 20; turn += 1) store.change('design.depth', 100 + turn, 'Depth', `${turn} cm`)
    const end = JSON.stringify([store.get().order, store.get().typed])
    for (let turn = 0; turn < 20; turn += 1) store.undo()
    expect(JSON.stringify([store.get().order, store.get().typed])).toBe(start)
    for (let turn = 0; turn < 20; turn += 1) store.redo()
    expect(JSON.stringify([store.get().order, store.get().typed])).toBe(end)
  })

  it('puts everything back exactly when a gesture is cancelled', () => {
    const store = open()
    const before = store.get()
    store.begin()
    store.put('design.width', 444, '17 1/2 in')
    store.cancel()
    expect(store.get().order).toBe(before.order)
    expect(store.get().typed).toBe(before.typed)
    expect(store.get().draft).toBe(before.draft)
    expect(store.get().undoes).toBeUndefined()
  })

  it('counts nothing when a gesture ends where it began', () => {
    const store = open()
    store.begin()
    store.put('design.width', 444)
    store.put('design.width', undefined)
    store.commit('Width')
    expect(store.get().undoes).toBeUndefined()
  })

  it('keeps what cannot be drafted at its field, with the reason, over the last good drawing', () => {
    const store = open()
    store.begin()
    store.put('design.width', 9999, '393 in')
    store.commit('Width')
    expect(store.get().attempts['design.width']?.text).toBe('393 in')
    expect(problemsAt(store.get(), 'design.width').map((problem) => problem.message)).toEqual([
      'Width is out of range.',
    ])
    expect(isStale(store.get())).toBe(true)
    expect(widthOf(store)).toBe(300)
    store.putBack('design.width')
    expect(isStale(store.get())).toBe(false)
  })

  it('takes a refused value in as soon as another change makes room for it', () => {
    const store = open()
    store.change('design.depth', 550, 'Depth')
    expect(isStale(store.get())).toBe(true)
    store.change('design.width', 400, 'Width')
    expect(store.get().order.design).toEqual({ depth: 550, width: 400 })
    expect(isStale(store.get())).toBe(false)
  })

  it('opens an order that lacks measurements, says so at each, and draws once all are there', () => {
    const store = open({ ...bibOrder, measurements: {} })
    expect(store.get().draft).toBeUndefined()
    expect(problemsAt(store.get(), 'measurements.waist')[0]?.message).toBe('The waist is missing.')
    store.change('measurements.bust', 900, 'Bust', '35 1/2 in')
    expect(store.get().draft).toBeUndefined()
    store.change('measurements.waist', 700, 'Waist', '27 1/2 in')
    expect(store.get().draft).toBeDefined()
    expect(store.get().order.measurements).toEqual({ bust: 900, waist: 700 })
    expect(store.get().typed['measurements.bust']).toBe('35 1/2 in')
  })

  it('says what changed and what followed', () => {
    const store = open()
    store.change('design.width', 25.4 * 8.5, 'Width')
    store.change('design.depth', 25.4 * 6, 'Depth')
    expect(store.get().said).toBe('Depth 6 inches; Edge 29 inches')
  })

  it('changes the unit of words without touching a length or the undo list', () => {
    const store = open()
    const { order } = store.get()
    for (let turn = 0; turn < 100; turn += 1) store.setUnit(turn % 2 ? 'in' : 'cm')
    expect(store.get().order).toBe(order)
    expect(store.get().undoes).toBeUndefined()
  })

  it('refuses to undo in the middle of a gesture', () => {
    const store = open()
    store.change('design.width', 320, 'Width')
    store.begin()
    store.put('design.width', 340)
    store.undo()
    expect(widthOf(store)).toBe(340)
  })
})
