import type { SizeTable } from './size-table'

/** cm. */
const rows: readonly (readonly [size: number, bust: number, hip: number])[] = [
  [3, 74, 85],
  [5, 77, 87],
  [7, 80, 89],
  [9, 83, 91],
  [11, 86, 93],
  [13, 89, 95],
  [15, 92, 97],
  [17, 96, 99],
  [19, 100, 101],
]

/** JIS L 4005 (from 1997), figure type A, height code R: worked out from the standard's steps, its own table was not read. */
export const jisL4005: SizeTable = {
  id: 'jis-l-4005-a',
  name: 'JIS L 4005, women, type A',
  source:
    'JIS L 4005 (from 1997): bust steps of 3 cm up to 92 then 4 cm, 9AR = bust 83, hip 91, height 158, hip steps of 2 cm',
  status: { height: 'seen', bust: 'derived', hip: 'derived' },
  sizes: rows.map(([size, bust, hip]) => ({
    id: `jis-l-4005-${size}ar`,
    name: `${size}AR`,
    card: { height: 1580, bust: bust * 10, hip: hip * 10 },
  })),
}
