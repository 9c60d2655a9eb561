import type { Path, Point } from '../contract'
import {
  add,
  cross,
  cubic,
  distance,
  endOf,
  endTangent,
  intersections,
  joinPaths,
  line,
  offsetPath,
  openPath,
  pathLength,
  pointAt,
  reversePath,
  scale,
  slicePath,
  startTangent,
} from '../geometry'
import { straight, type PiecePen } from '../pen/piece-pen'
import { neckCurve } from './necklines'
import { v } from './necklines/v'
import { trimBetween } from './trim'

const down = { x: 0, y: 1 }

/**
 * The outer edge of a band of even depth beside a neckline, from the centre to the shoulder. It meets the shoulder at
 * exactly the same distance in front and back. Where the neckline bends too sharply for an even band, the outer
 * edge is a plain neck curve of its own, pointed where the neckline is.
 */
export function evenBand(neckline: Path, depth: number, body: PiecePen, shoulder: Point): Path {
  const centre = body.at('centreNeck')
  const side = body.at('sideNeck')
  // A neckline that is not square to the shoulder crosses it slanting; front and back do so alike, so they still meet.
  const along = depth / Math.abs(cross(shoulder, endTangent(neckline)))
  const end = { x: side.x + shoulder.x * along, y: side.y + shoulder.y * along }
  const beside = offsetPath(neckline, -depth)
  const even = beside.clipped
    ? undefined
    : trimBetween(beside.path, { at: centre, along: down }, { at: side, along: shoulder })
  const last = even?.segments.at(-1)
  if (even && last && distance(last.to, end) < 0.3) {
    return { closed: false, segments: [...even.segments.slice(0, -1), { ...last, to: end }] }
  }
  const low = { x: centre.x, y: Math.max(centre.y, end.y) + depth }
  // It leaves the shoulder as the neckline does, so that front and back still run on into each other.
  const arrives = endTangent(neckline)
  const pointed = Math.abs(startTangent(neckline).y) > 0.2
  const corner = neckline.segments.length > 1 ? neckline.segments.at(-1)?.from : undefined
  if (pointed && corner) {
    const knee = add(end, scale(arrives, -Math.max(10, corner.y + depth * 0.4 - end.y)))
    return openPath([line(low, knee), line(knee, end)])
  }
  if (pointed) return v.draw(low, end, { x: -arrives.x, y: -arrives.y })
  return roundBand(low, end, scale(arrives, -1))
}

/** From the centre, square to it, to the shoulder, in a given direction there. */
function roundBand(low: Point, end: Point, leaves: Point): Path {
  const width = end.x - low.x
  const depth = low.y - end.y
  if (leaves.y <= 1e-9 || width + (leaves.x * depth) / leaves.y > 0.35 * width) {
    return neckCurve(low, end, leaves, 0.52, 0.5)
  }
  // A narrow neck leaves the shoulder too flat for one bend: two gentle ones.
  return openPath([
    cubic(low, { x: low.x + 0.3 * width, y: low.y }, add(end, scale(leaves, 0.35 * depth)), end),
  ])
}

/** Radius of the inside corner where a band turns down into a tongue or a front facing, mm. */
const turnRadius = 22

/** How a band turns down beside a centre: so far out, and down to a level. */
export interface TurnDown {
  readonly half: number
  readonly at: number
}

/**
 * A band from the shoulder inwards that turns down beside the centre: into a tongue that covers a keyhole, or along a front edge.
 *
 * @param band from the centre to the shoulder, as `evenBand` gives it.
 * @returns from the shoulder to the point so far out from the centre, at the level asked for or just below its corner, arriving
 * straight down.
 */
export function turnedDown(band: Path, { half, at }: TurnDown): Path {
  const met = intersections(band, straight({ x: half, y: -2000 }, { x: half, y: 4000 }))[0]
  const whole = pathLength(band)
  const meeting = Math.min(met?.a ?? 0, whole * 0.6)
  const from = Math.min(meeting + turnRadius, whole * 0.8)
  const rest = reversePath(slicePath(band, from, whole))
  const leaves = endOf(rest)
  const low = { x: half, y: Math.max(pointAt(band, meeting).y + turnRadius, leaves.y + turnRadius / 2) }
  const along = endTangent(rest)
  const reach = 0.55 * Math.min(turnRadius, distance(leaves, low))
  // Where the neckline itself is deep the level asked for may lie above the corner: the band then ends right below it.
  const end = { x: half, y: Math.max(at, low.y + 1) }
  return joinPaths(
    rest,
    openPath([
      cubic(
        leaves,
        { x: leaves.x + along.x * reach, y: leaves.y + along.y * reach },
        { x: low.x, y: low.y - reach },
        low,
      ),
      line(low, end),
    ]),
  )
}
