import type { Path, Point } from '../contract'
import {
  add,
  applyTo,
  compose,
  cubic,
  identity,
  intersections,
  openPath,
  pathLength,
  rotation,
  scale,
  slicePath,
  transformPath,
  undo,
  type Transform,
} from '../geometry'
import { straight } from '../pen/piece-pen'
import { fairCurve } from './hem'

/** A dart at a waist: its point, and how much it takes out. The legs stand alike on both sides of its axis. */
export interface WaistDart {
  readonly point: Point
  /** Degrees between the legs. */
  readonly angle: number
  /** Degrees by which its axis is turned from the upright, where the piece was turned about another dart. */
  readonly lean?: number
}

/** One stretch of a waist between two darts, as it lies on the open piece, from the centre towards the side. */
export interface OpenWaist {
  readonly stretches: readonly Path[]
  /** Length of the waist with all darts closed, mm. */
  readonly length: number
  /** mm along it from the centre to each dart. */
  readonly joints: readonly number[]
}

/**
 * A waist drawn with its darts closed, so that it runs in one fair curve once they are sewn, and then opened out again.
 *
 * @param centre where it starts, and the direction in which it leaves there, square to the centre.
 * @param side where it ends on the open piece, and the direction in which it arrives, square to the side.
 * @param darts from the centre to the side.
 * @param below whether the darts point down, as in a skirt, or up, as in a bodice.
 * @returns undefined when a dart misses it.
 */
export function openWaist(
  centre: { readonly at: Point; readonly leaves: Point },
  side: { readonly at: Point; readonly arrives: Point },
  darts: readonly WaistDart[],
  below: boolean,
): OpenWaist | undefined {
  const sense = below ? -1 : 1
  // How each stretch moves when the darts between it and the centre are closed.
  const closing: Transform[] = [identity]
  for (const dart of darts) {
    closing.push(compose(closing[closing.length - 1] as Transform, rotation(sense * dart.angle, dart.point)))
  }
  const last = closing[closing.length - 1] as Transform
  const turned = darts.reduce((sum, dart) => sum + dart.angle, 0) * sense
  const arrives = applyTo(rotation(turned, { x: 0, y: 0 }), side.arrives)
  const end = applyTo(last, side.at)
  const closed =
    fairCurve(centre.at, centre.leaves, end, arrives) ?? smooth(centre.at, centre.leaves, end, arrives)
  const cuts: number[] = [0]
  darts.forEach((dart, index) => {
    const half = (dart.angle / 2) * (Math.PI / 180)
    const leg = {
      x: dart.point.x - Math.sin(half) * 900,
      y: dart.point.y + sense * Math.cos(half) * 900,
    }
    const met = intersections(
      closed,
      transformPath(
        compose(closing[index] as Transform, rotation(dart.lean ?? 0, dart.point)),
        straight(dart.point, leg),
      ),
    )[0]
    if (met) cuts.push(met.a)
  })
  const length = pathLength(closed)
  cuts.push(length)
  if (
    cuts.length !== darts.length + 2 ||
    cuts.some((cut, index) => index > 0 && cut - (cuts[index - 1] as number) < 2)
  ) {
    return undefined
  }
  const stretches = closing.map((move, index) =>
    transformPath(undo(move), slicePath(closed, cuts[index] as number, cuts[index + 1] as number)),
  )
  return { stretches, length, joints: cuts.slice(1, -1) }
}

/** Square at both ends, bending both ways where it must. */
function smooth(from: Point, leaves: Point, to: Point, arrives: Point): Path {
  const reach = Math.hypot(to.x - from.x, to.y - from.y) / 3
  return openPath([cubic(from, add(from, scale(leaves, reach)), add(to, scale(arrives, -reach)), to)])
}

/** The angle of a dart that takes out an intake at a distance from its point: both legs as long as that distance. Degrees. */
export function dartAngle(intake: number, leg: number): number {
  return (2 * Math.asin(Math.min(1, intake / 2 / leg)) * 180) / Math.PI
}
