import type { DraftingMethod } from '../contract'

/** The rules as every garment states them: common practice of the trade, each with its source beside it. */
export const freehand: DraftingMethod = {
  id: 'freehand',
  name: 'Freehand',
  description:
    'The working rules of dressmakers who chalk straight on the cloth: few measurements, the neck from the neck, the armhole from the bust. Most of them nobody has published.',
  garments: {},
}
