import { circle } from '../parts/skirts/circle'
import { skirtGarment } from '../parts/skirts/garment'

/** The circle skirt worn by itself. */
export const circleSkirt = skirtGarment('circle-skirt', circle)
