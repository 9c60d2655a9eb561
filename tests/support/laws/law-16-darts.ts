import type { Dart, Draft, Edge, Path, Piece, Point } from '@/drafting/contract'
import {
  chordsOf,
  endOfPath,
  far,
  headingAtEnd,
  headingAtStart,
  lengthOfPath,
  startOfPath,
  turnFrom,
} from './curves'
import { garmentOf, styleOf } from './formulas'
import { insideRing, ringOf, stitchPath } from './outline'
import { drafted, withStyle } from './redraft'
import { Findings, type DraftLaw, type OrderLaw } from './violation'

/** Legs are alike, a closed dart leaves its seam and its cut line smooth, and its point is where it was asked. */
export const darts: DraftLaw = (draft, order, engine) => {
  const found = new Findings(16)
  for (const piece of draft.pieces) for (const dart of piece.darts) one(found, piece, dart)
  const garment = garmentOf(order, engine.garments)
  const bust = draft.pieces.flatMap((piece) => piece.darts).find((dart) => dart.id === 'bust-dart')
  const apex = draft.pieces
    .find((piece) => piece.id === 'front')
    ?.marks.find((mark) => mark.id === 'bustPoint')?.at
  if (!bust || !apex || order.tape || order.corrections?.some((correction) => !correction.off))
    return found.all
  if (styleOf(order, garment, 'dartTo') === 'waist') return found.all
  const short = Number(styleOf(order, garment, 'dartShort'))
  found.atMost(
    'bust-dart',
    'its point is off its distance from the bust point',
    Math.abs(far(bust.point, apex) - short),
    0.2,
  )
  return found.all
}

function one(found: Findings, piece: Piece, dart: Dart): void {
  const where = `${piece.id}.${dart.id}`
  const [a, b] = dart.legs.map(lengthOfPath)
  found.atMost(where, 'legs differ by', Math.abs((a ?? NaN) - (b ?? NaN)), 0.2)
  const ends = dart.legs.flatMap((leg) => [startOfPath(leg), endOfPath(leg)])
  const mouth = ends.filter((end) => far(end, dart.point) > 1)
  if (mouth.length !== 2) return found.add(where, 'its legs do not run from the mouth to its point')
  found.atMost(
    where,
    'intake off the width of its mouth',
    Math.abs(far(mouth[0] as Point, mouth[1] as Point) - dart.intake),
    0.2,
  )
  if (dart.edges) closed(found, piece, dart, dart.edges)
}

/** Turns a point about another, degrees clockwise on the sheet. */
function turned(point: Point, about: Point, degrees: number): Point {
  const turn = (degrees * Math.PI) / 180
  const [x, y] = [point.x - about.x, point.y - about.y]
  return {
    x: about.x + x * Math.cos(turn) - y * Math.sin(turn),
    y: about.y + x * Math.sin(turn) + y * Math.cos(turn),
  }
}

const between = (from: Point, to: Point): Point => ({ x: to.x - from.x, y: to.y - from.y })

function closed(found: Findings, piece: Piece, dart: Dart, ids: readonly [string, string]): void {
  const where = `${piece.id}.${dart.id}`
  const index = piece.edges.findIndex((edge) => edge.id === ids[0])
  const count = piece.edges.length
  const at = (step: number): Edge => piece.edges[(index + step + count) % count] as Edge
  const [before, first, second, after] = [at(-1), at(0), at(1), at(2)]
  if (index < 0 || first.role !== 'dart' || second.role !== 'dart' || second.id !== ids[1]) {
    return found.add(where, 'its legs do not follow each other in the outline')
  }
  const left = endOfPath(before.path)
  const right = startOfPath(after.path)
  // Folded, the second half of the seam is turned about the point until the legs lie on each other.
  const angle = turnFrom(between(dart.point, right), between(dart.point, left))
  found.atMost(where, 'closed, its mouth gapes', far(turned(right, dart.point, angle), left), 0.2)
  const along = turned(headingAtStart(after.path), { x: 0, y: 0 }, angle)
  found.atMost(
    where,
    'closed, the seam turns at it, degrees',
    Math.abs(turnFrom(headingAtEnd(before.path), along)),
    5,
  )
  capped(found, piece, dart, where, [before, first, second, after])
}

/** Between its neighbours the cut line crosses the mouth outside the stitch line, and no leg is offset. */
function capped(found: Findings, piece: Piece, dart: Dart, where: string, around: readonly Edge[]): void {
  const ring = ringOf(stitchPath(piece), 0.01)
  for (const edge of around.slice(1, 3)) {
    const inside = chordsOf(edge.cut).some(
      (point) => insideRing(ring, point) && far(point, dart.point) < dart.intake,
    )
    if (inside) found.add(where, 'its cut line runs into the piece')
    const deep = chordsOf(edge.cut).some((point) => far(point, dart.point) < 0.5 * lengthOfPath(dart.legs[0]))
    if (deep) found.add(where, 'its legs are offset')
  }
}

/** A bust dart moved to another place keeps its angle about the bust point. */
export const movedDartsKeepTheirAngle: OrderLaw = (order, engine) => {
  const found = new Findings(16)
  const garment = garmentOf(order, engine.garments)
  const alone = garment.design.some((value) => value.id === 'dartSharedWith')
    ? withStyle(order, 'dartSharedWith', 'nothing')
    : order
  const places = garment.design.find((value) => value.id === 'dartTo')?.choices ?? []
  const angles = places
    .filter((place) => place !== 'waist')
    .map((place) => angleOf(drafted(withStyle({ ...alone, explain: false }, 'dartTo', place), engine)))
    .filter((angle) => angle !== undefined)
  const [least, most] = [Math.min(...angles), Math.max(...angles)]
  if (angles.length > 1)
    found.atMost('bust-dart', 'its angle changes with its place, degrees', most - least, 0.1)
  return found.all
}

function angleOf(draft: Draft | undefined): number | undefined {
  const front = draft?.pieces.find((piece) => piece.id === 'front')
  const dart = front?.darts.find((one) => one.id === 'bust-dart')
  const apex = front?.marks.find((mark) => mark.id === 'bustPoint')?.at
  const outer = dart?.legs.map(
    (leg: Path) =>
      [startOfPath(leg), endOfPath(leg)].sort((p, q) => far(q, dart.point) - far(p, dart.point))[0],
  )
  const [a, b] = outer ?? []
  if (!apex || !a || !b) return undefined
  return Math.abs(turnFrom(between(apex, a), between(apex, b)))
}
