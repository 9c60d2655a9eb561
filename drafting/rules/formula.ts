/** What a name or the result of a formula measures. */
export type Kind = 'length' | 'angle' | 'number'

export type Operator = '+' | '−' | '×' | '÷'
export type FunctionName = 'min' | 'max' | 'sqrt'

/** Where a part of a formula stands in its text: from `at` up to `end`. */
interface Span {
  readonly at: number
  readonly end: number
}

/** A written number: mm when it has a unit of length, degrees with ° or deg, otherwise bare. */
export interface NumberNode extends Span {
  readonly kind: 'number'
  readonly value: number
  readonly measures: Kind
}

export interface NameNode extends Span {
  readonly kind: 'name'
  readonly name: string
}

export interface NegationNode extends Span {
  readonly kind: 'negation'
  readonly operand: FormulaNode
}

export interface OperationNode extends Span {
  readonly kind: 'operation'
  readonly operator: Operator
  /** Position of the operator itself. */
  readonly operatorAt: number
  readonly left: FormulaNode
  readonly right: FormulaNode
}

export interface CallNode extends Span {
  readonly kind: 'call'
  readonly name: FunctionName
  readonly operands: readonly FormulaNode[]
}

/** Half the way round a circle by its radius: `pi` or π. */
export interface PiNode extends Span {
  readonly kind: 'pi'
}

export type FormulaNode = NumberNode | PiNode | NameNode | NegationNode | OperationNode | CallNode

/** Values by name: mm, degrees or bare numbers. */
export type Values = Readonly<Record<string, number>>

export interface Formula {
  readonly text: string
  readonly root: FormulaNode
  /** Every name in it once, in order of appearance. */
  readonly names: readonly string[]
  /** The formula as a function, compiled once. Use `evaluateFormula`, which says what went wrong. */
  readonly run: (values: Values) => number
}
