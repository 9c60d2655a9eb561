/** Things that stand on one piece, next to each other in the drafting order. */
export interface PieceGroup<T> {
  readonly piece: string
  readonly items: readonly T[]
}

/** Splits a list into runs of the same piece and keeps its order: the sheet as a tree, piece by piece. */
export function byPiece<T extends { readonly piece: string }>(items: readonly T[]): readonly PieceGroup<T>[] {
  return items.reduce<readonly PieceGroup<T>[]>((groups, item) => {
    const last = groups.at(-1)
    if (last?.piece !== item.piece) return [...groups, { piece: item.piece, items: [item] }]
    return [...groups.slice(0, -1), { piece: item.piece, items: [...last.items, item] }]
  }, [])
}
