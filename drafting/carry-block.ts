import type { Correction, DraftOrder, RemedyUse } from './contract'
import { checkFormula } from './check-formula'
import { draftGarment } from './draft-garment'
import { DraftingError } from './drafting-error'
import { findGarment, garments } from './garments'
import { remedies } from './remedy-moves'

/** An order that starts from a block, and in words what came along and what could not. */
export interface Carried {
  readonly order: DraftOrder
  readonly carried: readonly string[]
  readonly left: readonly string[]
}

const nameOf = (garment: string): string =>
  garments.find(({ id }) => id === garment)?.name.toLowerCase() ?? garment

/** What is said of a correction: its note, else the point or the seam. */
function said({ note, on }: Correction): string {
  if (note) return note
  return 'mark' in on ? `the point ${on.mark} on the ${on.piece}` : `the ${on.seam} seam taken in`
}

/**
 * Starts a draft from a client's block: its remedies, changed rules and corrections come along where the garment has the same
 * rules, marks and seams. From a bodice to a skirt, or back, only remedies do: they are about the body. What the new order says
 * itself stands.
 *
 * @param order of the new draft.
 * @param block the order of the corrected base draft.
 * @throws DraftingError 'unknown-garment'
 */
export function carryBlock(order: DraftOrder, block: DraftOrder): Carried {
  const carried: string[] = []
  const left: string[] = []
  // Both may have a point or a rule of one name at other places: a skirt's waist is no bodice's.
  if (fromShoulder(order) !== fromShoulder(block))
    return { order: carryRemedies(order, block, carried, left), carried, left: [] }
  const rules = carryRules(order, block, carried, left)
  const withRules = { ...order, ...(Object.keys(rules).length > 0 ? { rules } : {}) }
  const withRemedies = carryRemedies(withRules, block, carried, left)
  return { order: carryCorrections(withRemedies, block, carried, left), carried, left }
}

/** Whether a garment hangs from the shoulders or from the waist. */
function fromShoulder({ garment }: DraftOrder): boolean {
  return findGarment({ garment }).definition.needs.includes('bust')
}

function carryRules(order: DraftOrder, block: DraftOrder, carried: string[], left: string[]) {
  const { rules } = findGarment(order).definition
  const kept: Record<string, string> = { ...order.rules }
  for (const [id, formula] of Object.entries(block.rules ?? {})) {
    if (Object.hasOwn(kept, id)) continue
    const rule = rules.find((one) => one.id === id)
    const good = rule && checkFormula(order.garment, id, formula, { ...order, rules: kept }).length === 0
    if (good) kept[id] = formula
    const name = (rule ?? findGarment(block).definition.rules.find((one) => one.id === id))?.name ?? id
    ;(good ? carried : left).push(`${name}: ${formula}`)
  }
  return kept
}

function carryRemedies(order: DraftOrder, block: DraftOrder, carried: string[], left: string[]): DraftOrder {
  const kept: RemedyUse[] = [...(order.remedies ?? [])]
  for (const use of (block.remedies ?? []).filter(({ off }) => !off)) {
    if (kept.some(({ id }) => id === use.id)) continue
    const remedy = remedies.find(({ id }) => id === use.id)
    const name = remedy?.name ?? use.id
    const next = { ...order, remedies: [...kept, use] }
    if (remedy?.garments.includes(order.garment) && drafts(next, `remedies.${use.id}`)) {
      kept.push(use)
      carried.push(name)
    } else left.push(`${name}: not for the ${nameOf(order.garment)}`)
  }
  return kept.length > 0 ? { ...order, remedies: kept } : order
}

function carryCorrections(
  order: DraftOrder,
  block: DraftOrder,
  carried: string[],
  left: string[],
): DraftOrder {
  const kept: Correction[] = [...(order.corrections ?? [])]
  for (const correction of (block.corrections ?? []).filter(({ off }) => !off)) {
    // Two blocks may have numbered their corrections alike.
    const id = kept.some((one) => one.id === correction.id)
      ? `${block.garment}.${correction.id}`.slice(0, 60)
      : correction.id
    const own = { ...correction, id, note: `${said(correction)}, from the block` }
    const next = { ...order, corrections: [...kept, own] }
    if (drafts(next, `corrections.${id}`)) {
      kept.push(own)
      carried.push(said(correction))
    } else left.push(`${said(correction)}: not on the ${nameOf(order.garment)}`)
  }
  return kept.length > 0 ? { ...order, corrections: kept } : order
}

/** Whether an order finds nothing wrong with one of its fields. What else is wrong with it is for its own draft to say. */
function drafts(order: DraftOrder, field: string): boolean {
  try {
    draftGarment({ ...order, explain: false })
    return true
  } catch (error) {
    if (error instanceof DraftingError) return !error.fields.includes(field) && knowsMarks(error)
    throw error
  }
}

/** A draft that stopped for another reason never came to its marks: nothing can be said of a correction then. */
function knowsMarks(error: DraftingError): boolean {
  return error.problems.every(({ field }) => field.startsWith('corrections.'))
}
