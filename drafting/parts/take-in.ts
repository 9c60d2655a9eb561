import type { Path, Point, Segment } from '../contract'
import {
  add,
  applyTo,
  cubic,
  distance,
  identity,
  intersections,
  pathLength,
  perpendicular,
  pointAt,
  scale,
  slicePath,
  endOf,
  startOf,
  subtract,
  tangentOn,
  transformPath,
  unit,
  type Transform,
} from '../geometry'
import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'

/** Nearer than this to each other two places cannot be told apart; nearer to an end, the end itself moves. mm */
const apart = 30
/** The last stretch above a hem stays straight, so that its allowance turns up flat. mm */
const aboveHem = 90
/** A seam that runs off by more than this, mm a mm, would not hang: the correction is too large for its length. */
const steepest = 0.4

const atCorrection = 'It stands where a correction put it: change that correction.'

interface Knot {
  readonly along: number
  readonly by: number
  readonly id?: string
}

/** A seam as corrections left it, and the marks on which it starts and ends where they moved an end. */
export interface TakenIn {
  readonly path: Path
  readonly top?: string
  readonly end?: string
}

interface Seam {
  /** Ids by which a correction may name it. */
  readonly seams: readonly string[]
  /** Level on the body of y = 0 on the piece, mm. */
  readonly origin?: number
  /** mm along it where nothing moves unless a correction names that place: the hip between waist and hem. */
  readonly rests?: readonly number[]
  /** Whether its ends move with a correction near them, or stay. */
  readonly ends: 'move' | 'stay'
  /** How the piece lies against the frame in which levels are measured. */
  readonly turned?: Transform
  /** Levels are measured along the seam from its top, where the piece lies round a point and has no level lines. */
  readonly alongSeam?: boolean
  /** What to do instead near an end that stays. */
  readonly instead?: string
  /** Stands behind the names of the marks, where two edges of a piece are taken in by one correction. */
  readonly suffix?: string
}

/**
 * Takes a seam in or lets it out at the levels that corrections name, fading out to the next place that rests. Drawn the same on
 * both sides of the seam, so both stay alike.
 *
 * @param path from the top down, with the piece on its right, in the frame in which levels are measured.
 */
export function takeIn(pen: Pen, piece: PiecePen, path: Path, seam: Seam): TakenIn {
  const turned = seam.turned ?? identity
  const corrections = seam.seams
    .flatMap((id) => pen.corrections.forSeam(id))
    .sort((a, b) => a.level - b.level)
  if (corrections.length === 0) return { path: transformPath(turned, path) }
  const long = pathLength(path)
  const origin = seam.origin ?? 0
  const spare = seam.ends === 'move' ? 0 : apart
  const least = (seam.alongSeam ? 0 : Math.max(0, startOf(path).y)) + origin + spare
  const most = (seam.alongSeam ? long : endOf(path).y) + origin - 4 * spare
  const asked = corrections.map(({ id, level, by }): Knot => {
    if (least >= most) {
      pen.refuse({
        field: `corrections.${id}`,
        code: 'impossible-shape',
        message: `This seam is too short to be taken in between its ends.${seam.instead ? ` ${seam.instead}` : ''}`,
      })
    }
    if (level < least || level > most) {
      pen.refuse({
        field: `corrections.${id}`,
        code: 'impossible-shape',
        message: `This seam can be taken in between ${pen.say(least)} and ${pen.say(most)}. Choose a level between them.${seam.instead ? ` ${seam.instead}` : ''}`,
        min: least,
        max: most,
      })
    }
    const y = level - origin
    const along = seam.alongSeam
      ? y
      : (intersections(path, straight({ x: -4000, y }, { x: 8000, y }))[0]?.a ?? 0)
    return { id, by, along: along < apart ? 0 : along > long - aboveHem - apart ? long - aboveHem : along }
  })
  const knots = withRests(asked, [0, ...(seam.rests ?? []), long - aboveHem])
  knots.push({ ...(knots.at(-1) as Knot), along: long })
  refuseSteep(pen, knots)
  const drawn = moved(path, knots)
  const markOf = (id: string): string => `takenIn-${id}${seam.suffix ?? ''}`
  for (const { id, along, by } of knots) {
    if (!id || along === long) continue
    const at = add(pointAt(path, along), scale(perpendicular(tangentOn(path, along)), by))
    piece.place(markOf(id), applyTo(turned, at), {
      say: `Correction: ${by < 0 ? 'let out' : 'take in'} the seam here, the same on both sides`,
      fixed: atCorrection,
    })
  }
  const [first, last] = [knots[0], knots.at(-1)]
  if (last?.id) {
    piece.place(`${markOf(last.id)}-hem`, applyTo(turned, endOf(drawn)), {
      say: 'Correction: the same at the hem',
      fixed: atCorrection,
    })
  }
  return {
    path: transformPath(turned, drawn),
    ...(first?.id ? { top: markOf(first.id) } : {}),
    ...(last?.id ? { end: `${markOf(last.id)}-hem` } : {}),
  }
}

/** The places that corrections name and, where they leave room, those that rest. */
function withRests(asked: readonly Knot[], rests: readonly number[]): Knot[] {
  const free = rests.filter((along) => asked.every((one) => Math.abs(one.along - along) >= apart))
  return [...asked, ...free.map((along) => ({ along, by: 0 }))].sort((a, b) => a.along - b.along)
}

function refuseSteep(pen: Pen, knots: readonly Knot[]): void {
  for (const [index, knot] of knots.entries()) {
    const before = knots[index - 1]
    if (!before || (knot.id && knot.id === before.id)) continue
    const long = knot.along - before.along
    const change = Math.abs(knot.by - before.by)
    if (long >= apart - 1e-6 && change * 1.5 <= steepest * long) continue
    const most = Math.max(0, (steepest * long) / 1.5)
    pen.refuse({
      field: `corrections.${knot.id ?? before.id}`,
      code: 'impossible-shape',
      message: `Over ${pen.say(long)} of this seam no more than ${pen.say(most)} can be taken in or let out and still hang fair. Correct it by less, or at places farther apart.`,
    })
  }
}

/** How far the seam is moved inwards so many mm along it, and how that changes per mm. */
function shift(knots: readonly Knot[], along: number): readonly [by: number, slope: number] {
  const next = knots.findIndex((knot) => knot.along >= along)
  const to = knots[Math.max(next, 0)] as Knot
  const from = knots[next - 1]
  if (!from) return [to.by, 0]
  const long = to.along - from.along
  const t = (along - from.along) / long
  const change = to.by - from.by
  return [from.by + change * t * t * (3 - 2 * t), (6 * change * t * (1 - t)) / long]
}

/** The path with every point moved inwards by what its place asks for. */
function moved(path: Path, knots: readonly Knot[]): Path {
  const joints: number[] = []
  let reached = 0
  for (const segment of path.segments)
    joints.push((reached += pathLength({ closed: false, segments: [segment] })))
  const breaks = [0, ...joints, ...knots.map((knot) => knot.along)]
    .sort((a, b) => a - b)
    .filter((along, index, all) => index === 0 || along - (all[index - 1] as number) > 1e-6)
  const segments: Segment[] = []
  for (const [index, to] of breaks.entries()) {
    const from = breaks[index - 1]
    if (from === undefined) continue
    for (const segment of slicePath(path, from, to).segments) {
      segments.push(bent(segment, shift(knots, from), shift(knots, to), segments.at(-1)?.to))
    }
  }
  return { closed: false, segments }
}

function bent(
  segment: Segment,
  [fromBy, fromSlope]: readonly [number, number],
  [toBy, toSlope]: readonly [number, number],
  start: Point | undefined,
): Segment {
  const { from, to } = segment
  const control1 = segment.kind === 'cubic' ? segment.control1 : add(from, scale(subtract(to, from), 1 / 3))
  const control2 = segment.kind === 'cubic' ? segment.control2 : add(from, scale(subtract(to, from), 2 / 3))
  const inFrom = perpendicular(unit(subtract(control1, from)))
  const inTo = perpendicular(unit(subtract(to, control2)))
  if (fromBy === 0 && toBy === 0 && fromSlope === 0 && toSlope === 0 && segment.kind === 'line')
    return { ...segment, from: start ?? from }
  return cubic(
    start ?? add(from, scale(inFrom, fromBy)),
    add(control1, scale(inFrom, fromBy + fromSlope * distance(from, control1))),
    add(control2, scale(inTo, toBy - toSlope * distance(control2, to))),
    add(to, scale(inTo, toBy)),
  )
}
