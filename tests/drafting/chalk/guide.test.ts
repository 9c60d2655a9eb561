import { describe, expect, test } from 'vitest'
import { draftGarment, garments, parseLength } from '@/drafting'
import type { DraftOrder, Piece, Point } from '@/drafting'
import { chalkGuide } from '@/drafting/chalk/guide'
import type { ChalkSheet } from '@/drafting/chalk/guide'
import { distance } from '@/drafting/geometry/point'
import { nearestOn } from '@/drafting/geometry/path'
import { sanityBodies } from '../../support/bodies'

const eighth = 25.4 / 8
const drafted = (garment: string, unit: 'in' | 'cm' = 'in', design: DraftOrder['design'] = {}) =>
  draftGarment({
    garment,
    measurements: sanityBodies.two,
    design,
    unit,
    tape: unit === 'in' ? eighth : 5,
    explain: true,
  })

const ways: Readonly<Record<string, Point>> = {
  'straight down': { x: 0, y: 1 },
  'straight up': { x: 0, y: -1 },
  'straight to the right': { x: 1, y: 0 },
  'straight to the left': { x: -1, y: 0 },
}

/** '5 in down, 2 in to the right' as a move. */
function moveOf(words: string): Point {
  let move = { x: 0, y: 0 }
  for (const part of words.split(', ')) {
    const [, length = '', way] = /^(.*) (down|up|to the right|to the left)$/.exec(part) ?? []
    const mm = parseLength(length, 'cm')
    if (way === 'down') move = { ...move, y: mm }
    if (way === 'up') move = { ...move, y: -mm }
    if (way === 'to the right') move = { ...move, x: mm }
    if (way === 'to the left') move = { ...move, x: -mm }
  }
  return move
}

/** Chalks a sheet as somebody would who has nothing but its words and a tape: where each letter comes to lie. */
function chalked(sheet: ChalkSheet, piece: Piece): ReadonlyMap<string, Point> {
  const at = new Map<string, Point>()
  const pending = [...sheet.layings]
  const pointOf = (letter: string) => at.get(letter)
  for (let round = 0; pending.length > 0 && round < 200; round += 1) {
    const laying = pending.shift()
    if (!laying) break
    const [, letter, way] = /^From ([A-Z]+\d*) ?(.*)$/.exec(laying.words) ?? []
    if (letter === undefined) {
      // Where the work begins, or is traced: taken as it stands.
      for (const mark of laying.marks)
        at.set(mark.letter, piece.marks.find((each) => each.letter === mark.letter)?.at ?? { x: NaN, y: NaN })
      continue
    }
    const from = pointOf(letter)
    if (!from) {
      pending.push(laying)
      continue
    }
    for (const mark of laying.marks) {
      const said = mark.distance ?? ''
      const slant = /\((.*)\)/.exec(said)?.[1]
      const direction = ways[way ?? '']
      const move = direction
        ? { x: direction.x * parseLength(said, 'cm'), y: direction.y * parseLength(said, 'cm') }
        : moveOf(slant ?? said)
      at.set(mark.letter, { x: from.x + move.x, y: from.y + move.y })
    }
  }
  return at
}

describe.each(garments.map(({ id }) => id))('%s', (garment) => {
  test.each(['in', 'cm'] as const)('is rebuilt from the words alone, in %s', (unit) => {
    const draft = drafted(garment, unit)
    for (const sheet of chalkGuide(draft, unit, unit === 'in' ? eighth : 5).sheets) {
      const piece = draft.pieces.find(({ id }) => id === sheet.id)
      if (!piece) throw new Error(`there is no ${sheet.id}`)
      const rebuilt = chalked(sheet, piece)
      expect(rebuilt.size).toBeGreaterThan(0)
      for (const [letter, at] of rebuilt) {
        const mark = piece.marks.find((each) => each.letter === letter)
        // Squared and slanting places are said to the next mark of the tape.
        const off = distance(mark?.at ?? { x: NaN, y: NaN }, at)
        expect(off, `${sheet.id} ${letter}`).toBeLessThan(unit === 'in' ? 3 : 1.5)
      }
    }
  })

  test('every seam agrees on the tape', () => {
    const { checks } = chalkGuide(drafted(garment), 'in', eighth)
    expect(checks.length).toBeGreaterThan(0)
    expect(checks.filter(({ agrees }) => !agrees)).toEqual([])
  })
})

describe('a flared dress', () => {
  const draft = drafted('flared-dress')
  const [front] = chalkGuide(draft, 'in', eighth).sheets
  if (!front) throw new Error('nothing to chalk')

  test('reads all that lies on one tape off it without moving it, in order', () => {
    const down = front.layings.filter(({ words }) => words === 'From A straight down')
    expect(down).toHaveLength(1)
    const marks = (down[0]?.marks ?? []).map(({ mm = 0 }) => mm)
    expect(marks.length).toBeGreaterThanOrEqual(4)
    expect([...marks].sort((a, b) => a - b)).toEqual(marks)
    for (const mm of marks) expect(Math.abs(mm / eighth - Math.round(mm / eighth))).toBeLessThan(0.001)
  })

  test('tells each curve as a straight line and how deep it stands off it', () => {
    const piece = draft.pieces.find(({ id }) => id === 'front')
    for (const curve of front.curves.filter(({ depths }) => depths.length > 0)) {
      const path = piece?.edges.find(({ id }) => id === curve.edge)?.path
      const first = path?.segments[0]?.from
      const last = path?.segments.at(-1)?.to
      const middle = curve.depths[1] ?? NaN
      if (!path || !first || !last) throw new Error(`${curve.edge} is not drawn`)
      const chord = distance(first, last)
      const along = { x: (last.x - first.x) / chord, y: (last.y - first.y) / chord }
      const at = {
        x: (first.x + last.x) / 2 - along.y * middle,
        y: (first.y + last.y) / 2 + along.x * middle,
      }
      expect(nearestOn(path, at).gap).toBeLessThan(0.01)
      expect(curve.off).toMatch(/middle \d/)
    }
    expect(front.curves.find(({ edge }) => edge === 'armhole')?.off).toContain('Off it inwards')
    expect(front.curves.find(({ edge }) => edge === 'hem')?.off).toContain('Off it outwards')
  })

  test('says how the cloth lies: on the fold for a front, double and clear of the fold for a pair', () => {
    expect(front.fold).toMatchObject({ layers: 2, onFold: true })
    const sheets = chalkGuide(draft, 'in', eighth).sheets
    expect(sheets.find(({ id }) => id === 'sleeve')?.fold).toMatchObject({ layers: 2, onFold: false })
    expect(sheets.find(({ id }) => id === 'pocket-bag')?.fold).toMatchObject({ layers: 4 })
  })

  test('with both centres on the fold, cuts the shallower back first through all layers, then deepens the front', () => {
    const slipOn = drafted('flared-dress', 'in', { backOpening: 'none', neckWidening: 60, frontNeckDrop: 60 })
    const [back, second] = chalkGuide(slipOn, 'in', eighth).sheets
    expect(back?.id).toBe('back')
    expect(back?.cutting[0]).toContain('back neck and the back armhole through all layers first')
    expect(second?.cutting[0]).toContain('Lift the back away')
  })
})
