import type { Edge, Piece, Point } from '../contract'
import {
  bounds,
  closedPath,
  compose,
  endOf,
  flatten,
  identity,
  line,
  mirrorIn,
  mirrorX,
  rotation,
  startOf,
  transformPath,
  translation,
} from '../geometry'
import type { SketchLine } from './sketch-line'

/** Degrees by which a sleeve hangs away from the body. */
const lift = 38

/**
 * A sleeve at each armhole, folded along its middle, its head at the tip of the shoulder. It goes behind the front.
 * Nothing when the sleeve has no front half.
 */
export function sleeveSketch(sleeve: Piece, fronts: readonly Piece[]): readonly SketchLine[] {
  const armhole = fronts.flatMap(({ edges }) => edges).find(({ role }) => role === 'armhole')
  const head = sleeve.edges.find(({ id, role }) => role === 'armhole' && id.includes('front'))
  if (!armhole || !head) return []
  const [tip] = highestFirst(armhole)
  const [top, corner] = highestFirst(head)
  const half = frontHalf(sleeve, top, corner)
  // Its underarm seam faces the body, which is to the left of the right armhole.
  const inward = corner.x > top.x ? mirrorIn(top, { x: top.x, y: top.y + 1 }) : identity
  const place = compose(compose(translation(tip.x - top.x, tip.y - top.y), rotation(-lift, top)), inward)
  const right = transformPath(place, half)
  return [right, transformPath(mirrorX, right)].map((path) => ({ kind: 'shape', path }))
}

function highestFirst({ path }: Edge): readonly [Point, Point] {
  const ends = [startOf(path), endOf(path)] as const
  return ends[0].y <= ends[1].y ? ends : [ends[1], ends[0]]
}

/** The sleeve on one side of its middle: from the head down the fold, along the hem, and up its underarm seam. */
function frontHalf(sleeve: Piece, top: Point, corner: Point) {
  const seam = sleeve.edges.find(({ id, role }) => role === 'seam' && id.includes('front'))
  const side = Math.sign(corner.x - top.x)
  const hem = sleeve.edges
    .filter(({ role }) => role !== 'armhole' && role !== 'seam')
    .flatMap(({ path }) => flatten(path, 0.5))
    .filter(({ x }) => Math.sign(x - top.x) === side)
  const down = seam ? flatten(seam.path, 0.5) : [corner]
  const fromCorner = down[0] && near(down[0], corner) ? down : [...down].reverse()
  const last = fromCorner.at(-1) ?? corner
  const hemInward = hem.length > 1 && hem[0] && near(hem[0], last) ? hem : [...hem].reverse()
  const foot = hemInward.at(-1) ?? last
  const low = bounds(sleeve.cutLine).max.y
  const middle = { x: top.x, y: hem.length > 0 ? foot.y : Math.min(low, last.y) }
  const points = [top, ...fromCorner, ...hemInward, middle]
  return closedPath(points.map((from, index) => line(from, points[(index + 1) % points.length] as Point)))
}

const near = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y) < 1
