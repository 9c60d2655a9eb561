import type { Run } from '../../contract'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import type { Faced } from '../facing'
import type { Centres } from '../openings/opening'

/** What a collar is drawn for: the necklines with their darts closed, and how the garment opens. */
export interface Neck {
  readonly front: Faced
  readonly back: Faced
  /** Lengths of the two necklines from the centre to the shoulder, mm. */
  readonly long: { readonly front: number; readonly back: number }
  readonly centres: Centres
  /** Everything that the necklines follow from. */
  readonly uses: Mask
}

/** The edge of a collar that is sewn to the neckline: from the centre front to the centre back. */
export interface NeckEdge {
  readonly piece: PiecePen
  readonly edge: string
  /** mm of it that run on over the overlap of a lapped front, before the centre front. */
  readonly over: number
}

/** Style values that give a stand its height and its rise to the front. */
export interface StandNames {
  readonly height: string
  readonly rise: string
}

/** A kind of collar. */
export interface Collar {
  /** The stand that it closes round the neck with, whose top edge is shorter than the neckline; none where it falls open. */
  readonly stands?: (pen: Pen) => StandNames | undefined
  readonly draw: (pen: Pen, neck: Neck) => NeckEdge
}

/** How one end of a collar piece is made: on the fold, closed with the other end, or turned out with the outer edge. */
export type End = 'fold' | 'seam' | 'end'

/** Where a garment opens at the neck, which its collar follows. */
function opensAt({ front, back }: Centres): 'front' | 'back' | 'nowhere' {
  if (front.kind === 'lap' || front.keyhole) return 'front'
  return back.kind === 'zip' || back.keyhole || back.slit ? 'back' : 'nowhere'
}

/** A collar that falls open in front has its ends there; behind it is on the fold unless the garment opens there. */
export function fallingEnds(centres: Centres): { readonly front: End; readonly back: End } {
  return { front: 'end', back: opensAt(centres) === 'back' ? 'end' : 'fold' }
}

/** A stand goes all round: its ends lie where the garment opens; where it does not, it is closed with a seam behind. */
export function standingEnds(centres: Centres): { readonly front: End; readonly back: End } {
  const opens = opensAt(centres)
  if (opens === 'front') return { front: 'end', back: 'fold' }
  return { front: 'fold', back: opens === 'back' ? 'end' : 'seam' }
}

/** Draws the end of a collar piece, from one mark to the next. */
export function drawEnd(
  piece: PiecePen,
  id: string,
  end: End,
  from: string,
  to: string,
  allowance: string,
): void {
  const place = id.replace('-', ' ')
  if (end === 'fold') {
    piece.line(id, from, to, { role: 'fold', say: `The ${place} lies on the fold` })
    return
  }
  piece.line(id, from, to, {
    role: end === 'seam' ? 'seam' : 'free',
    finish: 'seam',
    allowance,
    say: end === 'seam' ? `The seam at the ${place}` : `The end at the ${place}`,
  })
}

/** Two layers of the cloth, an upper and an under one, and one of interfacing; on the fold where the piece has one. */
export function cutCollar(piece: PiecePen, ends: { readonly front: End; readonly back: End }): void {
  const onFold = ends.front === 'fold' || ends.back === 'fold'
  const count = onFold ? 1 : 2
  piece.cut(
    { cloth: 'main', count: 2 * count, onFold, handed: !onFold },
    { cloth: 'interfacing', count, onFold, handed: !onFold },
  )
}

/** Sews the upper to the under layer along the edges that are turned out, if there are any. */
export function sewLayers(pen: Pen, piece: PiecePen, edges: readonly string[]): void {
  if (edges.length === 0) return
  const runs: Run[] = edges.map((edge) => ({ piece: piece.id, edge }))
  pen.sew({
    id: `${piece.id}-layers`,
    name: `${piece.name}, upper to under`,
    a: runs,
    b: runs.map((run) => ({ ...run, mirrored: true })),
    join: 'faced',
  })
}

/** Closes a stand that does not open anywhere with a seam at the centre back. */
export function closeBehind(pen: Pen, piece: PiecePen, { back }: { readonly back: End }): void {
  if (back !== 'seam') return
  pen.sew({
    id: `${piece.id}-centre-back`,
    name: `${piece.name}, centre back`,
    a: [{ piece: piece.id, edge: 'centre-back' }],
    b: [{ piece: piece.id, edge: 'centre-back', mirrored: true }],
  })
}
