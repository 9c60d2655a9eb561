import type { DraftOrder, OwnMeasurement, Problem } from '../contract'
import { measurements } from '../body'
import { checkFormulaKinds, orderRules, parseFormula, type Formula } from '../rules'
import { DraftingError } from '../drafting-error'
import type { Garment } from './garment'
import { NameTable, type Mask } from './masks'

export type Kind = 'length' | 'angle' | 'number'

/** A garment's rules made ready: parsed, checked, put in order, with what each depends on. */
export interface CompiledRules {
  readonly formulas: ReadonlyMap<string, Formula>
  readonly kinds: Readonly<Record<string, Kind>>
  readonly names: NameTable
  /** Name → its own bit and the bits of all that it follows from, estimates excepted. */
  readonly masks: ReadonlyMap<string, Mask>
  /** The workroom's own measurements that a formula names. */
  readonly own: readonly OwnMeasurement[]
}

const compiled = new WeakMap<Garment, Map<string, CompiledRules>>()
const nameTables = new WeakMap<Garment, NameTable>()

/** A garment's own table of names. Names that workrooms made up never enter it: it lives as long as the process. */
function namesOf(garment: Garment): NameTable {
  let names = nameTables.get(garment)
  if (!names) nameTables.set(garment, (names = new NameTable()))
  return names
}

/** The kinds of all names that a formula of this garment may use, a workroom's own measurements among them. */
export function kindsOf(
  garment: Garment,
  own: readonly OwnMeasurement[] = [],
): Readonly<Record<string, Kind>> {
  const kinds: Record<string, Kind> = Object.create(null) as Record<string, Kind>
  for (const { id } of own) kinds[id] = 'length'
  for (const measurement of measurements) kinds[measurement.id] = 'length'
  for (const value of garment.definition.design) {
    if (value.kind === 'length' || value.kind === 'angle') kinds[value.id] = value.kind
    else if (value.kind === 'share' || value.kind === 'count') kinds[value.id] = 'number'
  }
  for (const rule of garment.definition.rules) kinds[rule.id] = rule.kind
  for (const [name, kind] of Object.entries(garment.found)) kinds[name] = kind
  return kinds
}

function problemsOf(error: unknown, field: string): readonly Problem[] {
  if (!(error instanceof DraftingError)) throw error
  return error.problems.map((problem) => ({ ...problem, field, code: 'bad-formula' }))
}

/** Reads and checks every formula. Pushes what is wrong into `problems` and then answers undefined. */
export function compileRules(
  garment: Garment,
  replacements: DraftOrder['rules'],
  own: readonly OwnMeasurement[],
  problems: Problem[],
): CompiledRules | undefined {
  const changed = replacements ? JSON.stringify(replacements) : ''
  const key = own.length > 0 ? `${changed} ${JSON.stringify(own)}` : changed
  let byKey = compiled.get(garment)
  if (!byKey) compiled.set(garment, (byKey = new Map()))
  const known = byKey.get(key)
  if (known) return known

  const before = problems.length
  const kinds = kindsOf(garment, own)
  const formulas = new Map<string, Formula>()
  const allowed = new Set([
    ...garment.definition.needs,
    ...garment.definition.estimates,
    ...garment.definition.design.map((value) => value.id),
    ...garment.definition.rules.map((rule) => rule.id),
    ...Object.keys(garment.found),
    ...own.map(({ id }) => id),
  ])
  for (const rule of garment.definition.rules) {
    const text =
      replacements && Object.hasOwn(replacements, rule.id) ? (replacements[rule.id] as string) : rule.formula
    try {
      const formula = parseFormula(text)
      const wrong = checkFormulaKinds(formula, kinds, rule.kind)
      if (wrong.length) problems.push(...wrong.map((problem) => ({ ...problem, field: rule.id })))
      // A measurement that the garment never asks for would be missing on the next card: say so now.
      for (const name of formula.names) {
        if (kinds[name] && !allowed.has(name)) {
          problems.push({
            field: rule.id,
            code: 'bad-formula',
            message: `“${name}” is not taken for this garment. Use one of its own measurements or a plain length.`,
          })
        }
      }
      formulas.set(rule.id, formula)
    } catch (error) {
      problems.push(...problemsOf(error, rule.id))
    }
  }
  if (problems.length > before) return undefined

  let order: readonly string[]
  try {
    order = orderRules(Object.fromEntries(formulas))
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error
    problems.push(...error.problems.map((problem) => ({ ...problem, code: 'bad-formula' })))
    return undefined
  }

  const named = new Set([...formulas.values()].flatMap((formula) => formula.names))
  const used = own.filter(({ id }) => named.has(id))
  const names = used.length > 0 ? new NameTable() : namesOf(garment)
  const masks = new Map<string, Mask>()
  for (const id of order) {
    let mask = names.bit(id)
    for (const name of formulas.get(id)?.names ?? []) mask |= masks.get(name) ?? names.bit(name)
    masks.set(id, mask)
  }
  const result: CompiledRules = { formulas, kinds, names, masks, own: used }
  // A drafter who edits a formula makes many short-lived sets; keep the memory bounded.
  if (byKey.size > 50) byKey.clear()
  byKey.set(key, result)
  return result
}
