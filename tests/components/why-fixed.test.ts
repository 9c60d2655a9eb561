import { expect, it } from 'vitest'
import { fixedPoints } from '@/components/sheet/why-fixed'
import { draftGarment, garments, handles, measurements } from '@/drafting'
import { sanityBodies } from '../support/bodies'

const names = new Map(measurements.map(({ id, name }) => [id, name]))
const fixedOf = (garment: string) => {
  const order = { garment, measurements: sanityBodies.one, unit: 'in' } as const
  const definition = garments.find(({ id }) => id === garment)
  if (!definition) throw new Error(`No ${garment}.`)
  const [draft, dragged] = [draftGarment(order), handles(order)]
  return { draft, dragged, points: fixedPoints(draft, dragged, definition, names) }
}
const whyOf = (id: string) => fixedOf('flared-dress').points.find((point) => point.id === id)?.why

it.each(garments.map(({ id }) => id))('every mark of a %s can be dragged or says why not', (garment) => {
  const { draft, dragged, points } = fixedOf(garment)
  const marks = draft.pieces.flatMap((piece) => piece.marks.map((mark) => `${piece.id}/${mark.id}`))
  const told = [...points.map(({ id }) => id), ...dragged.map(({ piece, mark }) => `${piece}/${mark}`)]
  expect([...new Set(told)].sort()).toEqual(marks.sort())
  for (const { why } of points) expect(why).toMatch(/cannot be dragged.*(moves? it|from here)\.$/)
})

it('a point that follows from the body names the measurement that moves it', () => {
  expect(whyOf('front/shoulderEnd')).toBe(
    'From the centre go across half the shoulders. It cannot be dragged: it follows from the body. Across shoulders and the rule “Half the shoulders” move it.',
  )
})

it('a point that other lines make names the style measurements first', () => {
  expect(whyOf('front/halfDepth')).toMatch(/follows other lines\. Shoulder slope, Armhole lower by, /)
})

it('where a piece begins, it says so', () => {
  expect(whyOf('front/neckLevel')).toContain('the piece is drawn from here')
})
