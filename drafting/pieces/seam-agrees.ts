import type { SeamCheck } from '../contract'

/** More than this apart, mm, two edges do not sew together. Common practice, no published source. */
const tolerance = 0.5

/**
 * Whether the two sides of a seam come out as they are meant to.
 * @param least mm; what is drawn on a tape comes out to half a mark of it
 */
export function seamAgrees({ difference }: Pick<SeamCheck, 'difference'>, least = 0): boolean {
  return Math.abs(difference) <= Math.max(tolerance, least)
}
