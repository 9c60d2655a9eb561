import type { Path, Point } from '../contract'
import { add, cubic, openPath, scale, startTangent, subtract, unit, type Transform } from '../geometry'
import { applyTo, identity, rotation, transformPath } from '../geometry'
import type { Pen } from '../pen/pen'
import { solveBetween } from '../pen/solve'
import type { FittedWaist } from './fitted-waist'
import { leastDart, type SkirtHalf } from './skirt-marks'
import { dartAngle, openWaist, type OpenWaist, type WaistDart } from './waist-darts'

/** A skirt's half with its waist fitted and its side drawn, both where they lie on the finished piece. */
export interface FittedHalf extends SkirtHalf {
  readonly fitted: FittedWaist
  readonly sideSeam: Path
  /** How the outer part was turned when a dart was closed into the hem; identity where none was. */
  readonly turned: Transform
}

/**
 * The side from waist to hip to hem: a gentle curve over the hip, most of it near the waist, then straight.
 *
 * @param hem the end of the side; the curve arrives at the hip in the direction of the straight part.
 */
function sideOf(waist: Point, hip: Point, hem: Point): Path {
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

const dartsOf = (half: SkirtHalf): WaistDart[] =>
  half.dartLengths.map((_, index) => {
    const point = half.piece.at(`dartTip${index + 1}`)
    return { point, angle: dartAngle(half.intake, point.y) }
  })

/** Degrees between the legs of the first dart; 0 where none is drawn. */
export const firstDartAngle = (half: SkirtHalf): number => dartsOf(half)[0]?.angle ?? 0

/** What is left of a dart is sewn when it is worth a dart; otherwise the side takes it. */
const takesOut = ({ angle, point }: WaistDart): boolean =>
  2 * point.y * Math.sin((angle * Math.PI) / 360) >= leastDart - 0.01

/**
 * Finds how far the side comes in at the waist, in front and back alike, so that the whole waist with its darts closed has its
 * length. Front and back get the same side, so their side seams agree as they are drawn.
 *
 * @param hem where the side ends before anything is turned.
 * @param close degrees of each first dart that are closed into the hem.
 */
export function fitSkirtWaist(
  pen: Pen,
  halves: readonly SkirtHalf[],
  hem: Point,
  close = 0,
): readonly FittedHalf[] {
  const rise = pen.lengthRounded('sideRise', 'down')
  const wanted = pen.value('waistQuarter') * 2
  const plans = halves.map((half) => {
    const darts = dartsOf(half)
    const pivot = darts[0]?.point
    const turned = pivot && close > 0 ? rotation(-close, pivot) : identity
    const left = darts.map((dart, index) => ({
      point: applyTo(turned, dart.point),
      angle: index === 0 ? dart.angle - close : dart.angle,
      lean: index === 0 ? -close / 2 : -close,
    }))
    return { half, turned, darts: left.filter(takesOut) }
  })
  const hip = (halves[0] as SkirtHalf).piece.at('hip')
  const draw = (inward: number): (OpenWaist & { readonly side: Path })[] | undefined => {
    const side = sideOf({ x: hip.x - inward, y: -rise }, hip, hem)
    const drawn = plans.map(({ half, turned, darts }) => {
      const own = transformPath(turned, side)
      const along = startTangent(own)
      const end = { at: own.segments[0]?.from as Point, arrives: { x: along.y, y: -along.x } }
      const centre = { at: half.piece.at('centreWaist'), leaves: { x: 1, y: 0 } }
      const waist = openWaist(centre, end, darts, true)
      return waist && { ...waist, side: own }
    })
    return drawn.every((one) => one !== undefined) ? drawn : undefined
  }
  const off = (inward: number): number =>
    (draw(inward)?.reduce((sum, one) => sum + one.length, 0) ?? NaN) - wanted
  const guess = pen.length('sideTakes')
  for (const spread of [6, 15, 30]) {
    const inward = solveBetween(off, guess - spread, guess + spread, 1e-8)
    const drawn = inward === undefined ? undefined : draw(inward)
    if (!drawn) continue
    return plans.map(({ half, turned, darts }, index) => {
      const { side, ...waist } = drawn[index] as OpenWaist & { side: Path }
      const fitted = { side: side.segments[0]?.from as Point, darts, waist }
      return { ...half, fitted, sideSeam: side, turned }
    })
  }
  const least = pen.value('hip') - 260
  return pen.refuse({
    field: 'waist',
    code: 'impossible-shape',
    message: `From this hip to this waist the darts take out more than lies fair. Measure waist and hip again: a waist of ${pen.say(least)} can be drafted on this hip.`,
    min: least,
  })
}
