import type { NestedPiece, NestedSize, Piece, Point, Problem } from '../contract'

interface SizedPiece {
  readonly size: string
  readonly piece: Piece
}

const markAt = (piece: Piece, mark: string): Point | undefined =>
  piece.marks.find(({ id }) => id === mark)?.at

/**
 * Lays the sizes of each piece on each other at a mark. A piece that only some sizes have (a facing in one with the armhole on
 * a narrow shoulder) is nested in those.
 *
 * @param alignAt a mark for each piece, or one for all that have it.
 */
export function alignPieces(
  sizes: readonly NestedSize[],
  alignAt: unknown,
  problems: Problem[],
): readonly NestedPiece[] {
  const ids = [...new Set(sizes.flatMap(({ draft }) => draft.pieces.map(({ id }) => id)))]
  const byPiece = typeof alignAt === 'object' && alignAt !== null ? Object.entries(alignAt) : []
  for (const [id] of byPiece) {
    if (ids.includes(id)) continue
    const message = `No piece is called “${id.slice(0, 60)}”. There are ${ids.join(', ')}.`
    problems.push({ field: `alignAt.${id.slice(0, 60)}`, code: 'unknown-field', message })
  }
  return ids.map((id) => {
    const sized = sizes.flatMap(({ id: size, draft }): SizedPiece[] => {
      const piece = draft.pieces.find((one) => one.id === id)
      return piece ? [{ size, piece }] : []
    })
    // The middle size lies still, so that labels stand in the middle of the range.
    const middle = sized[Math.floor((sized.length - 1) / 2)] as SizedPiece
    const asked: unknown =
      typeof alignAt === 'string' ? alignAt : byPiece.find(([piece]) => piece === id)?.[1]
    const mark = chosenMark(sized, asked, typeof alignAt === 'string', problems)
    const still = markAt(middle.piece, mark) ?? { x: 0, y: 0 }
    return {
      id,
      name: middle.piece.name,
      alignedAt: mark,
      base: middle.size,
      shifts: Object.fromEntries(
        sized.map(({ size, piece }) => {
          const at = markAt(piece, mark) ?? still
          return [size, { x: still.x - at.x, y: still.y - at.y }]
        }),
      ),
    }
  })
}

/** The mark that was asked for, when every size of the piece has it; else the first that all have. */
function chosenMark(
  sized: readonly SizedPiece[],
  asked: unknown,
  whereItIs: boolean,
  problems: Problem[],
): string {
  const [first, ...rest] = sized.map(({ piece }) => piece.marks.map(({ id }) => id))
  const common = (first ?? []).filter((mark) => rest.every((marks) => marks.includes(mark)))
  if (asked === undefined || (whereItIs && !common.includes(asked as string))) return common[0] ?? ''
  if (typeof asked === 'string' && common.includes(asked)) return asked
  const piece = sized[0]?.piece
  const message = `The ${piece?.name.toLowerCase()} has no mark “${String(asked).slice(0, 60)}” in every size. Choose one of ${common.join(', ')}.`
  problems.push({ field: `alignAt.${piece?.id}`, code: 'unknown-field', message })
  return common[0] ?? ''
}
