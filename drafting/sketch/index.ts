import type { Draft, Piece, Point } from '../contract'
import { boundsOfPoints } from '../drawing/bounds'
import { bounds } from '../geometry'
import { neckSketch } from './at-neck'
import { bandOver } from './band'
import { bodySketch } from './body'
import { fanned } from './fan'
import { isFacing } from './main-pieces'
import { sleeveSketch } from './sleeve'
import type { SketchLine } from './sketch-line'

export interface Sketch {
  /** Back to front, mm. */
  readonly lines: readonly SketchLine[]
  readonly bounds: { readonly min: Point; readonly max: Point }
}

/**
 * A small flat drawing of a garment, made of its own pieces placed together the way they are worn: the front unfolded, its
 * skirt below it, a sleeve folded at each armhole, the band over the waist. Pieces without a front (panels, gores) lie side by
 * side. A picture to tell styles apart by, true to the draft's lines, not a pattern.
 * @param draft of any garment
 */
export function sketch(draft: Draft): Sketch {
  const own = draft.pieces.filter((piece) => piece.id === 'collar-stand' || !isFacing(piece))
  const fronts = own.filter(isFront)
  const lines = fronts.length > 0 ? frontSketch(fronts, own) : fanned(own)
  const corners = lines.flatMap(({ path }) => {
    const box = bounds(path)
    return [box.min, box.max]
  })
  return { lines, bounds: boundsOfPoints(corners) }
}

const isFront = ({ id }: Piece) => id.split('-').includes('front')

function frontSketch(fronts: readonly Piece[], own: readonly Piece[]): readonly SketchLine[] {
  const body = bodySketch(fronts)
  const sleeve = own.find(({ id }) => id === 'sleeve')
  const band = own.find(({ id }) => id === 'waistband')
  const front = fronts.find(({ id }) => id === 'front')
  return [
    ...(sleeve ? sleeveSketch(sleeve, fronts) : []),
    ...body,
    ...(front ? neckSketch(front, own) : []),
    ...(band ? bandOver(fronts, band) : []),
  ]
}
