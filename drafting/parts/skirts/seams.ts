import type { Path, Run } from '../../contract'
import { pathLength } from '../../geometry'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { pocketBag, pocketMouth, sewWithPocket } from '../pockets/in-seam'
import { waistband } from '../waistband'
import type { DrawnSkirt, SkirtUse, WaistPlace } from './skirt'

/** A drawn half of a skirt and the edges of its waist, from the centre outwards. */
export interface DrawnHalf {
  readonly piece: PiecePen
  readonly waists: readonly string[]
  /** mm from the centre to each dart, with all darts closed. */
  readonly joints: readonly number[]
}

/**
 * Sews the sides, with pockets where they are asked for, and puts the zip where the opening is.
 *
 * @param measured what the pocket's place is measured along, where levels do not tell.
 */
export function sewSkirtSides(
  pen: Pen,
  front: PiecePen,
  back: PiecePen,
  use: SkirtUse,
  measured: Path = front.edge('side').path,
): void {
  const long = front.lengthOf('side')
  const seam = {
    id: `${use.prefix}side`,
    name: use.prefix ? 'Side seam of the skirt' : 'Side seam',
    smooth: true,
  }
  const a: Run = { piece: front.id, edge: 'side' }
  const b: Run = { piece: back.id, edge: 'side' }
  const atSide = use.opening === 'side zip'
  const zip = use.peplum ? 0 : Math.min(pen.length(use.zip), long - 40)
  if (atSide) for (const piece of [front, back]) piece.notch('zip-end', 'side', zip, 2)
  if (!use.sewnTo) pen.notion({ kind: 'zip', length: zip, count: 1 })
  const mouth = use.peplum ? undefined : sidePocket(pen, front, measured)
  if (mouth) sewWithPocket(pen, seam, a, b, mouth, long)
  else pen.sew({ ...seam, a: [a], b: [b] })
}

function sidePocket(pen: Pen, front: PiecePen, measured: Path): ReturnType<typeof pocketMouth> {
  if (!pen.chosen('pockets')) return undefined
  const side = front.edge('side')
  const mouth = pocketMouth(pen, measured, 0)
  if (mouth) pocketBag(pen, pathLength(side.path) - mouth.from - 40, side.uses | pen.usesOf(['pocketTop']))
  return mouth
}

const outward = ({ piece, waists }: DrawnHalf): Run[] => waists.map((edge) => ({ piece: piece.id, edge }))
const inward = (half: DrawnHalf): Run[] =>
  outward(half)
    .reverse()
    .map((run) => ({ ...run, reversed: true }))
const other = (runs: readonly Run[]): Run[] => runs.map((run) => ({ ...run, mirrored: true }))

/** Length of a half waist with its darts closed, mm. */
export const halfWaist = ({ piece, waists }: DrawnHalf): number =>
  waists.reduce((sum, edge) => sum + piece.lengthOf(edge), 0)

/**
 * The whole waist of a front on the fold and a pair of backs, from the centre back once round, with its sides, centre front and
 * darts.
 */
export function wholeWaist(front: DrawnHalf, back: DrawnHalf): DrawnSkirt {
  const [ofFront, ofBack] = [halfWaist(front), halfWaist(back)]
  return {
    waist: [...outward(back), ...inward(front), ...other(outward(front)), ...other(inward(back))],
    places: placesAround({ length: ofFront, joints: front.joints }, { length: ofBack, joints: back.joints }),
  }
}

/** The places of both halves along the whole waist, those of the other half of the body with a key of their own. */
export function placesAround(
  front: { readonly length: number; readonly joints: readonly number[] },
  back: { readonly length: number; readonly joints: readonly number[] },
): WaistPlace[] {
  const side = back.length
  const half = side + front.length
  const near: WaistPlace[] = [
    ...back.joints.map((at, index) => ({ key: `back-${index + 1}`, at })),
    { key: 'side', at: side },
    ...front.joints.map((at, index) => ({ key: `front-${index + 1}`, at: half - at })).reverse(),
  ]
  const far = near.map(({ key, at }) => ({ key: `other-${key}`, at: 2 * half - at })).reverse()
  return [...near, { key: 'centre-front', at: half }, ...far]
}

/**
 * The band that a skirt is sewn into, beginning at the opening.
 *
 * @param gathered the rule that says how much is gathered in, where the skirt is gathered.
 */
export function bandOnSkirt(
  pen: Pen,
  front: DrawnHalf,
  back: DrawnHalf,
  use: SkirtUse,
  gathered?: string,
): void {
  if (use.sewnTo || !(gathered ?? pen.chosen('waistband'))) return
  const fromBack = [outward(back), inward(front), other(outward(front)), other(inward(back))]
  const fromSide = [inward(front), other(outward(front)), other(inward(back)), outward(back)]
  const order = use.opening === 'side zip' ? fromSide : fromBack
  const [ofFront, ofBack] = [halfWaist(front), halfWaist(back)]
  const lengths = use.opening === 'side zip' ? [ofFront, ofFront, ofBack] : [ofBack, ofFront, ofFront]
  const share = pen.value('waistbandLength') / (2 * (ofFront + ofBack))
  let along = 0
  const matches = lengths.map((long) => {
    along += long
    return { a: along, b: along * share }
  })
  waistband(pen, order.flat(), matches, gathered)
}
