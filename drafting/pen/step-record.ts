import type { Path, Point, Step } from '../contract'
import type { Mask } from './masks'

/** A step as the pen notes it down while drawing; `writeSteps` turns it into words and sums afterwards. */
export interface StepRecord {
  readonly id: string
  readonly piece: string
  readonly kind: Step['kind']
  readonly say: string
  readonly from?: string | undefined
  readonly direction?: Point | undefined
  readonly marks: readonly string[]
  readonly edge?: string
  /** The rule or style value that gives the length. */
  readonly by?: string | undefined
  readonly length?: number | undefined
  readonly sagitta?: number
  readonly uses: Mask
  readonly draws: readonly Path[]
}
