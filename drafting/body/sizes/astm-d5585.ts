import type { Card } from '../card'
import type { PublishedSize, SizeTable } from './size-table'

const sizeNames = ['00', '0', '2', '4', '6', '8', '10', '12', '14', '16', '18', '20']

/** Inches, as printed, one a size. Mid-neck and shoulder girths, which nothing here asks for, are left out. */
const inches = {
  head: [21.25, 21.25, 21.5, 21.5, 21.75, 21.75, 22, 22, 22.25, 22.25, 22.5, 22.5],
  neckBase: [13.25, 13.5, 13.75, 14, 14.25, 14.625, 14.875, 15.125, 15.5, 15.75, 16, 16.375],
  upperBust: [31.75, 32.25, 33.25, 34.125, 35, 35.875, 36.75, 38, 39.25, 40.625, 42.25, 43.875],
  bust: [31.125, 31.75, 33, 34.125, 35.25, 36.25, 37.25, 38.75, 40.375, 42.125, 44, 46],
  underBust: [25.75, 26.5, 27.25, 28, 29, 30, 31, 32.5, 34, 35.75, 37.625, 39.625],
  curvyWaist: [23.875, 24.625, 25.375, 26.125, 27, 28, 29, 30.75, 32.5, 34.5, 36.75, 39],
  straightWaist: [25.375, 26.125, 26.875, 27.625, 28.5, 29.5, 30.5, 32.25, 34, 36, 38.25, 40.5],
} as const

function column(at: number, figure: 'curvy' | 'straight'): Card {
  const { curvyWaist, straightWaist, ...girths } = inches
  const waist = figure === 'curvy' ? curvyWaist : straightWaist
  const entries = Object.entries({ ...girths, waist }).map(
    ([id, row]) => [id, (row[at] ?? 0) * 25.4] as const,
  )
  return Object.fromEntries(entries)
}

function size(name: string, at: number, figure: 'curvy' | 'straight'): PublishedSize {
  return { id: `astm-d5585-${name}-${figure}`, name: `${name}, ${figure}`, card: column(at, figure) }
}

/** ASTM D5585-11e1, misses 00–20: the girths that stand on the publisher's public page, which breaks off after the waist. */
export const astmD5585: SizeTable = {
  id: 'astm-d5585',
  name: 'ASTM D5585-11e1, misses',
  source: 'ASTM D5585-11e1, Table 1, as shown on the publisher’s public abstract page',
  status: {
    head: 'seen',
    neckBase: 'seen',
    upperBust: 'seen',
    bust: 'seen',
    underBust: 'seen',
    waist: 'seen',
  },
  sizes: sizeNames.flatMap((name, at) => [size(name, at, 'curvy'), size(name, at, 'straight')]),
}
