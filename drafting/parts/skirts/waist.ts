import type { Path, Point } from '../../contract'
import {
  add,
  applyTo,
  cubic,
  identity,
  openPath,
  rotation,
  scale,
  startOf,
  startTangent,
  subtract,
  transformPath,
  translation,
  unit,
  type Transform,
} from '../../geometry'
import type { Pen } from '../../pen/pen'
import { dartAngle, openWaist, type OpenWaist, type WaistDart } from '../waist-darts'
import { leastDart, type SkirtHalf } from './marks'

/** Where a half is drawn from: its centre and the points of its darts, mm. */
export interface Ground {
  readonly centre: Point
  readonly points: readonly Point[]
  /** mm that each dart takes out. */
  readonly intake: number
}

/** A half of a skirt whose side end was found. */
export interface FittedHalf extends SkirtHalf {
  readonly darts: number
  /** The darts that are sewn, where they lie on the finished piece. */
  readonly sewn: readonly WaistDart[]
  /** How the outer part lies on the finished piece: turned where a dart was closed into the hem. */
  readonly turned: Transform
  /** Ends of the side before anything is turned. */
  readonly ends: { readonly waist: Point; readonly hip: Point; readonly hem: Point }
}

/**
 * The side from waist to hip to hem: a gentle curve over the hip, most of it near the waist, then straight.
 *
 * @param hem the end of the side; the curve arrives at the hip in the direction of the straight part.
 */
export function sideOf({ waist, hip, hem }: FittedHalf['ends']): Path {
  const down = hip.y - waist.y
  const onward = unit(subtract(hem, hip))
  return openPath([
    cubic(
      waist,
      { x: waist.x + (hip.x - waist.x) * 0.5, y: waist.y + down * 0.36 },
      add(hip, scale(onward, -down * 0.36)),
      hip,
    ),
    { kind: 'line', from: hip, to: hem },
  ])
}

const groundOf = ({ piece, darts, intake }: SkirtHalf): Ground => ({
  centre: piece.at('centreWaist'),
  points: Array.from({ length: darts }, (_, index) => piece.at(`dartTip${index + 1}`)),
  intake,
})

/** What is left of a dart is sewn when it is worth a dart; otherwise the side takes it. */
const takesOut = ({ angle, point }: WaistDart): boolean =>
  2 * point.y * Math.sin((angle * Math.PI) / 360) >= leastDart - 0.01

/** The darts of a half once part of the first is closed into the hem, and the turn that closes it. */
function closed({ points, intake }: Ground, close: number): { turned: Transform; sewn: WaistDart[] } {
  const pivot = points[0]
  const turned = pivot && close > 0 ? rotation(-close, pivot) : identity
  const sewn = points
    .map((point, index) => ({
      point: applyTo(turned, point),
      angle: dartAngle(intake, point.y) - (index === 0 ? close : 0),
      lean: index === 0 ? -close / 2 : -close,
    }))
    .filter(takesOut)
  return { turned, sewn }
}

/** The waist of a half from its centre to the top of its side, square to both; undefined where a dart misses it. */
export function waistTo(centre: Point, side: Path, sewn: readonly WaistDart[]): OpenWaist | undefined {
  const along = startTangent(side)
  const end = { at: startOf(side), arrives: { x: along.y, y: -along.x } }
  return openWaist({ at: centre, leaves: { x: 1, y: 0 } }, end, sewn, true)
}

export interface Fitting {
  /** Where the side leaves the hip and ends at the hem, before it is moved or turned. */
  readonly hip: Point
  readonly hem: Point
  /** mm by which the side stands higher than the waist level. */
  readonly rise: number
  /** Degrees of each first dart that are closed into the hem. */
  readonly close: number
  /** Length of the half waists, front and back, with darts closed: of both together, or of each. */
  readonly wanted: number | readonly [front: number, back: number]
  /** Where to look first for how far the side comes in, mm. */
  readonly guess: number
}

interface Found {
  readonly inward: number
  /** How far the front's side stands out of its place and the back's inside it, so that each half has its own length. */
  readonly outward: number
  readonly lengths: readonly [number, number]
  /** mm from the centre to the first dart of each half, where it has one. */
  readonly joints: readonly [number | undefined, number | undefined]
}

/**
 * Finds how far the side comes in at the waist, in front and back alike, so that the waist with its darts closed has its length.
 * Front and back get the same side, so their side seams agree as they are drawn.
 */
export function findSide(grounds: readonly [Ground, Ground], fitting: Fitting): Found | undefined {
  const { hip, hem, rise, close, wanted } = fitting
  const plans = grounds.map((ground) => ({ ground, ...closed(ground, close) }))
  const draw = (inward: number, outward: number): OpenWaist[] | undefined => {
    const side = sideOf({ waist: { x: hip.x - inward, y: -rise }, hip, hem })
    const drawn = plans.map(({ ground, turned, sewn }, index) => {
      const apart = translation(index === 0 ? outward : -outward, 0)
      return waistTo(ground.centre, transformPath(turned, transformPath(apart, side)), sewn)
    })
    return drawn[0] && drawn[1] ? [drawn[0], drawn[1]] : undefined
  }
  let inward = fitting.guess
  let outward = 0
  // Each step moves both ends by what is still missing: the waist runs almost straight, so few are needed.
  for (let round = 0; round < 40; round += 1) {
    const drawn = draw(inward, outward) ?? undefined
    if (!drawn) return undefined
    const [front, back] = drawn as [OpenWaist, OpenWaist]
    const over = typeof wanted === 'number' ? front.length + back.length - wanted : 0
    const [overFront, overBack] =
      typeof wanted === 'number' ? [over / 2, over / 2] : [front.length - wanted[0], back.length - wanted[1]]
    if (Math.abs(overFront) + Math.abs(overBack) < 2e-8) {
      const joint = (waist: OpenWaist): number | undefined => waist.joints[0]
      return { inward, outward, lengths: [front.length, back.length], joints: [joint(front), joint(back)] }
    }
    inward += (overFront + overBack) / 2
    outward -= (overFront - overBack) / 2
  }
  return undefined
}

/** Fits the waist of both halves from their marks. Refuses where darts and side cannot take out what they should. */
export function fitSkirtWaist(
  pen: Pen,
  halves: readonly [SkirtHalf, SkirtHalf],
  fitting: Omit<Fitting, 'guess' | 'rise'>,
): readonly [FittedHalf, FittedHalf] {
  const grounds = [groundOf(halves[0]), groundOf(halves[1])] as const
  const rise = pen.lengthRounded('sideRise', 'down')
  const { hip, hem, close } = fitting
  const found = findSide(grounds, { ...fitting, rise, guess: pen.length('sideTakes') })
  if (!found || Math.abs(found.inward) > hip.x) {
    const least = pen.value('hip') - 260
    return pen.refuse({
      field: 'waist',
      code: 'impossible-shape',
      message: `From this hip to this waist the darts take out more than lies fair. Measure waist and hip again: a waist of ${pen.say(least)} can be drafted on this hip.`,
      min: least,
    })
  }
  const fitted = (half: SkirtHalf, index: 0 | 1): FittedHalf => {
    const by = index === 0 ? found.outward : -found.outward
    const over = ({ x, y }: Point): Point => ({ x: x + by, y })
    const ends = { waist: over({ x: hip.x - found.inward, y: -rise }), hip: over(hip), hem: over(hem) }
    return { ...half, ...closed(grounds[index], close), ends }
  }
  return [fitted(halves[0], 0), fitted(halves[1], 1)]
}
