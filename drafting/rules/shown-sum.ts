import type { Unit } from '../contract'
import { fractionText, millimetresPer, nearestFraction } from '../lengths'
import type { Kinds } from './check-formula-kinds'
import type { CallNode, FormulaNode, Kind, OperationNode, Values } from './formula'

/** A part of a sum as it is written, with the value that the writing stands for. */
export interface ShownPart {
  readonly text: string
  readonly value: number
  /** 1 for + and −, 2 for × and ÷, 3 for a leading minus, 4 for what needs no brackets. */
  readonly binds: 1 | 2 | 3 | 4
}

/** A number with at most so many decimals, none when it needs none, and a proper minus sign. */
export function shownNumber(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals)
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text
  return value < 0 && short !== '0' ? `−${short}` : short
}

function bracketed(part: ShownPart): string {
  return `(${part.text})`
}

/** Writes a formula with its values filled in, in one unit and to one number of decimals. */
export class ShownSum {
  constructor(
    private readonly values: Values,
    private readonly kinds: Kinds,
    private readonly unit: Unit,
    private readonly decimals: number,
  ) {}

  write(node: FormulaNode): ShownPart {
    switch (node.kind) {
      case 'number':
        return this.value(node.value, node.measures)
      case 'pi':
        return this.value(Math.PI, 'number')
      case 'name':
        return this.value(this.values[node.name] ?? 0, this.kinds[node.name] ?? 'number')
      case 'negation':
        return this.negation(node.operand)
      case 'operation':
        return this.operation(node)
      case 'call':
        return this.call(node)
    }
  }

  private value(value: number, kind: Kind): ShownPart {
    if (kind === 'length') return this.length(value / millimetresPer[this.unit])
    const text = shownNumber(value, this.decimals + 1)
    const binds = text.startsWith('−') ? 3 : 4
    return {
      text: kind === 'angle' ? `${text}°` : text,
      value: Number(value.toFixed(this.decimals + 1)),
      binds,
    }
  }

  private length(value: number): ShownPart {
    const sixteenths = value * 16
    if (this.unit === 'in' && Math.abs(sixteenths - Math.round(sixteenths)) < 1e-6) {
      const text = fractionText(nearestFraction(value, 16))
      return { text, value: Math.round(sixteenths) / 16, binds: text.startsWith('−') ? 3 : 4 }
    }
    const text = shownNumber(value, this.decimals)
    return { text, value: Number(value.toFixed(this.decimals)), binds: text.startsWith('−') ? 3 : 4 }
  }

  private negation(operand: FormulaNode): ShownPart {
    const inner = this.write(operand)
    return { text: `−${inner.binds < 4 ? bracketed(inner) : inner.text}`, value: -inner.value, binds: 3 }
  }

  private operation({ operator, left, right }: OperationNode): ShownPart {
    const a = this.write(left)
    const b = this.write(right)
    const binds = operator === '+' || operator === '−' ? 1 : 2
    const before = a.binds < binds ? bracketed(a) : a.text
    // Behind ÷ a fraction such as 1/2 would read as two divisions.
    const fraction = operator === '÷' && /^\d+\/\d+$/.test(b.text)
    const same = b.binds === binds && operator !== '+' && operator !== '×'
    const behind = b.binds < binds || b.binds === 3 || same || fraction ? bracketed(b) : b.text
    return { text: `${before} ${operator} ${behind}`, value: this.worked(operator, a.value, b.value), binds }
  }

  private worked(operator: OperationNode['operator'], a: number, b: number): number {
    switch (operator) {
      case '+':
        return a + b
      case '−':
        return a - b
      case '×':
        return a * b
      case '÷':
        return a / b
    }
  }

  private call({ name, operands }: CallNode): ShownPart {
    const parts = operands.map((operand) => this.write(operand))
    const values = parts.map((part) => part.value)
    const value = name === 'sqrt' ? Math.sqrt(values[0] ?? 0) : Math[name](...values)
    return { text: `${name}(${parts.map((part) => part.text).join(', ')})`, value, binds: 4 }
  }
}
