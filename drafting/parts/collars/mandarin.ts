import type { DesignValue } from '../../contract'
import { length } from '../../pen/design'
import { closeBehind, cutCollar, sewLayers, standingEnds, type Collar } from './collar'
import { drawStand, standCurves } from './stand'

const stand = { height: 'standHeight', rise: 'standRise' }
const standing = { id: 'collar', is: ['mandarin', 'shirt'] }

export const standDesign: readonly DesignValue[] = [
  length('standHeight', 'Height of the stand', 'collar', { default: 35, min: 20, max: 50 }, standing),
  length('standRise', 'Stand raised in front by', 'collar', { default: 14, min: 0, max: 30 }, standing),
]

/**
 * A stand round the neck, its ends raised so that the top edge is shorter and leans to the neck, meeting with rounded corners
 * where the garment opens. Common practice, from memory: 3.5–4 cm high.
 */
export const mandarin: Collar = {
  stands: () => stand,
  draw(pen, neck) {
    const collar = pen.piece('collar', 'Stand collar')
    const height = pen.length('standHeight')
    const half = neck.long.front + neck.long.back
    const curves = standCurves({ half, over: 0, height, rise: pen.length('standRise') })
    const ends = standingEnds(neck.centres)
    const names = { ...stand, corner: height * 0.4, allowance: 'collarAllowance' }
    const turned = drawStand(pen, collar, neck, curves, ends, names)
    cutCollar(collar, ends)
    collar.grain({ x: 12, y: -height * 0.2 }, { x: 12, y: -height * 0.8 })
    sewLayers(pen, collar, turned)
    closeBehind(pen, collar, ends)
    return { piece: collar, edge: 'neck', over: 0 }
  },
}
