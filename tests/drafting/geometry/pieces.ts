import type { Corner, EdgeRole, Path, Point, Segment } from '../../../drafting/contract'
import type { OutlineDart, OutlineEdge } from '../../../drafting/pieces/cut-line'
import { arcPath } from '../../../drafting/geometry/arc'
import { openPath } from '../../../drafting/geometry/path'
import { cubic, line } from '../../../drafting/geometry/segment'

/** Invented shapes like the ones a garment is made of, with made-up sizes in mm. */
export interface Shape {
  readonly name: string
  readonly edges: OutlineEdge[]
  readonly darts: OutlineDart[]
}

const p = (x: number, y: number): Point => ({ x, y })

export const edge = (
  id: string,
  role: EdgeRole,
  path: Path | Segment,
  allowance = 0,
  startCorner: Corner = 'mitre',
): OutlineEdge => ({
  id,
  role,
  path: 'segments' in path ? path : openPath([path]),
  allowance: role === 'fold' ? 0 : allowance,
  startCorner,
})

/** Half a front: fold at the centre, neckline, shoulder, armhole, flared side, hem. */
export const bodice = (a: readonly number[], size = 1, flare = 0.2): Shape => {
  const k = (x: number, y: number): Point => p(x * size, y * size)
  const hemX = 240 + 600 * flare
  return {
    name: 'bodice',
    edges: [
      edge('neckline', 'neckline', cubic(k(0, 90), k(50, 88), k(66, 50), k(70, 0)), a[0]),
      edge('shoulder', 'seam', line(k(70, 0), k(190, 42)), a[1]),
      edge(
        'armhole',
        'armhole',
        openPath([
          cubic(k(190, 42), k(170, 95), k(165, 120), k(172, 150)),
          cubic(k(172, 150), k(179, 180), k(200, 215), k(240, 216)),
        ]),
        a[2],
      ),
      edge('side', 'seam', line(k(240, 216), k(hemX, 800)), a[3]),
      edge(
        'hem',
        'hem',
        cubic(k(hemX, 800), k(hemX * 0.66, 840), k(hemX * 0.33, 850), k(0, 850)),
        a[4],
        'turned',
      ),
      edge('centre-front', 'fold', line(k(0, 850), k(0, 90))),
    ],
    darts: [],
  }
}

/** A whole set-in sleeve: head in two cubics, underarm seams, hem. */
export const sleeve = (a: readonly number[], size = 1, height = 140): Shape => {
  const k = (x: number, y: number): Point => p(x * size, y * size)
  return {
    name: 'sleeve',
    edges: [
      edge(
        'head',
        'armhole',
        openPath([
          cubic(k(-170, height), k(-115, height - 8), k(-80, 0), k(0, 0)),
          cubic(k(0, 0), k(80, 0), k(115, height - 8), k(170, height)),
        ]),
        a[0],
      ),
      edge('front-underarm', 'seam', line(k(170, height), k(120, 580)), a[1], 'square'),
      edge('hem', 'hem', line(k(120, 580), k(-120, 580)), a[2], 'turned'),
      edge('back-underarm', 'seam', line(k(-120, 580), k(-170, height)), a[3], 'turned'),
    ],
    darts: [],
  }
}

/** A panel of a circle skirt between two straight seams. */
export const circlePanel = (a: readonly number[], radius = 120, length = 600, angle = 90): Shape => {
  const waist = arcPath(p(0, 0), radius, angle, 0)
  const hem = arcPath(p(0, 0), radius + length, 0, angle)
  const w0 = waist.segments[0]!.from
  const w1 = waist.segments.at(-1)!.to
  const h0 = hem.segments[0]!.from
  const h1 = hem.segments.at(-1)!.to
  return {
    name: 'circle skirt panel',
    edges: [
      edge('waist', 'waist', waist, a[0]),
      edge('side', 'seam', line(w1, h0), a[1]),
      edge('hem', 'hem', hem, a[2], 'turned'),
      edge('centre', 'seam', line(h1, w0), a[3], 'turned'),
    ],
    darts: [],
  }
}

/** A thin crescent: neck facing. */
export const facing = (a: readonly number[], width = 50): Shape => {
  const w = width
  return {
    name: 'facing',
    edges: [
      edge('neckline', 'neckline', cubic(p(0, 90), p(50, 88), p(66, 50), p(70, 0)), a[0]),
      edge('shoulder', 'seam', line(p(70, 0), p(70 + w, w * 0.3)), a[1]),
      edge(
        'outer',
        'free',
        cubic(p(70 + w, w * 0.3), p(66 + w, 60 + w * 0.6), p(60, 88 + w), p(0, 90 + w)),
        a[2],
      ),
      edge('centre', 'fold', line(p(0, 90 + w), p(0, 90))),
    ],
    darts: [],
  }
}

/** A lens of two edges only. */
export const crescent = (a: readonly number[], depth = 20): Shape => ({
  name: 'crescent',
  edges: [
    edge('upper', 'seam', cubic(p(0, 0), p(60, -2 * depth), p(140, -2 * depth), p(200, 0)), a[0]),
    edge('lower', 'seam', cubic(p(200, 0), p(140, -0.6 * depth), p(60, -0.6 * depth), p(0, 0)), a[1]),
  ],
  darts: [],
})

/** A whole front with a V neck drawn as one edge. */
export const vNeck = (a: readonly number[], depth = 180, half = 80): Shape => ({
  name: 'V neck',
  edges: [
    edge('left-shoulder', 'seam', line(p(-200, 40), p(-half, 0)), a[0]),
    edge(
      'neckline',
      'neckline',
      openPath([line(p(-half, 0), p(0, depth)), line(p(0, depth), p(half, 0))]),
      a[1],
    ),
    edge('right-shoulder', 'seam', line(p(half, 0), p(200, 40)), a[2]),
    edge('right-side', 'seam', cubic(p(200, 40), p(170, 150), p(190, 220), p(250, 230)), a[3]),
    edge('right', 'seam', line(p(250, 230), p(270, 600)), a[4]),
    edge('hem', 'hem', line(p(270, 600), p(-270, 600)), a[5]),
    edge('left', 'seam', line(p(-270, 600), p(-250, 230)), a[6]),
    edge('left-side', 'seam', cubic(p(-250, 230), p(-190, 220), p(-170, 150), p(-200, 40)), a[7]),
  ],
  darts: [],
})

/** A neckline with a slit that opens into a round hole, as one edge. */
export const keyhole = (a: readonly number[], radius = 25, slit = 12): Shape => {
  const half = slit / 2
  const turn = (Math.asin(half / radius) * 180) / Math.PI
  const hole = arcPath(p(0, 100), radius, 270 - turn, -90 + turn)
  const from = p(-half, 40)
  const to = p(half, 40)
  return {
    name: 'keyhole',
    edges: [
      edge('left-shoulder', 'seam', line(p(-200, 40), p(-70, 0)), a[0]),
      edge(
        'neckline',
        'neckline',
        openPath([
          cubic(p(-70, 0), p(-60, 30), p(-40, 40), from),
          line(from, hole.segments[0]!.from),
          ...hole.segments,
          line(hole.segments.at(-1)!.to, to),
          cubic(to, p(40, 40), p(60, 30), p(70, 0)),
        ]),
        a[1],
      ),
      edge('right-shoulder', 'seam', line(p(70, 0), p(200, 40)), a[2]),
      edge('right', 'seam', line(p(200, 40), p(220, 400)), a[3]),
      edge('hem', 'hem', line(p(220, 400), p(-220, 400)), a[4]),
      edge('left', 'seam', line(p(-220, 400), p(-200, 40)), a[5]),
    ],
    darts: [],
  }
}

/** A skirt front with a waist dart. */
export const darted = (a: readonly number[], pressTo: OutlineDart['pressTo'], intake = 24): Shape => {
  const half = intake / 2
  // The waist falls away beyond the dart by the dart's angle, so that it is one line when the dart is folded.
  const length = 100
  const y = Math.sqrt(length * length - half * half)
  const left = p(90 - half, 110 - y)
  const right = p(90 + half, 110 - y)
  const tip = p(90, 110)
  const turn = 2 * Math.asin(half / length)
  const side = p(right.x + 85 * Math.cos(turn), right.y + 85 * Math.sin(turn))
  return {
    name: 'skirt with a dart',
    edges: [
      edge('waist', 'waist', line(p(0, left.y), left), a[0]),
      edge('dart-left', 'dart', line(left, tip)),
      edge('dart-right', 'dart', line(tip, right)),
      edge('waist-side', 'waist', line(right, side), a[0]),
      edge('side', 'seam', cubic(side, p(215, side.y + 50), p(225, 150), p(225, 200)), a[1]),
      edge('side-low', 'seam', line(p(225, 200), p(250, 600)), a[1], 'step'),
      edge('hem', 'hem', line(p(250, 600), p(0, 610)), a[2], 'turned'),
      edge('centre', 'fold', line(p(0, 610), p(0, left.y))),
    ],
    darts: [{ edges: ['dart-left', 'dart-right'], pressTo }],
  }
}

export type CornerName = Corner

/** The same shape with other corners, in order. */
export const withCorners = (shape: Shape, corners: readonly Corner[]): Shape => ({
  ...shape,
  edges: shape.edges.map((one, i) => ({ ...one, startCorner: corners[i % corners.length]! })),
})
