import { garments } from '@/drafting'

/** Ids of all measurements that some garment needs, or can estimate when nobody took them. */
export function usualMeasurements(): readonly string[] {
  return [...new Set(garments.flatMap((garment) => [...garment.needs, ...garment.estimates]))]
}
