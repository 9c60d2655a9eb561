import { closeBehind, cutCollar, sewLayers, standingEnds, type Collar } from './collar'
import { drawStand, standCurves } from './stand'

const names = { height: 'funnelHeight', rise: 'funnelRise' }

/** A funnel on a close neck: a high stand, nearly straight, in two layers; it opens where the garment does. Common practice. */
export const funnel: Collar = {
  stands: () => names,
  draw(pen, neck) {
    const piece = pen.piece('funnel', 'Funnel')
    const height = pen.length('funnelHeight')
    const half = neck.long.front + neck.long.back
    const curves = standCurves({ half, over: 0, height, rise: pen.length('funnelRise') })
    const ends = standingEnds(neck.centres)
    const turned = drawStand(pen, piece, neck, curves, ends, {
      ...names,
      corner: 0,
      allowance: 'funnelAllowance',
    })
    cutCollar(piece, ends)
    piece.grain({ x: 12, y: -height * 0.2 }, { x: 12, y: -height * 0.8 })
    sewLayers(pen, piece, turned)
    closeBehind(pen, piece, ends)
    return { piece, edge: 'neck', over: 0 }
  },
}
