import type { Corner, EdgeRole, Edge, Path, Point } from '../../contract'
import { applyTo, distance, endOf, reversePath, transformPath, type Transform } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { PiecePen } from '../../pen/piece-pen'
import { pinned, type FittedWaist } from '../fitted-waist'
import type { PlacedEdge } from './open-darts'

interface Manner {
  readonly role: EdgeRole
  readonly allowance?: string
  readonly kind: 'line' | 'curve'
  readonly corner?: Corner
  readonly say: string
}

const manners: Readonly<Record<string, Manner>> = {
  neckline: { role: 'neckline', allowance: 'neckAllowance', kind: 'curve', say: 'Draw the neckline' },
  shoulder: { role: 'seam', allowance: 'shoulderAllowance', kind: 'line', say: 'Draw the shoulder' },
  armhole: {
    role: 'armhole',
    allowance: 'armholeAllowance',
    kind: 'curve',
    say: 'Draw the armhole: square off the shoulder, in to the hollow, round to the underarm',
  },
  side: { role: 'seam', allowance: 'sideAllowance', kind: 'line', say: 'Draw the side seam' },
  waist: {
    role: 'waist',
    allowance: 'waistAllowance',
    kind: 'curve',
    say: 'Draw the waist as it runs with its darts closed, then open them',
  },
  hem: {
    role: 'hem',
    allowance: 'hemAllowance',
    kind: 'curve',
    corner: 'turned',
    say: 'Draw the hem in one fair curve, square to the side and to the centre',
  },
  princess: {
    role: 'seam',
    allowance: 'panelAllowance',
    kind: 'curve',
    say: 'Draw the seam in one sweep over the bust or the shoulder blade to the waist',
  },
  dart: { role: 'dart', kind: 'line', say: 'Draw a leg of the dart to its point' },
  centre: { role: 'seam', allowance: 'panelAllowance', kind: 'line', say: 'Draw the centre seam' },
}

/** How an edge is drawn over and above its kind. */
export interface OutlineOptions {
  /** What all of it follows from, beside its marks. */
  readonly uses: Mask
  readonly waist?: Edge['finish']
  /** The piece that a panel is traced off. */
  readonly source?: PiecePen
  /** The mark at which the outline ends; its own beginning when it closes. */
  readonly end?: string
}

/**
 * Draws edges that follow each other, with a mark at every corner: one that stands there already, one traced from the source,
 * or a new one. A dart's two legs become a dart.
 */
export function drawOutline(piece: PiecePen, edges: readonly PlacedEdge[], options: OutlineOptions): void {
  const { uses: mask, source } = options
  const standing = (id: string, at: Point): string => {
    if (piece.marks.has(id)) return distance(piece.at(id), at) < 1e-6 ? id : standing(`${id}-open`, at)
    if (source?.marks.has(id) && distance(source.at(id), at) < 1e-6) piece.trace(id, source, mask)
    else
      piece.place(id, at, {
        say: 'Mark the corner',
        mask,
        fixed: 'It follows the marks on both sides of it.',
      })
    return id
  }
  const first = edges[0]
  let from = first ? standing(first.from, first.path.segments[0]!.from) : ''
  edges.forEach((edge, index) => {
    const next = edges[index + 1]?.from ?? options.end ?? first?.from ?? ''
    const to = standing(next, endOf(edge.path))
    const { role, allowance, kind, corner, say } = manners[edge.of] as Manner
    piece.curve(edge.id, pinned(edge.path, piece.at(from), piece.at(to)), from, to, {
      role,
      ...(allowance ? { allowance } : {}),
      ...(corner ? { corner } : {}),
      ...(edge.of === 'waist' && options.waist ? { finish: options.waist } : {}),
      say,
      kind,
      mask,
    })
    from = to
  })
}

/** Makes darts of the pairs of legs that were drawn. */
export function closeDarts(piece: PiecePen, edges: readonly PlacedEdge[]): void {
  edges.forEach((edge, index) => {
    const second = edges[index + 1]
    if (!edge.dart || edge.of !== 'dart' || second?.dart !== edge.dart) return
    const at = endOf(piece.edge(edge.id).path)
    piece.dart(edge.dart, [edge.id, second.id], at, edge.press ?? 'down')
  })
}

/** The waist of a half from the side to the centre, its darts open, as edges. @param move where each stretch lies */
export function waistEdges(
  { waist, darts }: FittedWaist,
  ends: { readonly side: string; readonly centre: string },
  move: (stretch: number) => Transform,
): PlacedEdge[] {
  const edges: PlacedEdge[] = []
  for (let index = waist.stretches.length - 1; index >= 0; index -= 1) {
    const lie = (path: Path): Path => transformPath(move(index), reversePath(path))
    const outward = index === darts.length ? ends.side : `waistDart${index + 1}Inner`
    const path = lie(waist.stretches[index] as Path)
    edges.push({ id: index === 0 ? 'waist' : `waist-${index + 1}`, of: 'waist', path, from: outward })
    const dart = darts[index - 1]
    if (index === 0 || !dart) continue
    const tip = applyTo(move(index), dart.point)
    const inner = transformPath(move(index - 1), waist.stretches[index - 1] as Path)
    const name = `waist-dart-${index}`
    const leg = (from: Point, to: Point): Path => ({ closed: false, segments: [{ kind: 'line', from, to }] })
    edges.push(
      {
        id: `${name}-outer`,
        of: 'dart',
        path: leg(endOf(path), tip),
        from: `waistDart${index}Outer`,
        dart: name,
        press: 'centre',
      },
      {
        id: `${name}-inner`,
        of: 'dart',
        path: leg(tip, endOf(inner)),
        from: `waistDart${index}Point`,
        dart: name,
      },
    )
  }
  return edges
}
