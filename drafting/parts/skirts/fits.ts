import type { Fit, Path } from '../../contract'
import { intersections, pathLength } from '../../geometry'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import type { DrawnHalf } from './seams'
import type { SkirtUse } from './skirt'

type Across = Parameters<typeof fitAcross>[4]

const over = (piece: PiecePen, edge: string) => ({
  piece: piece.id,
  path: piece.edge(edge).path,
  times: 2,
  length: piece.lengthOf(edge),
})

/** States what the waist of both halves measures, its darts closed. */
export function findWaist(pen: Pen, halves: readonly DrawnHalf[], names: readonly string[]): Across {
  const across = halves.flatMap(({ piece, waists }) => waists.map((id) => over(piece, id)))
  const uses = halves.reduce(
    (mask, { piece, waists }) => waists.reduce((all, id) => all | piece.edge(id).uses, mask),
    pen.usesOf(names),
  )
  pen.find(
    'waistDrawn',
    across.reduce((sum, one) => sum + one.times * one.length, 0),
    uses,
  )
  return across
}

/** The waist of a skirt against the body; sewn to a bodice, the bodice answers for it. */
export function fitWaistOf(pen: Pen, halves: readonly DrawnHalf[], use: SkirtUse): void {
  waistGirth(pen, findWaist(pen, halves, ['waistQuarter']), use)
}

/** Promises the waist and its ease, unless a correction took it in. */
export function waistGirth(pen: Pen, across: Across, use: SkirtUse): void {
  if (use.sewnTo) return
  const drawn = across.reduce((sum, one) => sum + one.times * one.length, 0)
  const asked = pen.tape ? drawn - pen.value('waist') : pen.value('waistEase')
  const corrected = Math.abs(drawn - pen.value('waist') - asked) > 0.5 && pen.corrections.active.length > 0
  pen.fit(fitAcross('waist', corrected ? 'shown' : 'equal', asked, pen.value('waist'), across))
}

/**
 * Marks the level of the hip on both halves and measures it against the body; too narrow is drawn all the same, and said.
 *
 * @param remedies style values that make it wider.
 */
export function fitHip(pen: Pen, halves: readonly DrawnHalf[], ...remedies: readonly string[]): void {
  const across = halves.map(({ piece }) => {
    const { y } = piece.at('hipLevel')
    const met = intersections(piece.edge('side').path, straight({ x: -5, y }, { x: 4000, y })).at(-1)
    const path: Path = straight({ x: 0, y }, met?.point ?? piece.at('hip'))
    const uses = pen.usesOf(['hipLine']) | piece.edge('side').uses
    piece.inner('hip-level', 'level', path, 'Mark the level of the hip', uses)
    return { piece: piece.id, path, times: 2, length: pathLength(path) }
  })
  hipGirth(pen, across, ...remedies)
}

/** Promises the hip and its ease where the skirt is as wide, and says so where it is not. */
export function hipGirth(pen: Pen, across: Across, ...remedies: readonly string[]): void {
  const girth = across.reduce((sum, one) => sum + one.times * one.length, 0)
  const wanted = pen.value('hip') + pen.value('hipEase')
  const wide = girth >= wanted - 1e-7
  const relation: Fit['relation'] = wide ? 'at-least' : 'shown'
  pen.fit(fitAcross('hip', relation, pen.value('hipEase'), pen.value('hip'), across))
  if (wide) return
  pen.caution(
    'hip-tight',
    `At the hip the skirt is ${pen.say(girth)} round, the body with ease ${pen.say(wanted)}. Make it wider there.`,
    ...remedies,
    'hip',
  )
}

/** Says that nobody can judge the hip of a body whose hip was not measured. */
export function hipUnknown(pen: Pen): void {
  pen.caution(
    'hip-unknown',
    'The hip was not measured, so nobody can say whether the skirt is wide enough there. Measure the hip.',
    'hip',
  )
}

/** Shows how wide the hem is. */
export function fitHem(pen: Pen, halves: readonly DrawnHalf[]): void {
  pen.fit(
    fitAcross(
      'hem',
      'shown',
      0,
      undefined,
      halves.map(({ piece }) => over(piece, 'hem')),
    ),
  )
}
