import type { Run } from '../../contract'
import { nothing, type Mask } from '../../pen/masks'
import type { PiecePen } from '../../pen/piece-pen'

/** An armhole as a sleeve sees it: the edges that make it, from the shoulder to the underarm. */
export interface Armhole {
  readonly piece: PiecePen
  readonly edges: readonly string[]
}

/** The armhole of a piece that has it in one edge. */
export const wholeArmhole = (piece: PiecePen): Armhole => ({ piece, edges: ['armhole'] })

/** Length of an armhole, mm; a dart may divide it. */
export const armholeLength = ({ piece, edges }: Armhole): number =>
  edges.reduce((sum, edge) => sum + piece.lengthOf(edge), 0)

/** What an armhole follows from. */
export const armholeUses = ({ piece, edges }: Armhole): Mask =>
  edges.reduce((mask, edge) => mask | piece.edge(edge).uses, nothing)

/** The whole of an armhole, in sewing order from the shoulder. */
export const armholeRuns = ({ piece, edges }: Armhole): Run[] =>
  edges.map((edge) => ({ piece: piece.id, edge }))

/** A stretch of an armhole, mm from the shoulder, in sewing order. */
export function armholeStretch({ piece, edges }: Armhole, from: number, to: number): Run[] {
  let before = 0
  return edges.flatMap((edge): Run[] => {
    const whole = piece.lengthOf(edge)
    const start = Math.max(0, from - before)
    const end = Math.min(whole, to - before)
    before += whole
    if (end - start < 1e-6) return []
    const run = { piece: piece.id, edge }
    return [
      {
        ...run,
        ...(start > 0 ? { from: start } : {}),
        ...(end < whole ? { to: end } : {}),
      },
    ]
  })
}
