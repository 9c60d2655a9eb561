import type { Drawing, Path } from '../contract'
import { applyTo, transformPath } from '../geometry/transform'
import type { Transform } from '../geometry/transform'
import type { Paper } from './papers'

/** Full size for cutting; the smaller ones for class and record. */
export const printScales = { full: 1, half: 0.5, quarter: 0.25, fifth: 0.2 } as const
export type PrintScale = keyof typeof printScales

/**
 * What a printer made of a side of 100 mm, mm: across the paper's short side, and along its long side. 98.5 means that it
 * shrinks.
 */
export interface Measured {
  readonly short: number
  readonly long: number
}

/** A printer that is true. */
export const trueMeasure: Measured = { short: 100, long: 100 }

/** What may be corrected: beyond this the print was made to fit the page, and correcting it would hide that. */
export const correctable = { least: 95, most: 105 } as const

/** How the drawing is stretched on the page, so that the print has its true size or the scale that was asked for. */
export interface Stretch {
  readonly x: number
  readonly y: number
}

/** The stretch for sheets that lie upright or on their side: the printer's own directions stay those of the paper. */
export function stretchOf(
  measured: Measured,
  scale: PrintScale,
  orientation: 'portrait' | 'landscape',
): Stretch {
  const size = printScales[scale]
  const short = (size * 100) / measured.short
  const long = (size * 100) / measured.long
  return orientation === 'portrait' ? { x: short, y: long } : { x: long, y: short }
}

/**
 * The edge to be kept free on the page, mm, so that `wanted` mm stay free on the print, whether the printer shrinks or swells
 * the page about its middle or about a corner.
 */
export function safeMargin(paper: Paper, measured: Measured, wanted: number): number {
  const of = (side: number, got: number) => {
    const factor = got / 100
    return factor <= 1 ? wanted / factor : (wanted + side * (factor - 1)) / factor
  }
  return Math.max(of(paper.width, measured.short), of(paper.height, measured.long))
}

const transformOf = ({ x, y }: Stretch): Transform => ({ a: x, b: 0, c: 0, d: y, e: 0, f: 0 })

/** A path as it is drawn on the page. */
export function stretchPath(path: Path, stretch: Stretch): Path {
  return stretch.x === 1 && stretch.y === 1 ? path : transformPath(transformOf(stretch), path)
}

/** A drawing as it is drawn on the page. Texts keep their shape and take the scale. */
export function stretchDrawing(drawing: Drawing, stretch: Stretch): Drawing {
  if (stretch.x === 1 && stretch.y === 1) return drawing
  const transform = transformOf(stretch)
  const size = Math.min(stretch.x, stretch.y)
  return {
    items: drawing.items.map((item) =>
      item.kind === 'path'
        ? { ...item, path: transformPath(transform, item.path) }
        : { ...item, at: applyTo(transform, item.at), size: item.size * size },
    ),
    bounds: {
      min: applyTo(transform, drawing.bounds.min),
      max: applyTo(transform, drawing.bounds.max),
    },
  }
}
