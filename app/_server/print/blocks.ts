import 'server-only'
import type { PageContent } from './page-content'

/** Something as wide as the column that is set one below the other: it knows its height and is drawn from its upper left corner. */
export interface Block {
  /** mm */
  readonly height: number
  readonly draw: (content: PageContent, at: { readonly x: number; readonly y: number }) => void
  /** Keeps with the block after it: a heading does not end a page. */
  readonly keeps?: boolean
  /** Begins a page, or a column of one. */
  readonly starts?: 'page' | 'column'
}

/** A block where it comes to stand on a page. */
export interface Placed {
  readonly block: Block
  readonly column: number
  /** mm from the top of the column. */
  readonly down: number
}

/**
 * Sets blocks in columns, column after column and page after page, none cut in two. One that is higher than a column has it alone.
 * @param height of a column, mm
 * @returns the blocks of each page
 */
export function paginated(
  blocks: readonly Block[],
  height: number,
  columns: number,
): readonly (readonly Placed[])[] {
  const pages: Placed[][] = []
  let page: Placed[] = []
  let column = 0
  let down = 0
  const turn = () => {
    if (page.length > 0) pages.push(page)
    page = []
    column = 0
    down = 0
  }
  const nextColumn = () => {
    if (column + 1 >= columns) return turn()
    column += 1
    down = 0
  }
  blocks.forEach((block, index) => {
    const next = block.keeps ? (blocks[index + 1]?.height ?? 0) : 0
    if (block.starts === 'page') turn()
    else if (down > 0 && (block.starts === 'column' || down + block.height + next > height)) nextColumn()
    page.push({ block, column, down })
    down += block.height
  })
  turn()
  return pages
}
