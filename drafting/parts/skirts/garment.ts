import { garment, type Garment } from '../../pen/garment'
import { alone, type Skirt } from './skirt'

/** A skirt as a garment of its own. */
export function skirtGarment(id: string, { draw, ...skirt }: Skirt): Garment {
  return garment({
    ...skirt,
    id,
    draft(pen) {
      draw(pen, alone(pen))
    },
  })
}
