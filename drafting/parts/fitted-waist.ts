import type { Path, Point } from '../contract'
import { distance, endOf, endTangent, reversePath, unit } from '../geometry'
import { nothing, type Mask } from '../pen/masks'
import type { Pen } from '../pen/pen'
import { between, type PiecePen } from '../pen/piece-pen'
import { solveBetween } from '../pen/solve'
import { dartAngle, openWaist, type OpenWaist, type WaistDart } from './waist-darts'

/** The side end of a waist and the waist that ends there. */
export interface FittedWaist {
  readonly side: Point
  readonly darts: readonly WaistDart[]
  readonly waist: OpenWaist
}

/** One dart at the waist, or two where it would take more than 4 cm, about an upright axis. All mm. */
export function waistDarts(axis: number, tip: number, waist: number, intake: number): WaistDart[] {
  if (intake < 4) return []
  const parts = intake > 40 ? 2 : 1
  return Array.from({ length: parts }, (_, index) => {
    // The outer of two darts is the shorter: the body curves less there.
    const shorter = index === 1 ? 12 * Math.sign(waist - tip) : 0
    // Enough cloth between two mouths for the allowance of each to fold.
    const apart = Math.max(34, intake / parts + 18)
    const point = { x: axis + (parts === 1 ? 0 : (index - 0.5) * apart), y: tip + shorter }
    return { point, angle: dartAngle(intake / parts, Math.abs(waist - point.y)) }
  })
}

/**
 * Finds the side end of a waist so that the waist, its darts closed, has its length.
 *
 * @param centre where the waist starts and the direction in which it leaves, square to the centre.
 * @param top the far end of the side seam.
 * @param place the level of the side end, or the length of a straight side seam that it must agree with, mm.
 * @param wanted length of the closed waist, mm.
 */
export function fitWaist(
  pen: Pen,
  centre: { readonly at: Point; readonly leaves: Point },
  top: Point,
  place: { readonly level: number } | { readonly length: number },
  darts: readonly WaistDart[],
  wanted: number,
): FittedWaist {
  const below = centre.at.y < top.y
  const at = (x: number): Point => {
    if ('level' in place) return { x, y: place.level }
    const across = x - top.x
    const along = Math.sqrt(Math.max(1, place.length * place.length - across * across))
    return { x, y: top.y + (below ? -along : along) }
  }
  const drawn = (x: number): OpenWaist | undefined => {
    const mark = at(x)
    const side = unit(below ? between(mark, top) : between(top, mark))
    return openWaist(centre, { at: mark, arrives: { x: side.y, y: -side.x } }, darts, below)
  }
  const open = darts.reduce(
    (sum, dart) => sum + 2 * Math.abs(centre.at.y - dart.point.y) * Math.tan((dart.angle * Math.PI) / 360),
    0,
  )
  const guess = centre.at.x + wanted + open
  for (const spread of [6, 20, 50]) {
    const x = solveBetween(
      (value) => (drawn(value)?.length ?? NaN) - wanted,
      guess - spread,
      guess + spread,
      1e-8,
    )
    const waist = x === undefined ? undefined : drawn(x)
    if (x !== undefined && waist) return { side: at(x), darts, waist }
  }
  return pen.refuse({
    field: 'waist',
    code: 'impossible-shape',
    message: `A waist of ${pen.say(wanted)} does not lie fair between this centre and side with its darts. Check waist, hip and bust against each other, or change their ease.`,
  })
}

/**
 * The waist of a bodice as it runs to the end of its side seam, which may have been corrected since the waist was fitted.
 *
 * @param side the side seam from the underarm to the waist.
 */
export function waistTo(
  pen: Pen,
  centre: { readonly at: Point; readonly leaves: Point },
  side: Path,
  fitted: FittedWaist,
): FittedWaist {
  const at = endOf(side)
  if (distance(at, fitted.side) < 1e-6) return fitted
  const down = endTangent(side)
  const waist = openWaist(centre, { at, arrives: { x: down.y, y: -down.x } }, fitted.darts, false)
  if (waist) return { side: at, darts: fitted.darts, waist }
  return pen.refuse({
    field: 'corrections',
    code: 'impossible-shape',
    message: 'With these corrections the waist misses its darts. Correct the waist or the side seam less.',
  })
}

/**
 * Draws a fitted waist as edges and darts, from the centre to the side (`outwards`) or from the side to the centre.
 *
 * @param ends marks at the centre and at the side.
 * @returns ids of the waist's edges in the order drawn.
 */
export function drawWaist(
  piece: PiecePen,
  fitted: FittedWaist,
  ends: { readonly centre: string; readonly side: string },
  outwards: boolean,
  uses: readonly string[],
  finish: 'bound' | 'seam',
  mask: Mask = nothing,
): string[] {
  const { darts, waist } = fitted
  const order = outwards ? waist.stretches : waist.stretches.map(reversePath).reverse()
  const ids: string[] = []
  darts.forEach((dart, index) => {
    const [inner, outer] = [waist.stretches[index], waist.stretches[index + 1]] as [Path, Path]
    const name = `waistDart${index + 1}`
    const follows = { uses, mask, fixed: 'It follows from the waist: take in the seams beside it instead.' }
    piece.place(`${name}Point`, dart.point, { say: 'Mark the point of the waist dart', ...follows })
    piece.place(`${name}Inner`, inner.segments.at(-1)?.to as Point, {
      say: 'Mark its leg towards the centre',
      ...follows,
    })
    piece.place(`${name}Outer`, outer.segments[0]?.from as Point, {
      say: 'Mark its leg towards the side',
      ...follows,
    })
  })
  order.forEach((path, index) => {
    const fromCentre = outwards ? index : order.length - 1 - index
    const inner = fromCentre === 0 ? ends.centre : `waistDart${fromCentre}Outer`
    const outer = fromCentre === darts.length ? ends.side : `waistDart${fromCentre + 1}Inner`
    const [from, to] = outwards ? [inner, outer] : [outer, inner]
    const id = fromCentre === 0 ? 'waist' : `waist-${fromCentre + 1}`
    ids.push(id)
    piece.curve(id, pinned(path, piece.at(from), piece.at(to)), from, to, {
      role: 'waist',
      finish,
      allowance: 'waistAllowance',
      say: 'Draw the waist as it runs with its darts closed, then open them',
      uses,
      mask,
    })
    if (index === order.length - 1) return
    const number = outwards ? fromCentre + 1 : fromCentre
    const tip = `waistDart${number}Point`
    const [near, far] = outwards ? ['Inner', 'Outer'] : ['Outer', 'Inner']
    const legs = [
      `waist-dart-${number}-${near.toLowerCase()}`,
      `waist-dart-${number}-${far.toLowerCase()}`,
    ] as const
    piece.line(legs[0], `waistDart${number}${near}`, tip, {
      role: 'dart',
      say: 'Draw the first leg of the dart',
    })
    piece.line(legs[1], tip, `waistDart${number}${far}`, { role: 'dart', say: 'Draw its other leg' })
    piece.dart(`waist-dart-${number}`, legs, piece.at(tip), 'centre')
  })
  return ids
}

/** The same path between two marks that stand at its ends. */
export function pinned(path: Path, from: Point, to: Point): Path {
  const last = path.segments.length - 1
  return {
    closed: false,
    segments: path.segments.map((segment, index) => ({
      ...segment,
      ...(index === 0 ? { from } : {}),
      ...(index === last ? { to } : {}),
    })),
  }
}
