import { svgNumber, svgPath } from '../drawing/svg-path'
import type { Sketch } from './index'

/** A sketch as an SVG needs it: plain text, so that it can be sent, compared and kept. */
export interface Picture {
  readonly viewBox: string
  readonly lines: readonly { readonly kind: 'shape' | 'inner'; readonly d: string }[]
}

/** A sketch as a picture, with so much room around it, as a share of its larger side. */
export function pictureOf({ lines, bounds: { min, max } }: Sketch, margin = 0.02): Picture {
  const room = Math.max(max.x - min.x, max.y - min.y) * margin
  const box = [min.x - room, min.y - room, max.x - min.x + 2 * room, max.y - min.y + 2 * room]
  return {
    viewBox: box.map(svgNumber).join(' '),
    lines: lines.map(({ kind, path }) => ({ kind, d: svgPath(path) })),
  }
}
