import type { MatchMark, TilePage } from './tiling'

/** Two marks an edge hold its direction as well as its place. */
const shares = [
  { share: 0.22, letter: 'a' },
  { share: 0.78, letter: 'b' },
] as const

/**
 * The marks of every edge that two printed pages share, in the middle of the band where they overlap: both print them whole, and
 * when the upper sheet is trimmed through them, its half completes the half on the sheet below. Edges are numbered in reading order.
 *
 * @returns the marks by page name.
 */
export function matchMarks(
  pages: readonly Omit<TilePage, 'marks'>[],
  overlap: number,
): ReadonlyMap<string, readonly MatchMark[]> {
  const printed = new Map(
    pages.filter((page) => !page.blank).map((page) => [`${page.row} ${page.column}`, page]),
  )
  const marks = new Map<string, MatchMark[]>()
  const put = (page: Omit<TilePage, 'marks'>, mark: MatchMark) =>
    marks.set(page.name, [...(marks.get(page.name) ?? []), mark])
  let edge = 0
  for (const page of printed.values()) {
    const { x, y, width, height } = page.window
    const right = printed.get(`${page.row} ${page.column + 1}`)
    const below = printed.get(`${page.row + 1} ${page.column}`)
    if (right) {
      edge += 1
      for (const { share, letter } of shares) {
        const mark = { name: `${edge}${letter}`, at: { x: x + width - overlap / 2, y: y + height * share } }
        put(page, { ...mark, side: 'right' })
        put(right, { ...mark, side: 'left' })
      }
    }
    if (below) {
      edge += 1
      for (const { share, letter } of shares) {
        const mark = { name: `${edge}${letter}`, at: { x: x + width * share, y: y + height - overlap / 2 } }
        put(page, { ...mark, side: 'bottom' })
        put(below, { ...mark, side: 'top' })
      }
    }
  }
  return marks
}
