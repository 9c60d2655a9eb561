import type { Path, Point } from '../../contract'
import {
  add,
  cubic,
  distance,
  openPath,
  pathLength,
  reversePath,
  rotation,
  applyTo,
  scale,
} from '../../geometry'
import { between } from '../../pen/piece-pen'

/** The corners that a princess seam runs between, on the panel of the centre and on the panel of the side. */
export interface PrincessCorners {
  readonly from: 'shoulder' | 'armhole'
  /** Degrees by which the side panel was turned at its top. */
  readonly turned: number
  /** The bust point or, in a back, the point of the waist dart. */
  readonly node: Point
  readonly top: Point
  readonly topBeyond: Point
  readonly waist: Point
  readonly waistBeyond: Point
}

const angleOf = (along: Point): number => (Math.atan2(along.x, along.y) * 180) / Math.PI
/** Unit direction so many degrees from straight down, outwards. */
const down = (degrees: number): Point => {
  const turn = (degrees * Math.PI) / 180
  return { x: Math.sin(turn), y: Math.cos(turn) }
}
const turn = (along: Point, degrees: number): Point => applyTo(rotation(degrees, { x: 0, y: 0 }), along)

/** One side of the seam: down from the top to the node and on to the waist, without a corner on the way. */
function sweep(top: Point, leaves: Point, node: Point, through: Point, waist: Point, arrives: Point) {
  const upper = distance(top, node) / 3
  const lower = distance(node, waist) / 3
  return {
    upper: openPath([cubic(top, add(top, scale(leaves, upper)), add(node, scale(through, -upper)), node)]),
    lower: openPath([
      cubic(node, add(node, scale(through, lower)), add(waist, scale(arrives, -lower)), waist),
    ]),
  }
}

/**
 * The two sides of a princess seam. Each runs in one sweep past the node. The side panel has more to go round, so the seam
 * is shifted a little towards the side and its direction there turned, until both sides have the same length above the
 * node and below it; the girth over the bust stays as it was.
 *
 * @returns both seams as they lie on their panels clockwise, and the place of the node on the seam, mm from its top.
 */
export function princessSeams(corners: PrincessCorners): {
  readonly centre: Path
  readonly side: Path
  readonly match: { readonly a: number; readonly b: number }
} {
  const { node, top, topBeyond, waist, waistBeyond } = corners
  const chord = angleOf(between(top, node))
  const legs = [angleOf(between(node, waist)), angleOf(between(node, waistBeyond))] as const
  // From the armhole the seam sets out level and turns down: it leaves its chord as far as it arrives on the other side.
  const weight = corners.from === 'armhole' ? 0.3 : 0.5
  const away = corners.from === 'armhole' ? 0.6 * chord : 0
  const leaves = down(chord + away)
  const through = chord * weight + legs[0] * (1 - weight)
  const beyondChord = angleOf(between(topBeyond, node))
  const throughBeyond = beyondChord * weight + legs[1] * (1 - weight)
  const both = (shift: number, more: number) => {
    const at = { x: node.x + shift, y: node.y }
    return {
      centre: sweep(top, leaves, at, down(through), waist, down(legs[0])),
      side: sweep(
        topBeyond,
        turn(leaves, corners.turned),
        at,
        down(throughBeyond + more),
        waistBeyond,
        down(legs[1]),
      ),
    }
  }
  const off = (shift: number, more: number): readonly [number, number] => {
    const { centre, side } = both(shift, more)
    return [
      pathLength(side.upper) - pathLength(centre.upper),
      pathLength(side.lower) - pathLength(centre.lower),
    ]
  }
  const [shift, more] = solvePair(off)
  const { centre, side } = both(shift, more)
  const join = (one: { upper: Path; lower: Path }): Path =>
    openPath([...one.upper.segments, ...one.lower.segments])
  return {
    centre: join(centre),
    side: reversePath(join(side)),
    match: { a: pathLength(centre.upper), b: pathLength(side.upper) },
  }
}

/** Newton's way in two unknowns with differences for derivatives, its steps kept short. */
function solvePair(f: (x: number, y: number) => readonly [number, number]): readonly [number, number] {
  let [x, y] = [0, 0]
  for (let round = 0; round < 30; round += 1) {
    const [u, v] = f(x, y)
    if (Math.abs(u) + Math.abs(v) < 1e-9) break
    const [ux, vx] = f(x + 0.01, y)
    const [uy, vy] = f(x, y + 0.01)
    const [a, b, c, d] = [(ux - u) / 0.01, (uy - u) / 0.01, (vx - v) / 0.01, (vy - v) / 0.01]
    const det = a * d - b * c
    if (Math.abs(det) < 1e-12) break
    const step = { x: (b * v - d * u) / det, y: (c * u - a * v) / det }
    const short = Math.min(1, 4 / Math.max(Math.abs(step.x), Math.abs(step.y), 1e-12))
    x += step.x * short
    y += step.y * short
  }
  return [x, y]
}
