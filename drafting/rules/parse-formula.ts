import { DraftingError } from '../drafting-error'
import { readUnit } from '../lengths'
import { FormulaFault, formulaProblem } from './bad-formula'
import { compile } from './compile'
import type { CallNode, Formula, FormulaNode, FunctionName } from './formula'
import { tokenAt, type Token } from './tokens'

/*
 * The grammar, in full:
 *
 *   formula  = sum
 *   sum      = product { ( "+" | "−" ) product }
 *   product  = factor { ( "×" | "÷" ) factor }
 *   factor   = "−" factor | "+" factor | number [ unit ] | "pi" | name | call | "(" sum ")"
 *   call     = ( "min" | "max" ) "(" sum { "," sum } ")" | "sqrt" "(" sum ")"
 *   number   = whole | decimal with a point | whole fraction (1 1/2, 1½) | fraction with a unit (1/2 in)
 *   unit     = in, cm, mm, m, ft in words or signs | deg | °
 *   name     = a letter or underscore, then letters, digits, underscores
 *
 * "*" and "-" and "/" are other spellings of × − ÷. A fraction written out without a whole number or unit is a division.
 * Length and depth are bounded, so reading takes bounded time whatever is typed.
 */
const longestText = 500
const deepest = 40

const arities: ReadonlyMap<string, { readonly name: FunctionName; readonly most: number }> = new Map([
  ['min', { name: 'min', most: 20 }],
  ['max', { name: 'max', most: 20 }],
  ['sqrt', { name: 'sqrt', most: 1 }],
])

class Reader {
  private token: Token
  private depth = 0
  readonly names = new Set<string>()

  constructor(private readonly text: string) {
    this.token = tokenAt(text, 0)
  }

  formula(): FormulaNode {
    if (this.at('end'))
      throw new FormulaFault('The formula is empty: write one such as bust / 6 + 1.5 in.', 0)
    const root = this.sum()
    if (!this.at('end')) throw this.missingOperator()
    return root
  }

  private at(kind: Token['kind']): boolean {
    return this.token.kind === kind
  }

  private next(): Token {
    const read = this.token
    this.token = tokenAt(this.text, read.end)
    return read
  }

  private written(token: Token): string {
    return token.kind === 'end' ? 'the end' : `"${this.text.slice(token.at, token.end)}"`
  }

  private missingOperator(): FormulaFault {
    const { kind, at } = this.token
    if (kind === ')') return new FormulaFault('This bracket closes nothing.', at)
    if (kind === ',')
      return new FormulaFault(
        'A comma only parts the values of min and max; decimals take a point, such as 1.5.',
        at,
      )
    return new FormulaFault(`Before ${this.written(this.token)} one of + − × ÷ is missing.`, at)
  }

  private sum(): FormulaNode {
    let left = this.product()
    while (this.token.kind === 'operator' && (this.token.operator === '+' || this.token.operator === '−'))
      left = this.operation(left, () => this.product())
    return left
  }

  private product(): FormulaNode {
    let left = this.factor()
    while (this.token.kind === 'operator' && (this.token.operator === '×' || this.token.operator === '÷'))
      left = this.operation(left, () => this.factor())
    return left
  }

  private operation(left: FormulaNode, readRight: () => FormulaNode): FormulaNode {
    const token = this.next()
    const operator = token.kind === 'operator' ? token.operator : '+'
    const right = readRight()
    return { kind: 'operation', operator, operatorAt: token.at, left, right, at: left.at, end: right.end }
  }

  private factor(): FormulaNode {
    this.depth += 1
    if (this.depth > deepest)
      throw new FormulaFault(
        `Brackets go more than ${deepest} deep here: split the rule in two.`,
        this.token.at,
      )
    const node = this.bareFactor()
    this.depth -= 1
    return node
  }

  private bareFactor(): FormulaNode {
    const token = this.next()
    if (token.kind === 'number') return token
    if (token.kind === 'word') return this.word(token.text, token.at, token.end)
    if (token.kind === 'operator' && token.operator === '+') return this.factor()
    if (token.kind === 'operator' && token.operator === '−') {
      const operand = this.factor()
      return { kind: 'negation', operand, at: token.at, end: operand.end }
    }
    if (token.kind === '(') return this.brackets(token.at)
    throw new FormulaFault(`A number, a name or a bracket is due before ${this.written(token)}.`, token.at)
  }

  private brackets(at: number): FormulaNode {
    const inner = this.sum()
    return { ...inner, at, end: this.closing(at) }
  }

  private closing(openedAt: number): number {
    if (this.token.kind === 'end') throw new FormulaFault('This bracket is never closed.', openedAt)
    if (this.token.kind !== ')') throw this.missingOperator()
    return this.next().end
  }

  private word(text: string, at: number, end: number): FormulaNode {
    if (text === 'pi' || text === 'π') return { kind: 'pi', at, end }
    if (arities.has(text)) return this.call(text, at)
    if (text === 'deg' || (readUnit(text, 0)?.end ?? 0) === text.length)
      throw new FormulaFault(`"${text}" is a unit: it stands behind a number, such as 1.5 ${text}.`, at)
    if (this.token.kind === '(')
      throw new FormulaFault(`There is no function "${text}": min, max and sqrt are known.`, at)
    this.names.add(text)
    return { kind: 'name', name: text, at, end }
  }

  private call(text: string, at: number): CallNode {
    const { name, most } = arities.get(text) ?? { name: 'min' as const, most: 0 }
    const opening = this.next()
    if (opening.kind !== '(')
      throw new FormulaFault(`"${text}" takes its values in brackets: ${text}(…).`, at)
    const operands = [this.sum()]
    while (this.token.kind === ',') {
      const comma = this.next()
      if (operands.length === most) throw new FormulaFault(`"${text}" takes at most ${most}.`, comma.at)
      operands.push(this.sum())
    }
    return { kind: 'call', name, operands, at, end: this.closing(opening.at) }
  }
}

const kept = new Map<string, Formula>()
const mostKept = 1_000

function read(text: string): Formula {
  const reader = new Reader(text)
  const root = reader.formula()
  return { text, root, names: [...reader.names], run: compile(root, text) }
}

/**
 * Reads a formula such as `bust / 6 + 1.5in`. The last thousand texts are remembered.
 * @param text at most 500 characters
 * @param field named in the error, usually the rule's id
 * @throws DraftingError 'bad-formula' with what is wrong and its position in the text
 */
export function parseFormula(text: string, field = 'formula'): Formula {
  const known = kept.get(text)
  if (known) return known
  try {
    if (typeof text !== 'string') throw new FormulaFault('A formula is a text, such as bust / 6 + 1.5 in.', 0)
    if (text.length > longestText)
      throw new FormulaFault(`A formula has at most ${longestText} characters.`, longestText)
    const formula = read(text)
    if (kept.size >= mostKept) kept.delete(kept.keys().next().value ?? '')
    kept.set(text, formula)
    return formula
  } catch (error) {
    if (error instanceof FormulaFault)
      throw new DraftingError([formulaProblem(field, error.message, error.position)])
    throw error
  }
}
