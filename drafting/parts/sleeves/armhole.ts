import type { Run } from '../../contract'
import { nothing, type Mask } from '../../pen/masks'
import type { PiecePen } from '../../pen/piece-pen'

/** An armhole as a sleeve sees it: the edges that make it, from the shoulder to the underarm, on one piece or several. */
export type Armhole = readonly { readonly piece: PiecePen; readonly edge: string }[]

/** The armhole of a piece that has it in one edge. */
export const wholeArmhole = (piece: PiecePen): Armhole => [{ piece, edge: 'armhole' }]

/** Length of an armhole, mm; a dart or a seam may divide it. */
export const armholeLength = (armhole: Armhole): number =>
  armhole.reduce((sum, { piece, edge }) => sum + piece.lengthOf(edge), 0)

/** What an armhole follows from. */
export const armholeUses = (armhole: Armhole): Mask =>
  armhole.reduce((mask, { piece, edge }) => mask | piece.edge(edge).uses, nothing)

/** The whole of an armhole, in sewing order from the shoulder. */
export const armholeRuns = (armhole: Armhole): Run[] =>
  armhole.map(({ piece, edge }) => ({ piece: piece.id, edge }))

/** A stretch of an armhole, mm from the shoulder, in sewing order. */
export function armholeStretch(armhole: Armhole, from: number, to: number): Run[] {
  let before = 0
  return armhole.flatMap(({ piece, edge }): Run[] => {
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
