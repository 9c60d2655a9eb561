import fc from 'fast-check'
import type {
  Correction,
  DesignChoice,
  DesignValue,
  Draft,
  DraftOrder,
  Edge,
  GarmentDefinition,
} from '@/drafting/contract'
import { ruledOut } from '@/drafting/combinations'
import * as engine from '@/drafting/index'
import { extremeBodies, plausibleBody, sanityBodies, sizeBodies, type NamedBody } from '../bodies'
import { lengthOfPath } from './curves'
import { drafted } from './redraft'

export type Design = Readonly<Record<string, DesignChoice>>

/** Lengths to a tenth of a millimetre, shares to a thousandth: what people type. */
function within(value: DesignValue): fc.Arbitrary<DesignChoice> {
  const { min = 0, max = 0 } = value
  switch (value.kind) {
    case 'choice':
      return fc.constantFrom(...(value.choices ?? []))
    case 'yes-no':
      return fc.boolean()
    case 'count':
      return fc.integer({ min, max })
    case 'share':
      return fc
        .integer({ min: Math.ceil(min * 1000), max: Math.floor(max * 1000) })
        .map((share) => share / 1000)
    case 'length':
    case 'angle':
      return fc.integer({ min: Math.ceil(min * 10), max: Math.floor(max * 10) }).map((tenths) => tenths / 10)
  }
}

/** The ends of a value's range, or all its choices. */
function ends(value: DesignValue): fc.Arbitrary<DesignChoice> {
  if (value.kind === 'choice' || value.kind === 'yes-no') return within(value)
  return fc.constantFrom(value.min ?? 0, value.max ?? 0)
}

/** Leaves out what is not offered with the other choices. */
function offered(garment: GarmentDefinition, design: Design): Design {
  const chosen = (id: string): DesignChoice | undefined =>
    design[id] ?? garment.design.find((one) => one.id === id)?.default
  const holds = (id: string): boolean => {
    const condition = garment.design.find((one) => one.id === id)?.when
    if (!condition) return true
    const other = chosen(condition.id)
    return other !== undefined && condition.is.includes(other) && holds(condition.id)
  }
  const all: Record<string, DesignChoice> = Object.fromEntries(
    Object.entries(design).filter(([id]) => holds(id)),
  )
  for (const [id, choice] of Object.entries(all)) if (ruledOut(garment.id, id, choice, chosen)) delete all[id]
  return all
}

function styles(
  garment: GarmentDefinition,
  value: (one: DesignValue) => fc.Arbitrary<DesignChoice>,
  often: number,
): fc.Arbitrary<Design> {
  const entries = garment.design.map(
    (one) => [one.id, fc.option(value(one), { nil: undefined, freq: often })] as const,
  )
  return fc
    .record(Object.fromEntries(entries))
    .map((all) =>
      Object.fromEntries(
        Object.entries(all).filter((pair): pair is [string, DesignChoice] => pair[1] !== undefined),
      ),
    )
    .map((design) => offered(garment, design))
}

/** Styles with every value somewhere in its range, or now and then left at its default. */
export const anyStyle = (garment: GarmentDefinition): fc.Arbitrary<Design> => styles(garment, within, 3)

/** Styles at the ends of their ranges. */
export const cornerStyle = (garment: GarmentDefinition): fc.Arbitrary<Design> => styles(garment, ends, 2)

/** How a draft is asked for: words in inches or centimetres, sometimes on a tape. */
const manner = fc.record({
  unit: fc.constantFrom<'in' | 'cm'>('in', 'cm'),
  tape: fc.option(fc.constantFrom(1, 3.175, 5, 6.35), { nil: undefined, freq: 1 }),
})

function asked(
  garment: string,
  measurements: DraftOrder['measurements'],
  design: Design,
  { unit, tape }: { unit: 'in' | 'cm'; tape: number | undefined },
): DraftOrder {
  return { garment, measurements, design, unit, ...(tape ? { tape } : {}) }
}

/** Some of a full card: what a garment cannot do without is always there. */
function partOf(
  garment: GarmentDefinition,
  card: Readonly<Record<string, number>>,
): fc.Arbitrary<Record<string, number>> {
  return fc
    .subarray(garment.estimates as string[])
    .map((kept) =>
      Object.fromEntries(
        Object.entries(card).filter(([id]) => garment.needs.includes(id) || kept.includes(id)),
      ),
    )
}

/** Any plausible body, full or sparse cards. */
export function anyCard(garment: GarmentDefinition): fc.Arbitrary<Record<string, number>> {
  return plausibleBody().chain((card) =>
    fc.oneof(
      { weight: 3, arbitrary: fc.constant({ ...card }) },
      { weight: 1, arbitrary: partOf(garment, card) },
    ),
  )
}

/** Plausible bodies with random styles. */
export function randomOrder(garment: GarmentDefinition): fc.Arbitrary<DraftOrder> {
  return fc
    .tuple(anyCard(garment), anyStyle(garment), manner)
    .map(([card, design, how]) => asked(garment.id, card, design, how))
}

/** Named bodies with styles at the ends of their ranges. */
export function cornerOrder(garment: GarmentDefinition): fc.Arbitrary<DraftOrder> {
  return fc
    .tuple(fc.constantFrom(...namedBodies), cornerStyle(garment), manner)
    .map(([body, design, how]) => asked(garment.id, body.card, design, how))
}

/** Mostly random, a quarter at the corners. */
export function anyOrder(garment: GarmentDefinition): fc.Arbitrary<DraftOrder> {
  return fc.oneof(
    { weight: 3, arbitrary: randomOrder(garment) },
    { weight: 1, arbitrary: cornerOrder(garment) },
  )
}

/** Every body that has a name: published sizes, the two of the sanity figures, and the edges of what is accepted. */
export const namedBodies: readonly NamedBody[] = [
  ...Object.entries(sanityBodies).map(([name, card]) => ({ name: `body ${name}`, card: { ...card } })),
  ...sizeBodies,
  ...extremeBodies,
]

/** Each named body with the default style, in centimetres and on a tape in inches. */
export function namedOrders(
  garment: GarmentDefinition,
): { readonly name: string; readonly order: DraftOrder }[] {
  return namedBodies.flatMap(({ name, card }) => [
    { name, order: { garment: garment.id, measurements: card } },
    {
      name: `${name}, on an inch tape`,
      order: { garment: garment.id, measurements: card, unit: 'in' as const, tape: 3.175 },
    },
  ])
}

const small = fc.integer({ min: -100, max: 100 }).map((tenths) => tenths / 10)

/** Garments whose points and seams cannot be corrected yet, and a peplum, which is too short for any. */
export const untouched: readonly string[] = ['kaftan', 'boxy-blouse', 'peplum']

/** Marks of a dress or a bodice that a fitting moves. */
const dressMarks = [
  'shoulderTip',
  'sideNeck',
  'centreNeck',
  'hollow',
  'underarm',
  'sideHem',
  'neckPoint',
  'lengthMark',
  'bustPoint',
  'bustDartPoint',
  'sideWaist',
  'sideWaistEnd',
]

/** Garments with facings and sleeves traced from a body, whose own marks alone a fitting moves. */
const dressed = new Set(['flared-dress', 'bodice', 'shift-dress'])

/** Every mark of a draft that a correction may move, by piece. */
function movable(draft: Draft): readonly (readonly [piece: string, mark: string])[] {
  return draft.pieces.flatMap((piece) =>
    piece.marks
      .filter((mark) => !mark.fixed && corrects(draft.garment, piece.id, mark.id))
      .map((mark): [string, string] => [piece.id, mark.id]),
  )
}

/** Which marks of a garment can be tried: all of a skirt, and those of the dress that stand on its outline. */
function corrects(garment: string, piece: string, mark: string): boolean {
  if (garment === 'waist-seam-dress') return piece.startsWith('skirt-')
  if (!dressed.has(garment)) return true
  return (piece === 'front' || piece === 'back') && dressMarks.includes(mark)
}

/** Marks on the centre line stay there. */
const onCentre = (draft: Draft, piece: string, mark: string): boolean =>
  draft.pieces.find((one) => one.id === piece)?.marks.find((one) => one.id === mark)?.at.x === 0

/** Seams that can be taken in, and between which levels. */
function seamsOf(draft: Draft): readonly string[] {
  if (draft.garment === 'flared-dress') return ['side']
  const below = draft.garment === 'waist-seam-dress' ? 'skirt-' : ''
  const ids = draft.seams.map(({ id }) => id.replace(/-(above|below|pocket-front|pocket-back)$/, ''))
  return [...new Set(ids)].filter(
    (id) => id.startsWith(below) && /^(skirt-)?(side|first|first-left|last|seam(-\d+)?)$/.test(id),
  )
}

/** A level somewhere on a seam, mm. The seams of a circle stay as they are at waist and hem. */
const levelsOf = (edge: Edge | undefined): readonly [number, number] => {
  const ys = (edge?.path.segments ?? []).flatMap(({ from, to }) => [from.y, to.y])
  return [Math.min(...ys), Math.max(...ys)]
}

function levelOf(draft: Draft, seam: string, share: number): number {
  if (draft.garment === 'flared-dress') {
    const at = (id: string): number =>
      draft.pieces.find((piece) => piece.id === 'front')?.marks.find((mark) => mark.id === id)?.at.y ?? 0
    const [least, most] = [at('underarm') + 45, at('sideHem') - 90]
    return least + (most - least) * share
  }
  if (dressed.has(draft.garment)) {
    const side = draft.pieces.flatMap(({ id, edges }) => (id.startsWith('back') ? edges : []))
    const [from, to] = levelsOf(side.find(({ id }) => id === 'side'))
    // A bodice is taken in down to its waist, a dress down to where its hem is turned up.
    return from + 40 + (to - from - (draft.garment === 'bodice' ? 40 : 180)) * share
  }
  const run = draft.seams.find(({ id }) => id.startsWith(seam))?.a[0]
  const edge = draft.pieces.find(({ id }) => id === run?.piece)?.edges.find(({ id }) => id === run?.edge)
  const long = edge ? lengthOfPath(edge.path) : 0
  if (draft.garment === 'waist-seam-dress') {
    const waist = draft.pieces.find(({ id }) => id === 'back')?.marks.find(({ id }) => id === 'waistLevel')
      ?.at.y
    return (waist ?? 0) + 31 + (long * 0.9 - 155) * share
  }
  const ends = draft.garment === 'circle-skirt'
  return ends ? 31 + (long - 155) * share : long * 0.97 * share
}

/** Small corrections of the marks of a draft, and one of its seams taken in or let out. */
export function corrections(draft: Draft): fc.Arbitrary<readonly Correction[]> {
  if (untouched.includes(draft.garment)) return fc.constant([])
  const marks = movable(draft)
  const seams = seamsOf(draft)
  const onMark = marks.length
    ? fc.tuple(fc.constantFrom(...marks), small, small).map(([[piece, mark], x, y]): Correction => ({
        id: `mark-${mark}`,
        on: { piece, mark },
        by: { x: onCentre(draft, piece, mark) ? 0 : x, y },
      }))
    : undefined
  const onSeam = seams.length
    ? fc
        .tuple(fc.constantFrom(...seams), fc.integer({ min: 0, max: 100 }), small)
        .map(([seam, share, by]): Correction => ({
          id: 'taken-in',
          on: { seam, level: levelOf(draft, seam, share / 100) },
          by,
        }))
    : undefined
  const lists: fc.Arbitrary<readonly Correction[]>[] = []
  if (onMark) lists.push(onMark.map((one) => [one]))
  if (onSeam) lists.push(onSeam.map((one) => [one]))
  if (onMark && onSeam) lists.push(fc.tuple(onMark, onSeam))
  return lists.length ? fc.oneof(...lists) : fc.constant([])
}

/** Orders with corrections on top. */
export function correctedOrder(garment: GarmentDefinition): fc.Arbitrary<DraftOrder> {
  return randomOrder(garment).chain((order) => {
    const draft = drafted(order, engine)
    return draft ? corrections(draft).map((list) => ({ ...order, corrections: list })) : fc.constant(order)
  })
}

/** Styles in which every measurement of a garment can have its say: sleeved and pulled on over the head, and buttoned with cuffs. */
export function tellingStyles(garment: GarmentDefinition): readonly Design[] {
  return [
    { backOpening: 'none', sleeve: 'plain' },
    { backOpening: 'button band', sleeve: 'bishop', cut: 'gathered' },
  ].map((chosen) => ({
    ...Object.fromEntries(
      Object.entries(chosen).filter(([id, is]) =>
        garment.design.some((value) => value.id === id && value.choices?.includes(is)),
      ),
    ),
    // Long enough to lie over the hip.
    ...(garment.id === 'peplum' ? { length: 300 } : {}),
  }))
}
