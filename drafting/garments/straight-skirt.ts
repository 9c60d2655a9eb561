import { skirtGarment } from '../parts/skirts/garment'
import { straight } from '../parts/skirts/straight'

/** The straight skirt worn by itself. */
export const straightSkirt = skirtGarment('straight-skirt', straight)
