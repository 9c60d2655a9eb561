import type { DesignChoice } from '../contract'
import { evaluateFormula } from '../rules'
import type { CompiledRules } from './compile'
import { nothing, type Mask } from './masks'

/** All numbers of one draft by name: measurements, style values, found values, and rules worked out when first asked for. */
export class Values {
  /** mm, degrees or bare numbers; what formulas see. */
  readonly numbers: Record<string, number>
  private readonly extra = new Map<string, Mask>()
  private readonly masks = new Map<string, Mask>()

  constructor(
    readonly rules: CompiledRules,
    measurements: Readonly<Record<string, number>>,
    private readonly design: Readonly<Record<string, DesignChoice>>,
    /** Measurement → what its estimate was made from. */
    private readonly estimatedFrom: Readonly<Record<string, readonly string[]>>,
  ) {
    this.numbers = Object.create(null) as Record<string, number>
    for (const id in measurements) this.numbers[id] = measurements[id] as number
    for (const id in design) {
      const value = design[id]
      if (typeof value === 'number') this.numbers[id] = value
    }
  }

  /** The number behind a name. A rule is worked out with everything it names. */
  number(name: string): number {
    const known = this.numbers[name]
    if (known !== undefined) return known
    const formula = this.rules.formulas.get(name)
    if (!formula) throw new Error(`The garment uses “${name}” without stating it.`)
    for (const inner of formula.names) if (this.numbers[inner] === undefined) this.number(inner)
    return (this.numbers[name] = evaluateFormula(formula, this.numbers))
  }

  /** A choice of the style. */
  chosen(id: string): DesignChoice {
    const value = this.design[id]
    if (value === undefined) throw new Error(`The garment asks for “${id}” without stating it.`)
    return value
  }

  /** A choice of the style, undefined where the garment does not offer it. */
  offered(id: string): DesignChoice | undefined {
    return this.design[id]
  }

  /** States a value that the draft found, and what it follows from. */
  find(name: string, value: number, uses: Mask): void {
    this.numbers[name] = value
    this.extra.set(name, uses)
    this.masks.clear()
  }

  /** Forgets every rule that was worked out. */
  forget(): void {
    for (const id of this.rules.formulas.keys()) delete this.numbers[id]
  }

  /** Everything that a name follows from, itself included. */
  mask(name: string): Mask {
    const known = this.masks.get(name)
    if (known !== undefined) return known
    const formula = this.rules.formulas.get(name)
    let mask = this.rules.masks.get(name) ?? this.rules.names.bit(name)
    for (const from of this.estimatedFrom[name] ?? []) mask |= this.rules.names.bit(from)
    mask |= this.extra.get(name) ?? nothing
    if (formula) for (const inner of formula.names) mask |= this.mask(inner)
    this.masks.set(name, mask)
    return mask
  }
}
