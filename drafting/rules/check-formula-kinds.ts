import type { Problem } from '../contract'
import { FormulaFault, formulaProblem } from './bad-formula'
import { compile } from './compile'
import {
  describeDimension,
  dimensionOf,
  multiplied,
  rootOf,
  sameDimension,
  type Dimension,
} from './dimensions'
import type { CallNode, Formula, FormulaNode, Kind, NameNode, OperationNode } from './formula'
import { nearestNames } from './nearest-names'

export type Kinds = Readonly<Record<string, Kind>>

const doing = { '+': 'adds', '−': 'takes apart' } as const
const examples: Readonly<Record<Kind, string>> = {
  length: 'such as 4 cm or 1 1/2 in',
  angle: 'such as 22.5°',
  number: '',
}

/** Whether a part without names comes to zero, whatever the measurements are. */
function isAlwaysZero(node: FormulaNode, text: string): boolean {
  try {
    return compile(node, text)({}) === 0
  } catch (error) {
    if (error instanceof FormulaFault) return false
    throw error
  }
}

/** Walks one formula and notes what does not fit. A part that is already at fault is not judged a second time. */
class KindChecker {
  readonly problems: Problem[] = []
  private readonly reported = new Set<string>()

  constructor(
    private readonly text: string,
    private readonly kinds: Kinds,
    private readonly field: string,
  ) {}

  private note(message: string, position: number): undefined {
    this.problems.push(formulaProblem(this.field, message, position))
    return undefined
  }

  private written(node: FormulaNode): string {
    return `"${this.text.slice(node.at, node.end)}"`
  }

  dimension(node: FormulaNode): Dimension | undefined {
    switch (node.kind) {
      case 'number':
        return dimensionOf[node.measures]
      case 'pi':
        return dimensionOf.number
      case 'name':
        return this.name(node)
      case 'negation':
        return this.dimension(node.operand)
      case 'operation':
        return this.operation(node)
      case 'call':
        return this.call(node)
    }
  }

  private name({ name, at }: NameNode): Dimension | undefined {
    if (Object.hasOwn(this.kinds, name)) return dimensionOf[this.kinds[name] ?? 'number']
    if (this.reported.has(name)) return undefined
    this.reported.add(name)
    const near = nearestNames(name, Object.keys(this.kinds))
    const hint = near.length === 0 ? '' : ` Did you mean ${near.join(' or ')}?`
    return this.note(`"${name}" is not known here.${hint}`, at)
  }

  private operation(node: OperationNode): Dimension | undefined {
    const left = this.dimension(node.left)
    const right = this.dimension(node.right)
    if (node.operator === '÷' && isAlwaysZero(node.right, this.text))
      return this.note(
        `${this.written(node.right)} is zero, and nothing can be divided by zero.`,
        node.operatorAt,
      )
    if (!left || !right) return undefined
    if (node.operator === '×') return multiplied(left, right, 1)
    if (node.operator === '÷') return multiplied(left, right, -1)
    if (sameDimension(left, right)) return left
    const pair = `${describeDimension(left)} and ${describeDimension(right)}`
    return this.note(
      `${this.written(node)} ${doing[node.operator]} ${pair}.${this.unitHint(node.left, left, node.right, right)}`,
      node.operatorAt,
    )
  }

  /** A forgotten unit is the usual reason: say where it is missing. */
  private unitHint(a: FormulaNode, ofA: Dimension, b: FormulaNode, ofB: Dimension): string {
    const bare = sameDimension(ofA, dimensionOf.number) ? a : b
    const other = bare === a ? ofB : ofA
    if (!sameDimension(bare === a ? ofA : ofB, dimensionOf.number)) return ''
    const kind = sameDimension(other, dimensionOf.length) ? 'length' : 'angle'
    if (kind === 'angle' && !sameDimension(other, dimensionOf.angle)) return ''
    return bare.kind === 'number' ? ` Give ${this.written(bare)} a unit, ${examples[kind]}.` : ''
  }

  private call(node: CallNode): Dimension | undefined {
    const found = node.operands.map((operand) => this.dimension(operand))
    const first = found[0]
    if (node.name === 'sqrt') return first && rootOf(first)
    if (!first) return undefined
    const odd = found.findIndex((dimension) => dimension !== undefined && !sameDimension(dimension, first))
    const [a, b, ofB] = [node.operands[0], node.operands[odd], found[odd]]
    if (!a || !b || !ofB) return first
    return this.note(
      `${this.written(node)} compares ${describeDimension(first)} and ${describeDimension(ofB)}.${this.unitHint(a, first, b, ofB)}`,
      b.at,
    )
  }

  result(root: FormulaNode, wanted: Kind): void {
    const found = this.dimension(root)
    if (!found || sameDimension(found, dimensionOf[wanted])) return
    const due = describeDimension(dimensionOf[wanted])
    const hint = this.unitHint(root, found, root, dimensionOf[wanted])
    this.note(`The formula gives ${describeDimension(found)}, and ${due} is due.${hint}`, root.at)
  }
}

/**
 * Checks that every name is known and that lengths, angles and bare numbers are only put together where that means something:
 * a length and a bare number cannot be added, and a length times a length is no length.
 * @param kinds what each known name measures; own properties only
 * @param wanted what the result must measure
 * @returns every problem found, with its position; empty when the formula is good
 */
export function checkFormulaKinds(
  formula: Formula,
  kinds: Kinds,
  wanted: Kind,
  field = 'formula',
): readonly Problem[] {
  const checker = new KindChecker(formula.text, kinds, field)
  checker.result(formula.root, wanted)
  return checker.problems
}
