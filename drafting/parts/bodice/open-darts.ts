import type { Dart, Path, Point } from '../../contract'
import {
  add,
  applyTo,
  compose,
  cross,
  distance,
  dot,
  identity,
  openPath,
  line,
  pathLength,
  pointAt,
  rotation,
  scale,
  slicePath,
  transformPath,
  undo,
  unit,
  type Transform,
} from '../../geometry'
import { between } from '../../pen/piece-pen'
import type { BustDart, DartPlace } from './bust-darts'

/** One edge of the upper outline of a front, from the neckline to the side. */
export interface UpperEdge {
  readonly id: 'neckline' | 'shoulder' | 'armhole' | 'side'
  readonly path: Path
}

/** A bust dart that opens on an edge: the edge, and how far along it. */
export interface Mouth {
  readonly dart: BustDart
  readonly edge: UpperEdge['id'] | 'centre'
  readonly along: (path: Path) => number
}

/** A bust dart with its point, and the angle about that point which gives the one it should have about the bust point. */
export interface Opening extends Mouth {
  readonly point: Point
  readonly degrees: number
}

/** How the parts of a front lie when its bust darts are open, against where they are drafted with the darts closed. */
export interface Frames {
  /** Darts of the upper outline in order from the centre neck. */
  readonly upper: readonly Opening[]
  /** The dart at the centre front. */
  readonly centre: Opening | undefined
  /** The whole side swung up, as the outline is drawn before its darts are opened. */
  readonly swing: Transform
  /** The waist between the centre and its dart, and between its dart and the side. */
  readonly inner: Transform
  readonly outer: Transform
}

/** What the darts of a front are opened by. */
export interface FrontBlock {
  readonly bust: Point
  /** How far short of the bust point each dart stops, mm. */
  readonly short: number
  readonly mouths: readonly Mouth[]
  /** The part of the bust dart that the waist takes, degrees, about the point of the waist dart. */
  readonly waist: { readonly degrees: number; readonly point: Point }
  readonly centre: Path
  /** The upper outline with the side swung up. */
  readonly outline: (swing: Transform) => readonly UpperEdge[]
}

/** The upper edges from the centre neck. */
const clockwise: readonly Mouth['edge'][] = ['neckline', 'shoulder', 'armhole', 'side']

/** The angle between two points as seen from a third, degrees, never negative. */
function angleAbout(about: Point, first: Point, second: Point): number {
  const a = between(about, first)
  const b = between(about, second)
  return (Math.abs(Math.atan2(cross(a, b), dot(a, b))) * 180) / Math.PI
}

/** The frames that follow from where the darts have their points. */
export function framesOf(block: FrontBlock, openings: readonly Opening[]): Frames {
  const centre = openings.find((one) => one.edge === 'centre')
  const upper = openings
    .filter((one) => one !== centre)
    .toSorted((one, other) => clockwise.indexOf(one.edge) - clockwise.indexOf(other.edge))
  const inner = centre ? rotation(-centre.degrees, centre.point) : identity
  const outer = compose(inner, rotation(-block.waist.degrees, block.waist.point))
  const opened = upper.reduce((all, one) => compose(rotation(one.degrees, one.point), all), identity)
  return { upper, centre, inner, outer, swing: compose(undo(opened), outer) }
}

/**
 * Finds the point of each dart, on its way from the bust point to its mouth, and the angle about that point which opens the
 * mouth by the dart's angle about the bust point. So a dart keeps its angle wherever it is moved, and closes exactly.
 */
export function findOpenings(block: FrontBlock): readonly Opening[] {
  const { bust, short } = block
  let openings: readonly Opening[] = block.mouths.map((mouth) => ({
    ...mouth,
    point: bust,
    degrees: mouth.dart.degrees,
  }))
  for (let round = 0; round < 24; round += 1) {
    const frames = framesOf(block, openings)
    const edges = block.outline(frames.swing)
    let before = identity
    let change = 0
    const next = new Map<Opening, Opening>()
    for (const one of [...frames.upper, ...(frames.centre ? [frames.centre] : [])]) {
      const isCentre = one === frames.centre
      const edge = isCentre ? block.centre : edges.find(({ id }) => id === one.edge)?.path
      if (!edge) throw new Error(`A front has no edge “${one.edge}”.`)
      const after = isCentre ? frames.inner : compose(rotation(one.degrees, one.point), before)
      const at = pointAt(edge, one.along(edge))
      const [first, second] = [applyTo(isCentre ? identity : before, at), applyTo(after, at)]
      const middle = { x: (first.x + second.x) / 2, y: (first.y + second.y) / 2 }
      const reach = Math.min(short, 0.45 * distance(bust, middle))
      const point = add(bust, scale(unit(between(bust, middle)), reach))
      const wide = angleAbout(bust, first, second)
      const degrees = wide > 1e-9 ? (one.degrees * one.dart.degrees) / wide : one.degrees
      change = Math.max(change, distance(point, one.point), Math.abs(degrees - one.degrees))
      next.set(one, { ...one, point, degrees })
      before = isCentre ? before : after
    }
    openings = openings.map((one) => next.get(one) ?? one)
    if (change < 1e-10) break
  }
  return openings
}

/** An edge, or a leg of a dart, as it lies on the open front. */
export interface PlacedEdge {
  readonly id: string
  /** The edge it is or is a part of, or `dart`. */
  readonly of: string
  readonly path: Path
  /** The mark at its start. */
  readonly from: string
  /** The dart that it is a leg of, and which way that is pressed, said with its first leg. */
  readonly dart?: string
  readonly press?: Dart['pressTo']
}

const starts: Readonly<Record<UpperEdge['id'], string>> = {
  neckline: 'centreNeck',
  shoulder: 'sideNeck',
  armhole: 'shoulderTip',
  side: 'underarm',
}

/** Upright darts are pressed to the centre, level ones down. Common practice, no published source. */
export const pressed: Readonly<Record<DartPlace, Dart['pressTo']>> = {
  neck: 'centre',
  shoulder: 'centre',
  waist: 'centre',
  armhole: 'down',
  side: 'down',
  'centre front': 'down',
}

const leg = (from: Point, to: Point): Path => openPath([line(from, to)])

/** Opens the darts of the upper outline. What lies before a dart stays; what lies beyond turns back about its point. */
export function openUpper(edges: readonly UpperEdge[], frames: Frames): PlacedEdge[] {
  const placed: PlacedEdge[] = []
  let frame = identity
  for (const edge of edges) {
    const whole = pathLength(edge.path)
    let done = 0
    let id: string = edge.id
    let from = starts[edge.id]
    for (const one of frames.upper.filter((opening) => opening.edge === edge.id)) {
      const along = one.along(edge.path)
      const first = transformPath(frame, slicePath(edge.path, done, along))
      frame = compose(rotation(one.degrees, one.point), frame)
      const mouth = applyTo(frame, pointAt(edge.path, along))
      const end = first.segments.at(-1)?.to ?? mouth
      placed.push(
        { id, of: edge.id, path: first, from },
        {
          id: `${one.dart.id}-upper`,
          of: 'dart',
          path: leg(end, one.point),
          from: `end-${id}`,
          dart: one.dart.id,
          press: pressed[one.dart.place],
        },
        {
          id: `${one.dart.id}-lower`,
          of: 'dart',
          path: leg(one.point, mouth),
          from: tipOf(one.dart.id),
          dart: one.dart.id,
        },
      )
      from = `end-${one.dart.id}-lower`
      id = `${id}-beyond`
      done = along
    }
    const rest = done > 0 ? slicePath(edge.path, done, whole) : edge.path
    placed.push({ id, of: edge.id, path: frame === identity ? rest : transformPath(frame, rest), from })
  }
  return placed
}

/** The mark at the point of a bust dart. */
export const tipOf = (dart: string): string => (dart === 'bust-dart-2' ? 'bustDart2Point' : 'bustDartPoint')
