/**
 * What a mark depends on, as one bit a name: measurements, style values, rules and found values. Sets of names are joined
 * for every mark of every redraw, so they are kept as bits and turned into words only when a step is written out.
 */
export type Mask = bigint

export const nothing: Mask = 0n

/** The names of one garment, each with its bit. */
export class NameTable {
  private readonly bits = new Map<string, Mask>()
  private readonly names: string[] = []
  private readonly spelled = new Map<Mask, readonly string[]>()

  /** The bit of a name, given on first asking. */
  bit(name: string): Mask {
    const known = this.bits.get(name)
    if (known !== undefined) return known
    const bit = 1n << BigInt(this.names.length)
    this.bits.set(name, bit)
    this.names.push(name)
    return bit
  }

  /** The names behind a mask, sorted: the order in which they were met depends on what was drafted before. */
  spell(mask: Mask): readonly string[] {
    const known = this.spelled.get(mask)
    if (known) return known
    const found = this.names.filter((_, index) => (mask >> BigInt(index)) & 1n).sort()
    if (this.spelled.size > 4000) this.spelled.clear()
    this.spelled.set(mask, found)
    return found
  }
}
