import type { DraftOrder, GarmentDefinition } from '@/drafting/contract'

/*
 * Formulas worked out by a second reader, which knows nothing of the engine's. mm, degrees, bare numbers.
 */

const unitSizes: Readonly<Record<string, number>> = { in: 25.4, cm: 10, mm: 1, '°': 1 }
const token = /\s*(\d+\/\d+(?= ?(?:in|cm|mm)\b)|\d+(?:\.\d+)?(?: \d+\/\d+)?|[A-Za-z_]\w*|°|[-−+*×/÷(),])/y

function tokens(text: string): string[] {
  const found: string[] = []
  token.lastIndex = 0
  while (token.lastIndex < text.trimEnd().length) {
    const match = token.exec(text)
    if (!match) throw new Error(`Cannot read the formula “${text}”.`)
    found.push(match[1] as string)
  }
  return found
}

/** Works out a formula. @param value the number behind a name */
export function workOut(text: string, value: (name: string) => number): number {
  const list = tokens(text)
  let next = 0
  const take = (): string => list[next++] as string
  const sum = (): number => {
    let total = product()
    while (list[next] && '+-−'.includes(list[next] as string))
      total += take() === '+' ? product() : -product()
    return total
  }
  const product = (): number => {
    let total = factor()
    while (list[next] && '*×/÷'.includes(list[next] as string)) {
      total = '*×'.includes(take()) ? total * factor() : total / factor()
    }
    return total
  }
  const factor = (): number => {
    const read = take()
    if (read === '-' || read === '−') return -factor()
    if (read === '(') {
      const inner = sum()
      take()
      return inner
    }
    if (/^\d/.test(read)) {
      const number = read.split(' ').reduce((all, part) => {
        const [over = '0', under = '1'] = part.split('/')
        return all + Number(over) / Number(under)
      }, 0)
      const unit = unitSizes[list[next] ?? '']
      if (unit === undefined) return number
      next += 1
      return number * unit
    }
    if (read === 'pi') return Math.PI
    if (read === 'min' || read === 'max' || read === 'sqrt') {
      take()
      const operands = [sum()]
      while (take() === ',') operands.push(sum())
      return read === 'sqrt' ? Math.sqrt(operands[0] as number) : Math[read](...operands)
    }
    return value(read)
  }
  return sum()
}

/** Names that a formula mentions. */
export function namesIn(text: string): string[] {
  return tokens(text).filter(
    (word) => /^[A-Za-z_]/.test(word) && !['in', 'cm', 'mm', 'pi', 'min', 'max', 'sqrt'].includes(word),
  )
}

/** The garment of an order, its rules as the order's drafting method has them. */
export function garmentOf(order: DraftOrder, garments: readonly GarmentDefinition[]): GarmentDefinition {
  const found = garments.find((one) => one.id === order.garment)
  if (!found) throw new Error(`No garment “${order.garment}”.`)
  const changed = order.method?.rules
  if (!changed) return found
  const rules = found.rules.map((rule) => ({ ...rule, ...changed.find(({ id }) => id === rule.id) }))
  return { ...found, rules }
}

/** A style value as ordered, or its default. */
export function styleOf(
  order: DraftOrder,
  garment: GarmentDefinition,
  id: string,
): number | string | boolean {
  const given = order.design?.[id]
  if (given !== undefined) return given
  const value = garment.design.find((one) => one.id === id)
  if (!value) throw new Error(`The garment has no style value “${id}”.`)
  return value.default
}

/** The shape of the neck, for garments that have one to choose. */
export function neckShape(order: DraftOrder, garment: GarmentDefinition): unknown {
  return garment.design.some((value) => value.id === 'neckShape')
    ? styleOf(order, garment, 'neckShape')
    : undefined
}

/** Whether a style value is offered with the others as they stand. */
export function offers(order: DraftOrder, garment: GarmentDefinition, id: string): boolean {
  const { when } = garment.design.find((one) => one.id === id) ?? {}
  return !when || (when.is.includes(styleOf(order, garment, when.id)) && offers(order, garment, when.id))
}

/**
 * The number behind a measurement, style value or rule, worked out from the order alone.
 * @param used measurements as the draft states them, for those that were estimated
 * @returns undefined for what only the drawing can tell, and for rules that follow from it
 */
export function numberOf(
  name: string,
  order: DraftOrder,
  garment: GarmentDefinition,
  used: Readonly<Record<string, { readonly mm: number }>>,
): number | undefined {
  const unknown = new Error('Only the drawing tells.')
  const look = (id: string): number => {
    const rule = garment.rules.find((one) => one.id === id)
    if (rule) return workOut(order.rules?.[id] ?? rule.formula, look)
    if (garment.design.some((one) => one.id === id)) {
      const value = styleOf(order, garment, id)
      if (typeof value === 'number') return value
      throw unknown
    }
    const measured = order.measurements[id] ?? used[id]?.mm
    if (measured === undefined) throw unknown
    return measured
  }
  try {
    return look(name)
  } catch (error) {
    if (error === unknown) return undefined
    throw error
  }
}
