import type { Problem } from '../contract'
import { DraftingError } from '../drafting-error'
import { formulaProblem } from './bad-formula'
import type { Formula, FormulaNode } from './formula'

export type Formulas = Readonly<Record<string, Formula>>

/** Position of the first use of a name in a formula. */
function positionOf(name: string, node: FormulaNode): number | undefined {
  switch (node.kind) {
    case 'name':
      return node.name === name ? node.at : undefined
    case 'negation':
      return positionOf(name, node.operand)
    case 'operation':
      return positionOf(name, node.left) ?? positionOf(name, node.right)
    case 'call':
      return node.operands.map((operand) => positionOf(name, operand)).find((at) => at !== undefined)
    default:
      return undefined
  }
}

function cycleProblem(formulas: Formulas, cycle: readonly string[]): Problem {
  const [first = '', second = first] = cycle
  const path = [...cycle, first].join(' → ')
  const message =
    cycle.length === 1
      ? `"${first}" is worked out from itself.`
      : `These rules are worked out from each other in a circle: ${path}.`
  const root = formulas[first]?.root
  return formulaProblem(first, message, root ? (positionOf(second, root) ?? 0) : 0)
}

interface Ordering {
  readonly order: readonly string[]
  readonly cycles: readonly (readonly string[])[]
}

function walk(formulas: Formulas): Ordering {
  const order: string[] = []
  const cycles: string[][] = []
  const state = new Map<string, 'open' | 'done'>()
  const open: string[] = []
  const visit = (id: string): void => {
    if (state.get(id) === 'done' || !Object.hasOwn(formulas, id)) return
    if (state.get(id) === 'open') {
      cycles.push(open.slice(open.indexOf(id)))
      return
    }
    state.set(id, 'open')
    open.push(id)
    for (const name of formulas[id]?.names ?? []) visit(name)
    open.pop()
    state.set(id, 'done')
    order.push(id)
  }
  for (const id of Object.keys(formulas)) visit(id)
  return { order, cycles }
}

/** Circles among rules, as problems of the rule that each circle is met at first; empty when there are none. */
export function ruleCycles(formulas: Formulas): readonly Problem[] {
  return walk(formulas).cycles.map((cycle) => cycleProblem(formulas, cycle))
}

/**
 * Rules in an order in which each comes after those it is worked out from; otherwise as given.
 * @param formulas by rule id; names that are no rule (measurements, design values) are passed over
 * @throws DraftingError 'bad-formula' naming every circle: 'armholeDepth → underarm → armholeDepth'
 */
export function orderRules(formulas: Formulas): readonly string[] {
  const { order, cycles } = walk(formulas)
  if (cycles.length > 0) throw new DraftingError(cycles.map((cycle) => cycleProblem(formulas, cycle)))
  return order
}
