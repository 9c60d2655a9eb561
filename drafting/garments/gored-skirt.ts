import { gored } from '../parts/skirts/gored'
import { skirtGarment } from '../parts/skirts/garment'

/** The gored skirt worn by itself. */
export const goredSkirt = skirtGarment('gored-skirt', gored)
