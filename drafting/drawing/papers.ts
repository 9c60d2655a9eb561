export interface Paper {
  readonly id: string
  readonly name: string
  /** mm, upright. */
  readonly width: number
  readonly height: number
}

/** ISO 216 for the A sizes; the US sizes are 8½ × 11, 8½ × 14 and 11 × 17 in. A new paper is a row here. */
export const papers = [
  { id: 'a4', name: 'A4', width: 210, height: 297 },
  { id: 'letter', name: 'US letter', width: 215.9, height: 279.4 },
  { id: 'a3', name: 'A3', width: 297, height: 420 },
  { id: 'legal', name: 'US legal', width: 215.9, height: 355.6 },
  { id: 'tabloid', name: 'US tabloid', width: 279.4, height: 431.8 },
] as const satisfies readonly Paper[]

export type PaperId = (typeof papers)[number]['id']

/** @throws Error for an id that is not in the table. */
export function paperOf(id: PaperId): Paper {
  const paper = papers.find((known) => known.id === id)
  if (!paper)
    throw new Error(`No paper is called "${id}"; known are ${papers.map(({ id }) => id).join(', ')}.`)
  return paper
}
