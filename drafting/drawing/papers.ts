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
  { id: 'a2', name: 'A2', width: 420, height: 594 },
  { id: 'a1', name: 'A1', width: 594, height: 841 },
  { id: 'a0', name: 'A0', width: 841, height: 1189 },
] as const satisfies readonly Paper[]

/** A paper of the table, or a roll, whose width is said apart. */
export type PaperId = (typeof papers)[number]['id'] | 'roll'

/** Widths of a roll that can be printed on, mm: from A3 across to the widest plotters. */
export const rollWidths = { least: 297, most: 1650, usual: 914 } as const

/** The longest sheet that is cut from a roll, mm: readers of the page format stop at 14,400 points. */
export const longestSheet = 5000

/**
 * @param rollWidth of a roll, mm; the height of a roll is the longest sheet that may be cut from it.
 * @throws Error for an id that is not in the table, and for a roll out of its limits.
 */
export function paperOf(id: PaperId, rollWidth: number = rollWidths.usual): Paper {
  if (id === 'roll') {
    if (!(rollWidth >= rollWidths.least && rollWidth <= rollWidths.most)) {
      throw new Error(`A roll is ${rollWidths.least} to ${rollWidths.most} mm wide, not ${rollWidth}.`)
    }
    return { id, name: `roll of ${Math.round(rollWidth)} mm`, width: rollWidth, height: longestSheet }
  }
  const paper = papers.find((known) => known.id === id)
  if (!paper)
    throw new Error(`No paper is called "${id}"; known are ${papers.map(({ id }) => id).join(', ')}.`)
  return paper
}

/** The paper of the first page: large papers and rolls take an A4 one, made on the same machine. */
export function coverPaper(paper: Paper): Paper {
  return paper.width > 310 || paper.height > 1200 ? paperOf('a4') : paper
}
