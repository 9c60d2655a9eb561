import { describe, expect, it } from 'vitest'
import { draftGarment, DraftingError, garments, nest, type Nest, type NestSize } from '@/drafting'
import { completeCard, sizeTables } from '@/drafting/body'
import { layOut, nestDrawing, nestRoom, paperOf, styleOf } from '@/drafting/drawing'

/** Six neighbouring sizes of the table whose figures were all read; what it lacks is estimated by the named relations. */
const sizes: readonly NestSize[] = (sizeTables[0]?.sizes ?? [])
  .filter(({ id }) => id.endsWith('curvy'))
  .slice(2, 8)
  .map(({ id, name, card }) => ({ id, name, card: completeCard(card).card }))
const ids = sizes.map(({ id }) => id)
const of = (garment: string) => ({ garment, measurements: {} })

function problemsOf(work: () => unknown) {
  try {
    work()
  } catch (error) {
    if (error instanceof DraftingError) return error.problems
    throw error
  }
  throw new Error('It was nested.')
}

/** Where a mark of a size lies in the nest. */
function at(found: Nest, size: string, piece: string, mark: string) {
  const draft = found.sizes.find(({ id }) => id === size)?.draft
  const spot = draft?.pieces.find(({ id }) => id === piece)?.marks.find(({ id }) => id === mark)?.at
  const shift = found.pieces.find(({ id }) => id === piece)?.shifts[size]
  if (!spot || !shift) throw new Error(`No ${mark} of ${size}`)
  return { x: spot.x + shift.x, y: spot.y + shift.y }
}

describe('a nest of sizes', () => {
  it.each(garments.map(({ id }) => id))('%s: holds each size as it is drafted alone', (garment) => {
    const found = nest(of(garment), sizes)
    expect(found.sizes.map(({ name }) => name)).toEqual(sizes.map(({ name }) => name))
    for (const [index, { draft }] of found.sizes.entries())
      expect(draft).toEqual(draftGarment({ garment, measurements: sizes[index]?.card ?? {}, explain: false }))
  })

  it('lies still at the mark that was chosen for each piece', () => {
    const found = nest(of('flared-dress'), sizes, { alignAt: { front: 'underarm', back: 'centreNeck' } })
    for (const [piece, mark] of [
      ['front', 'underarm'],
      ['back', 'centreNeck'],
      ['sleeve', 'crown'],
    ] as const) {
      const spots = ids.map((size) => at(found, size, piece, mark))
      for (const spot of spots) {
        expect(spot.x).toBeCloseTo(spots[0]?.x ?? NaN, 9)
        expect(spot.y).toBeCloseTo(spots[0]?.y ?? NaN, 9)
      }
    }
    // Somewhere else the sizes lie one outside the other.
    const hems = ids.map((size) => at(found, size, 'back', 'underarm').x)
    expect(hems).toEqual(hems.toSorted((a, b) => a - b))
    expect(new Set(hems).size).toBe(hems.length)
  })

  it('one mark for all pieces holds where they have it', () => {
    const found = nest(of('bodice'), sizes, { alignAt: 'centreWaist' })
    const aligned = Object.fromEntries(found.pieces.map(({ id, alignedAt }) => [id, alignedAt]))
    expect(aligned).toMatchObject({ front: 'centreWaist', back: 'centreWaist' })
  })

  it('lists every fit by size, growing with the body', () => {
    const { fits } = nest(of('flared-dress'), sizes)
    const bust = fits.find(({ id }) => id === 'bust')
    expect(Object.keys(bust?.sizes ?? {})).toEqual(ids)
    const lengths = ids.map((size) => bust?.sizes[size]?.length ?? NaN)
    expect(lengths).toEqual(lengths.toSorted((a, b) => a - b))
    for (const [index, size] of ids.entries()) {
      const row = bust?.sizes[size]
      expect(row?.body).toBe(sizes[index]?.card.bust)
      expect(row?.length).toBeCloseTo((row?.body ?? NaN) + (row?.ease ?? NaN), 0)
    }
  })

  it('says which size cannot be drafted, and why', () => {
    const [first, second, ...rest] = sizes as [NestSize, NestSize, ...NestSize[]]
    const { bust: _left, ...without } = second.card
    const cards = [{ ...first, card: { ...first.card, hip: 12 } }, { ...second, card: without }, ...rest]
    const problems = problemsOf(() => nest(of('flared-dress'), cards))
    expect(problems.map(({ field }) => field)).toEqual([`sizes.${first.id}.hip`, `sizes.${second.id}.bust`])
    expect(problems[0]?.message).toContain(`Size ${first.name}: Hip`)
  })

  it.each([
    ['a single size', sizes.slice(0, 1)],
    ['too many', Array.from({ length: 13 }, (_, index) => ({ ...sizes[0], id: String(index) }))],
    ['the same size twice', [sizes[0], sizes[0]]],
    ['no list', {}],
    ['a size without a card', [sizes[0], { id: 'x', name: 'X' }]],
    ['nothing in the list', [null, sizes[0]]],
  ])('is refused with %s', (_, wrong) => {
    expect(problemsOf(() => nest(of('bodice'), wrong as never))[0]?.field).toMatch(/^sizes/)
  })

  it.each([
    ['a piece that is not there', { collar: 'underarm' }, 'alignAt.collar'],
    ['a mark that is not there', { front: 'elbow' }, 'alignAt.front'],
    ['a mark that is no name', { front: 7 }, 'alignAt.front'],
  ])('is refused with %s, naming those that are', (_, alignAt, field) => {
    const problems = problemsOf(() => nest(of('bodice'), sizes, { alignAt: alignAt as never }))
    expect(problems.map((problem) => problem.field)).toEqual([field])
    expect(problems[0]?.message).toContain('front')
  })
})

describe('the drawing of a nest', () => {
  const found = nest(of('bodice'), sizes, { alignAt: 'centreWaist' })
  const { items } = nestDrawing(found)

  it('draws every size of every piece in a line of its own, with its name beside it', () => {
    for (const { id, style, name } of found.sizes) {
      for (const { id: piece } of found.pieces) {
        const own = items.filter((item) => item.piece === piece && item.id?.endsWith(`/${id}`))
        expect(own.filter((item) => item.kind === 'path' && item.style === style).length).toBeGreaterThan(0)
        expect(own.filter((item) => item.kind === 'text').map((item) => 'text' in item && item.text)).toEqual(
          [name],
        )
      }
    }
  })

  it('tells sizes apart by dashes and dye together', () => {
    const looks = Array.from({ length: 12 }, (_, index) => {
      const { dash, stroke } = styleOf(`size-${index + 1}`)
      return JSON.stringify([dash, stroke])
    })
    expect(new Set(looks).size).toBe(12)
  })

  it('names everything it draws once', () => {
    const names = items.map(({ id }) => id)
    expect(new Set(names).size).toBe(names.length)
  })

  it('leaves the label, the grain and the levels in one size', () => {
    const labels = items.filter((item) => item.layer === 'label' && item.id === 'front/label/name')
    expect(labels).toHaveLength(1)
    expect(items.filter(({ id }) => id?.startsWith('front/grain/'))).not.toEqual([])
  })

  it('lies on paper as one piece a nest, all sizes inside the room it takes', () => {
    const room = nestRoom(found, true)
    expect(room.pieces.map(({ id }) => id)).toEqual(found.pieces.map(({ id }) => id))
    const laid = layOut({
      draft: room,
      nest: found,
      paper: paperOf('a4'),
      orientation: 'fewest',
      allowances: true,
    })
    expect(laid.outlines).toHaveLength(found.pieces.length)
    const { min, max } = laid.drawing.bounds
    for (const item of laid.drawing.items) {
      if (item.kind !== 'path') continue
      for (const { from } of item.path.segments) {
        expect(from.x).toBeGreaterThanOrEqual(min.x)
        expect(from.x).toBeLessThanOrEqual(max.x)
      }
    }
  })

  it('prints the pieces that were chosen', () => {
    const request = {
      draft: nestRoom(found, true),
      nest: found,
      paper: paperOf('a4'),
      allowances: true,
    } as const
    const laid = layOut({ ...request, orientation: 'fewest', pieces: ['front'] })
    expect(new Set(laid.drawing.items.map(({ piece }) => piece))).toEqual(new Set(['front']))
  })
})
