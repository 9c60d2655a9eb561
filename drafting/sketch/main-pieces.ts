import type { Piece } from '../contract'

const behind = new Set(['facing', 'pocket', 'bag', 'lining', 'interfacing', 'stand', 'under'])

/** Whether a piece lies behind others when the garment is worn, so that a flat drawing leaves it out. */
export function isFacing({ id, cut }: Piece): boolean {
  return id.split('-').some((word) => behind.has(word)) || !cut.some(({ cloth }) => cloth === 'main')
}

/** How often a piece is cut from the main cloth. */
export function countOf({ cut }: Piece): number {
  return cut.reduce((sum, { cloth, count }) => sum + (cloth === 'main' ? count : 0), 0)
}
