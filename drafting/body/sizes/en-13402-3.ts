import type { SizeTable } from './size-table'

/** cm: middle of the interval of bust, waist and hip, with the letter code where there is one. */
const rows: readonly (readonly [bust: number, waist: number, hip: number, letter: string])[] = [
  [76, 60, 84, 'XS'],
  [80, 64, 88, 'XS'],
  [84, 68, 92, 'S'],
  [88, 72, 96, 'S'],
  [92, 76, 100, 'M'],
  [96, 80, 104, 'M'],
  [100, 84, 108, 'L'],
  [104, 88, 112, 'L'],
  [110, 94, 117, 'XL'],
  [116, 100, 122, 'XL'],
  [122, 106, 127, 'XXL'],
  [128, 112, 132, 'XXL'],
  [134, 118, 137, '3XL'],
  [140, 124, 142, '3XL'],
  [146, 130, 147, ''],
  [152, 136, 152, ''],
]

/** EN 13402-3, women. The bust intervals were read; waists, hips and letters are recalled and to be verified. */
export const en13402: SizeTable = {
  id: 'en-13402-3',
  name: 'EN 13402-3, women',
  source:
    'EN 13402-3; bust intervals as cited by the documentation of the CRAN package Anthropometry, the rest from memory',
  status: { bust: 'seen', waist: 'memory', hip: 'memory' },
  sizes: rows.map(([bust, waist, hip, letter]) => ({
    id: `en-13402-${bust}`,
    name: letter === '' ? `Bust ${bust}` : `Bust ${bust} (${letter})`,
    card: { bust: bust * 10, waist: waist * 10, hip: hip * 10 },
  })),
}
