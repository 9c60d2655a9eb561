import type { DesignValue, GarmentDefinition, RuleDefinition } from '../contract'
import type { Pen } from './pen'

/** A garment as it is written down: what it needs, what may be chosen, its rules, and how it is drawn. */
export interface Garment {
  readonly definition: GarmentDefinition
  /** Values that the draft itself finds so that something fits; formulas may name them. */
  readonly found: Readonly<Record<string, 'length' | 'angle' | 'number'>>
  /** Draws the garment. Throws DraftingError where the shape is impossible. */
  readonly draft: (pen: Pen) => void
}

/** Where a rule comes from when nobody has published it. */
export const commonPractice = 'common practice, no published source'
export const geometry = 'geometry'

/** A rule for a length. */
export function lengthRule(
  id: string,
  name: string,
  formula: string,
  source = commonPractice,
): RuleDefinition {
  return { id, name, kind: 'length', formula, source }
}

/** A rule for an angle, degrees. */
export function angleRule(
  id: string,
  name: string,
  formula: string,
  source = commonPractice,
): RuleDefinition {
  return { id, name, kind: 'angle', formula, source }
}

/** States a garment. `parts` bring their own style values and rules. */
export function garment(spec: {
  readonly id: string
  readonly name: string
  readonly needs: readonly string[]
  readonly estimates: readonly string[]
  readonly design: readonly DesignValue[]
  readonly rules: readonly RuleDefinition[]
  readonly found?: Garment['found']
  readonly draft: (pen: Pen) => void
}): Garment {
  const { draft, found = {}, ...definition } = spec
  return { definition, found, draft }
}
