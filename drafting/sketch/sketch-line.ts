import type { Path } from '../contract'

/** A closed outline that hides what lies behind it, or a line on it. */
export interface SketchLine {
  readonly kind: 'shape' | 'inner'
  readonly path: Path
}
