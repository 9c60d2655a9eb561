import { FormulaFault } from './bad-formula'
import type { CallNode, FormulaNode, OperationNode, Values } from './formula'

type Run = (values: Values) => number

function finite(value: number, node: FormulaNode, text: string): number {
  if (Number.isFinite(value)) return value
  throw new FormulaFault(`"${text.slice(node.at, node.end)}" is too large to work out.`, node.at)
}

function operation(node: OperationNode, text: string): Run {
  const left = compile(node.left, text)
  const right = compile(node.right, text)
  switch (node.operator) {
    case '+':
      return (values) => left(values) + right(values)
    case '−':
      return (values) => left(values) - right(values)
    case '×':
      return (values) => finite(left(values) * right(values), node, text)
    case '÷':
      return (values) => {
        const divisor = right(values)
        if (divisor === 0)
          throw new FormulaFault(
            `"${text.slice(node.right.at, node.right.end)}" is zero here, and nothing can be divided by zero.`,
            node.operatorAt,
          )
        return finite(left(values) / divisor, node, text)
      }
  }
}

function call(node: CallNode, text: string): Run {
  const operands = node.operands.map((operand) => compile(operand, text))
  const first = operands[0] ?? (() => 0)
  if (node.name === 'sqrt')
    return (values) => {
      const square = first(values)
      if (square < 0)
        throw new FormulaFault(
          `"${text.slice(node.at, node.end)}" asks for the square root of a number below zero.`,
          node.at,
        )
      return Math.sqrt(square)
    }
  const choose = node.name === 'min' ? Math.min : Math.max
  return (values) => {
    let chosen = first(values)
    for (let i = 1; i < operands.length; i += 1) chosen = choose(chosen, operands[i]?.(values) ?? chosen)
    return chosen
  }
}

function name(wanted: string, at: number): Run {
  return (values) => {
    // Inherited members are functions or objects, never numbers, so this admits own values only.
    const value: unknown = values[wanted]
    if (typeof value !== 'number') throw new FormulaFault(`There is no value for "${wanted}".`, at)
    if (!Number.isFinite(value))
      throw new FormulaFault(`The value of "${wanted}" is not a finite number.`, at)
    return value
  }
}

/**
 * Turns a formula's tree into one function made of small closures: no generated code, and no work but the arithmetic.
 * @throws FormulaFault (when run) at a division by zero, a root of a negative, a missing value, an overflow
 */
export function compile(node: FormulaNode, text: string): Run {
  switch (node.kind) {
    case 'number': {
      const { value } = node
      return () => value
    }
    case 'pi':
      return () => Math.PI
    case 'name':
      return name(node.name, node.at)
    case 'negation': {
      const operand = compile(node.operand, text)
      return (values) => -operand(values)
    }
    case 'operation':
      return operation(node, text)
    case 'call':
      return call(node, text)
  }
}
