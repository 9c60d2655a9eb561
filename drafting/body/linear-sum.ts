import { valueOn, type Card } from './card'

/** start + Σ times × measurement: enough for every estimate, and readable as a formula. */
export interface LinearSum {
  /** cm. */
  readonly start: number
  readonly times: Readonly<Record<string, number>>
}

/** mm, or undefined when the card lacks one of the measurements. */
export function sumOn(card: Card, { start, times }: LinearSum): number | undefined {
  let total = start * 10
  for (const [id, factor] of Object.entries(times)) {
    const value = valueOn(card, id)
    if (value === undefined) return undefined
    total += factor * value
  }
  return total
}

/** 'bust / 6' reads better than 'bust × 0.1666…'. */
function product(id: string, factor: number): string {
  if (factor === 1) return id
  const divisor = Math.round(1 / factor)
  return divisor > 1 && Math.abs(1 / factor - divisor) < 1e-9 ? `${id} / ${divisor}` : `${id} × ${factor}`
}

/** 'bust × 0.1561 + 22.332 cm': the same sum as a formula that the rules engine reads. */
export function sumAsFormula({ start, times }: LinearSum): string {
  const products = Object.entries(times).map(([id, factor]) => product(id, factor))
  if (products.length === 0) return `${start} cm`
  const sum = products.join(' + ')
  return start === 0 ? sum : `${sum} ${start < 0 ? '−' : '+'} ${Math.abs(start)} cm`
}
