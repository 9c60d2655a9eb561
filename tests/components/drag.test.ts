import { describe, expect, it } from 'vitest'
import { solveDrag } from '@/components/sheet/solve-drag'
import { placeTags } from '@/components/sheet/tag-places'
import { bib, bibEngine, bibOrder } from './support/bib'

const corner = bibEngine.handles(bibOrder)[0]!
const setting = { draftGarment: bibEngine.draftGarment, garment: bib, unit: 'cm', onTape: false } as const

describe('dragging a point', () => {
  it('moves both of its values to where the pointer is', () => {
    const asked = solveDrag(setting, bibOrder, corner, corner.at, { x: 350.4, y: 222.2 })
    expect(asked?.asked.map((one) => one.value)).toEqual([expect.closeTo(350.4, 6), expect.closeTo(222.2, 6)])
  })

  it('lands on the tape: whole millimetres, or eighths', () => {
    const tape = solveDrag({ ...setting, onTape: true }, bibOrder, corner, corner.at, { x: 350.4, y: 222.2 })
    expect(tape?.asked.map((one) => one.value)).toEqual([350, 222])
    const inches = { ...setting, unit: 'in', onTape: true } as const
    const eighths = solveDrag(inches, bibOrder, corner, corner.at, { x: 25.4 * 14.2, y: 25.4 * 8 })
    expect((eighths?.asked[0]?.value ?? 0) / 25.4).toBeCloseTo(14.25, 9)
  })

  it('stops at the end of a range and says which', () => {
    const asked = solveDrag(setting, bibOrder, corner, corner.at, { x: 2000, y: 200 })
    expect(asked?.asked[0]).toMatchObject({ value: 600, stopped: { at: 600, end: 'most' } })
  })

  it('asks for nothing where the shape would be impossible', () => {
    expect(solveDrag(setting, bibOrder, corner, corner.at, { x: 60, y: 400 })).toBeUndefined()
  })
})

describe('tags on the drawing', () => {
  const wish = (id: string, x: number, length: number) => ({
    id,
    from: { x, y: 0 },
    to: { x, y: length },
    width: 50,
    height: 26,
  })

  it('stand at the middle of their line when there is room', () => {
    expect(placeTags([wish('a', 100, 200)])[0]).toEqual({ id: 'a', x: 75, y: 87, folded: false })
  })

  it('slide along their line rather than cover another', () => {
    const [first, second] = placeTags([wish('a', 100, 200), wish('b', 120, 200)])
    expect(second?.folded).toBe(false)
    expect(Math.abs((first?.y ?? 0) - (second?.y ?? 0))).toBeGreaterThanOrEqual(26)
  })

  it('fold into a dot when there is no room near their line', () => {
    const crowd = Array.from({ length: 40 }, (_, index) => wish(`tag ${index}`, 100 + index, 20))
    const places = placeTags(crowd)
    expect(places[0]?.folded).toBe(false)
    expect(places.at(-1)?.folded).toBe(true)
  })

  it('leave points free and stay inside the window', () => {
    const point = { x: 92, y: 92, width: 16, height: 16 }
    const [place] = placeTags([wish('a', 100, 200)], [point], { width: 140, height: 300 })
    expect(place?.folded).toBe(false)
    expect(place && (place.y + 26 <= 92 || place.y >= 108)).toBe(true)
    expect(place && place.x >= 0 && place.x + 50 <= 140).toBe(true)
  })
})
