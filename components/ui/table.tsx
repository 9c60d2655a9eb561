import type { ReactNode } from 'react'
import { classes } from './classes'

export interface Column<Row> {
  readonly id: string
  readonly head: ReactNode
  /** Nothing is shown as a dash; on a phone it takes no room. */
  readonly cell: (row: Row) => ReactNode
  /** Set when the column is sorted by; shown by an arrow and said by aria-sort. */
  readonly sorted?: 'ascending' | 'descending'
  readonly end?: boolean
}

/** Rows with breathing room on a laptop, cards on a phone; the first column names the row in both. */
export function Table<Row>({
  caption,
  columns,
  rows,
  rowKey,
}: {
  readonly caption: string
  readonly columns: readonly Column<Row>[]
  readonly rows: readonly Row[]
  readonly rowKey: (row: Row) => string
}) {
  return (
    <table className="block w-full border-collapse sm:table">
      <caption className="sr-only">{caption}</caption>
      <thead className="sr-only sm:not-sr-only sm:table-header-group">
        <tr className="border-b border-rule">
          {columns.map((column) => (
            <th
              key={column.id}
              scope="col"
              aria-sort={column.sorted}
              className={classes(
                'px-3 pb-2 text-sm font-semibold text-walnut first:pl-0 last:pr-0',
                column.end ? 'text-right' : 'text-left',
              )}
            >
              {column.head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody className="block sm:table-row-group">
        {rows.map((row) => (
          <tr
            key={rowKey(row)}
            className="mb-3 grid gap-0.5 border hairline bg-sheet p-4 sm:mb-0 sm:table-row sm:border-0 sm:border-b sm:bg-transparent sm:p-0 sm:hover:bg-sheet"
          >
            {columns.map((column, index) => {
              const Cell = index === 0 ? 'th' : 'td'
              const content = column.cell(row)
              return (
                <Cell
                  key={column.id}
                  scope={index === 0 ? 'row' : undefined}
                  className={classes(
                    'px-0 font-normal sm:px-3 sm:py-3.5 sm:first:pl-0 sm:last:pr-0',
                    column.end ? 'text-left sm:text-right' : 'text-left',
                    index > 0 && 'text-sm text-walnut sm:text-base sm:text-ink',
                    !content && 'max-sm:hidden',
                  )}
                >
                  {content || '–'}
                </Cell>
              )
            })}
          </tr>
        ))}
      </tbody>
    </table>
  )
}
