import type { Path, Point } from '../../contract'
import {
  arcPath,
  cubic,
  endOf,
  endTangent,
  joinPaths,
  openPath,
  pathLength,
  slicePath,
  startOf,
} from '../../geometry'
import { nothing, type Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { solveBetween } from '../../pen/solve'
import { drawEnd, type End, type Neck, type StandNames } from './collar'

/** What a stand is drawn from, mm. */
export interface StandShape {
  /** Half the neckline. */
  readonly half: number
  /** How far it runs on over a lapped front. */
  readonly over: number
  readonly height: number
  /** How far the neck edge has risen at the centre front: the top edge comes out shorter and leans to the neck. */
  readonly rise: number
}

/** The curves of a stand, clockwise from its front end: an arc and its parallel, so that both lengths are exact. */
export interface StandCurves {
  /** From the end in front to the centre back. */
  readonly neck: Path
  /** From the centre back to the centre front, and on over the overlap to the end. */
  readonly top: Path
  readonly over: Path | undefined
}

/** Under this rise a stand is straight, mm. */
const straightBelow = 0.05

/** The angle by which a stand bends over half the neckline so that it rises so far, radians. */
const bendOf = (half: number, rise: number): number =>
  solveBetween((by) => (half * (1 - Math.cos(by))) / by - rise, 1e-6, 1.5) ?? 1.5

/** How much shorter than half the neckline the top edge of a stand is, mm. */
export const topShorter = (half: number, height: number, rise: number): number =>
  rise < straightBelow ? 0 : height * bendOf(half, rise)

/**
 * A stand bent about a point above it. The rise of an arc L long that turns by θ is L·(1 − cos θ)/θ, its parallel h above is
 * shorter by h·θ (geometry); common practice gives the same as half the neck × shortening / (2 × height).
 */
export function standCurves({ half, over, height, rise }: StandShape): StandCurves {
  if (rise < straightBelow) return level(half, over, height)
  const turn = bendOf(half, rise)
  const radius = half / turn
  const point = { x: 0, y: -radius }
  const degrees = (turn * 180) / Math.PI
  const whole = degrees * ((half + over) / half)
  const pin = (path: Path): Path => {
    const [first, ...rest] = path.segments
    return openPath([{ ...first!, from: { x: 0, y: -height } }, ...rest])
  }
  const neck = arcPath(point, radius, 90 - whole, 90)
  const last = neck.segments.length - 1
  return {
    neck: openPath(
      neck.segments.map((one, index) => (index === last ? { ...one, to: { x: 0, y: 0 } } : one)),
    ),
    top: pin(arcPath(point, radius - height, 90, 90 - degrees)),
    over: over > 0 ? arcPath(point, radius - height, 90 - degrees, 90 - whole) : undefined,
  }
}

function level(half: number, over: number, height: number): StandCurves {
  const end = half + over
  return {
    neck: straight({ x: end, y: 0 }, { x: 0, y: 0 }),
    top: straight({ x: 0, y: -height }, { x: half, y: -height }),
    over: over > 0 ? straight({ x: half, y: -height }, { x: end, y: -height }) : undefined,
  }
}

/** What a stand is drawn by. */
export interface StandOptions extends StandNames {
  /** Style value that gives the allowance of its turned edges. */
  readonly allowance: string
  /** Radius of the rounded corner where it ends at the centre front, mm; 0 leaves it square. */
  readonly corner: number
  /** What the overlap follows from that it runs on over. */
  readonly over?: Mask
}

/**
 * Draws a stand: neck edge, centre back, top, front end. Over a lapped front it runs on and is rounded off.
 *
 * @returns the edges that are turned out.
 */
export function drawStand(
  pen: Pen,
  piece: PiecePen,
  neck: Neck,
  curves: StandCurves,
  ends: { readonly front: End; readonly back: End },
  { height, rise, corner, allowance, over = nothing }: StandOptions,
): readonly string[] {
  const uses = [height, rise]
  const mask = neck.uses | over | pen.usesOf(uses)
  piece.start('centreBack', { x: 0, y: 0 }, 'Mark the centre back of the neck edge')
  piece.go('topBack', 'centreBack', 'up', height, {
    say: 'Go up the height of the stand',
    drag: [height],
  })
  pen.tag({ piece: piece.id, from: 'centreBack', to: 'topBack', label: 'Height', value: height })
  piece.place('neckFront', startOf(curves.neck), {
    say: 'Along the neck edge, rising to the front, go half the neckline',
    from: 'centreBack',
    mask,
    stepKind: 'solve',
  })
  const rounded = !curves.over && corner > 0 && ends.front === 'end'
  const top = rounded ? slicePath(curves.top, 0, pathLength(curves.top) - corner) : curves.top
  piece.place('topFront', endOf(top), { say: 'Mark the end of the top edge, even with the neck edge', mask })
  piece.curve('neck', curves.neck, 'neckFront', 'centreBack', {
    role: 'neckline',
    allowance: 'neckAllowance',
    say: 'Draw the neck edge, as long as the neckline',
    mask,
  })
  drawEnd(piece, 'centre-back', ends.back, 'centreBack', 'topBack', allowance)
  const turned = { role: 'free', finish: 'seam', allowance } as const
  piece.curve('top', top, 'topBack', 'topFront', { ...turned, say: 'Draw the top edge even with it', mask })
  const edges = ends.back === 'end' ? ['centre-back', 'top'] : ['top']
  if (ends.front === 'fold') {
    drawEnd(piece, 'centre-front', 'fold', 'topFront', 'neckFront', allowance)
    return edges
  }
  const end = rounded ? roundOff(curves.top, top, startOf(curves.neck)) : lapEnd(curves, startOf(curves.neck))
  piece.curve('front-end', end, 'topFront', 'neckFront', {
    ...turned,
    say: 'Round the end off down to the neck edge',
    mask,
  })
  return [...edges, 'front-end']
}

/** From a shortened top edge round the corner and down to the neck edge. */
function roundOff(whole: Path, top: Path, foot: Point): Path {
  const [from, corner] = [endOf(top), endOf(whole)]
  const radius = Math.hypot(corner.x - from.x, corner.y - from.y)
  const long = Math.hypot(foot.x - corner.x, foot.y - corner.y)
  const down = { x: (foot.x - corner.x) / long, y: (foot.y - corner.y) / long }
  const to = { x: corner.x + down.x * radius, y: corner.y + down.y * radius }
  const along = endTangent(top)
  const reach = radius * 0.552
  return joinPaths(
    openPath([
      cubic(
        from,
        { x: from.x + along.x * reach, y: from.y + along.y * reach },
        { x: to.x - down.x * reach, y: to.y - down.y * reach },
        to,
      ),
    ]),
    straight(to, foot),
  )
}

/** From the top at the centre front round over the overlap, and down to the end of the neck edge. */
function lapEnd({ top, over }: StandCurves, foot: Point): Path {
  const from = endOf(top)
  if (!over) return straight(from, foot)
  const along = endTangent(top)
  const corner = endOf(over)
  const out = Math.hypot(corner.x - from.x, corner.y - from.y)
  const long = Math.hypot(foot.x - corner.x, foot.y - corner.y)
  const down = { x: (foot.x - corner.x) / long, y: (foot.y - corner.y) / long }
  return openPath([
    cubic(
      from,
      { x: from.x + along.x * out * 0.7, y: from.y + along.y * out * 0.7 },
      { x: foot.x - down.x * long * 0.6, y: foot.y - down.y * long * 0.6 },
      foot,
    ),
  ])
}
