import type { SeamCheck } from '../contract'

/** More than this apart, mm, two edges do not sew together. Common practice, no published source. */
const tolerance = 0.5

/** Whether the two sides of a seam come out as they are meant to. */
export function seamAgrees({ difference }: Pick<SeamCheck, 'difference'>): boolean {
  return Math.abs(difference) <= tolerance
}
