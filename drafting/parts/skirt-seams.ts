import type { Run } from '../contract'
import { pathLength } from '../geometry'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { pocketBag, pocketMouth, sewWithPocket } from './in-seam-pocket'
import { waistband } from './waistband'

/** A drawn half of a skirt and the edges of its waist, from the centre outwards. */
export interface DrawnHalf {
  readonly piece: PiecePen
  readonly waists: readonly string[]
}

/** Sews the sides, with pockets where they are asked for, and puts the zip where the opening is. */
export function sewSkirtSides(pen: Pen, front: PiecePen, back: PiecePen): void {
  const long = front.lengthOf('side')
  const seam = { id: 'side', name: 'Side seam', smooth: true }
  const a: Run = { piece: front.id, edge: 'side' }
  const b: Run = { piece: back.id, edge: 'side' }
  const atSide = pen.chosen('opening') === 'side zip'
  const zip = Math.min(pen.length('zipLength'), long - 40)
  if (atSide) for (const piece of [front, back]) piece.notch('zip-end', 'side', zip, 2)
  pen.notion({ kind: 'zip', length: zip, count: 1 })
  const mouth = sidePocket(pen, front, atSide)
  if (mouth) sewWithPocket(pen, seam, a, b, mouth, long)
  else pen.sew({ ...seam, a: [a], b: [b] })
}

function sidePocket(pen: Pen, front: PiecePen, atSide: boolean): ReturnType<typeof pocketMouth> {
  if (!pen.chosen('pockets')) return undefined
  if (atSide) {
    pen.caution(
      'pockets-left-out',
      'The zip lies in the side seam, where the pocket would be: none is drawn. Put the zip at the centre back.',
      'pockets',
      'opening',
    )
    return undefined
  }
  const side = front.edge('side')
  const mouth = pocketMouth(pen, side.path, 0)
  if (mouth) pocketBag(pen, pathLength(side.path) - mouth.from - 40, side.uses | pen.usesOf(['pocketTop']))
  return mouth
}

/**
 * The whole waist in order from the opening round to it again, and the band that it is sewn into.
 *
 * @param gathered the rule that says how much is gathered in, where the skirt is gathered.
 */
export function bandOnSkirt(pen: Pen, [front, back]: readonly DrawnHalf[], gathered?: string): void {
  if (!front || !back || !(gathered ?? pen.chosen('waistband'))) return
  const outward = ({ piece, waists }: DrawnHalf): Run[] => waists.map((edge) => ({ piece: piece.id, edge }))
  const inward = (half: DrawnHalf): Run[] =>
    outward(half)
      .reverse()
      .map((run) => ({ ...run, reversed: true }))
  const other = (runs: readonly Run[]): Run[] => runs.map((run) => ({ ...run, mirrored: true }))
  const fromBack = [outward(back), inward(front), other(outward(front)), other(inward(back))]
  const fromSide = [inward(front), other(outward(front)), other(inward(back)), outward(back)]
  const order = pen.chosen('opening') === 'side zip' ? fromSide : fromBack
  const lengths = order.map((runs) =>
    runs.reduce((sum, { edge }, index) => {
      const { piece } = (runs[index] as Run).piece === front.piece.id ? front : back
      return sum + piece.lengthOf(edge)
    }, 0),
  )
  const whole = lengths.reduce((sum, one) => sum + one, 0)
  const share = pen.value('waistbandLength') / whole
  let along = 0
  const matches = lengths.slice(0, -1).map((long) => {
    along += long
    return { a: along, b: along * share }
  })
  waistband(pen, order.flat(), matches, gathered)
}
