import { gathered } from '../parts/skirts/gathered'
import { skirtGarment } from '../parts/skirts/garment'

/** The gathered skirt worn by itself. */
export const gatheredSkirt = skirtGarment('gathered-skirt', gathered)
