import { aLine } from '../parts/skirts/a-line'
import { skirtGarment } from '../parts/skirts/garment'

/** The A-line skirt worn by itself. */
export const aLineSkirt = skirtGarment('a-line-skirt', aLine)
