import type { Edge, Path, Run } from '../../contract'
import { endOf, intersections, startOf } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import type { PlacedEdge } from './open-darts'
import { closeDarts, drawOutline } from './outline'
import { princessSeams } from './princess'

/** Where the edges of a half are once darts or a seam have divided them. */
export interface DrawnHalf {
  /** The edges that one edge of the half consists of, in order clockwise from the centre neck. */
  readonly runs: (edge: string) => Run[]
  /** The waist from the centre to the side. */
  readonly waist: readonly Run[]
  /** The pieces of the half, the one with the centre first. */
  readonly pieces: readonly PiecePen[]
}

/** How a half is drawn from the edges of its outline. */
export interface HalfOptions {
  readonly uses: Mask
  readonly waist: Edge['finish']
  /** The edge that a princess seam divides, and degrees by which what lies beyond it was turned. */
  readonly princess?: {
    readonly from: 'shoulder' | 'armhole'
    readonly node: string
    readonly turned: number
  }
  /** The mark at which the outline ends, where the centre is drawn by itself. */
  readonly end?: string
}

/** Draws a half as one piece with darts, or as a centre and a side panel that a princess seam joins. */
export function drawHalf(
  pen: Pen,
  piece: PiecePen,
  edges: readonly PlacedEdge[],
  options: HalfOptions,
): DrawnHalf {
  if (options.princess) return drawPanels(pen, piece, edges, options, options.princess)
  drawOutline(piece, edges, options)
  closeDarts(piece, edges)
  return placesOf(edges, () => piece, [piece])
}

function placesOf(
  edges: readonly PlacedEdge[],
  on: (edge: PlacedEdge) => PiecePen,
  pieces: readonly PiecePen[],
): DrawnHalf {
  const runs = (of: string): Run[] =>
    edges.filter((edge) => edge.of === of).map((edge) => ({ piece: on(edge).id, edge: edge.id }))
  const waist = runs('waist')
    .map((run) => ({ ...run, reversed: true }))
    .reverse()
  return { runs, waist, pieces }
}

/** The edges before a leg, and the leg's place among them. */
function legAt(edges: readonly PlacedEdge[], dart: string): number {
  const index = edges.findIndex((edge) => edge.dart === dart)
  if (index < 1) throw new Error(`The outline has no dart “${dart}”.`)
  return index
}

/** Whether a princess seam meets the neckline, as it may on a slight body with a wide deep neck. */
function reachesNeck(seam: Path, edges: readonly PlacedEdge[]): boolean {
  return edges.some(({ of, path }) => of === 'neckline' && intersections(seam, path).length > 0)
}

function drawPanels(
  pen: Pen,
  centre: PiecePen,
  edges: readonly PlacedEdge[],
  options: HalfOptions,
  princess: NonNullable<HalfOptions['princess']>,
): DrawnHalf {
  const [top, low] = [legAt(edges, 'princess'), legAt(edges, 'waist-dart-1')]
  const at = (index: number): PlacedEdge => edges[index] as PlacedEdge
  const seams = princessSeams({
    from: princess.from,
    turned: princess.turned,
    node: centre.at(princess.node),
    top: endOf(at(top - 1).path),
    topBeyond: startOf(at(top + 2).path),
    waist: startOf(at(low + 2).path),
    waistBeyond: endOf(at(low - 1).path),
  })
  if (reachesNeck(seams.centre, edges)) {
    pen.refuse({
      field: 'shaping',
      code: 'impossible-shape',
      message: `The neckline of the ${centre.name.toLowerCase()} reaches the princess seam. Make the neck narrower or less deep, or shape the bodice with darts.`,
    })
  }
  const side = pen.piece(`${centre.id}-side`, `${centre.name} side`)
  const ofCentre: readonly PlacedEdge[] = [
    ...edges.slice(0, top),
    { id: 'princess', of: 'princess', path: seams.centre, from: at(top).from },
    ...edges.slice(low + 2),
  ]
  const ofSide: readonly PlacedEdge[] = [
    ...edges.slice(top + 2, low),
    { id: 'princess', of: 'princess', path: seams.side, from: at(low).from },
  ]
  drawOutline(centre, ofCentre, options)
  drawOutline(side, ofSide, { ...options, end: at(top + 2).from, source: centre })
  pen.sew({
    id: `${centre.id}-princess`,
    name: `${centre.name} princess seam`,
    a: [{ piece: centre.id, edge: 'princess' }],
    b: [{ piece: side.id, edge: 'princess', reversed: true }],
    matches: [seams.match],
    ticks: centre.id === 'back' ? 2 : 1,
    smooth: true,
  })
  const middle = (centre.at(princess.node).x + side.at('underarm').x) / 2
  const level = side.at('underarm').y
  const deep = side.at(ofSide.at(-1)?.from ?? 'underarm').y
  side.grain({ x: middle, y: level + 20 }, { x: middle, y: deep - 20 })
  side.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  const beyond = new Set(ofSide)
  return placesOf(edges, (edge) => (beyond.has(edge) ? side : centre), [centre, side])
}
