import type { Correction, Point, Problem } from '../contract'

interface SeamCorrection {
  readonly id: string
  readonly level: number
  readonly by: number
  readonly note?: string
}

/**
 * The corrections of an order, given out to the pen as each mark is placed and each seam closed. What nobody asked for by the
 * end of the draft does not exist in this garment and is refused.
 */
export class Corrections {
  private readonly taken = new Set<string>()

  constructor(private readonly all: readonly Correction[]) {}

  /** How a mark is to be moved. A shared mark listens to a correction of the same mark in a sewn neighbour. */
  forMark(
    piece: string,
    mark: string,
    shared: boolean,
  ): { readonly id: string; readonly by: Point; readonly note?: string } | undefined {
    if (this.all.length === 0) return undefined
    let by: Point | undefined
    let note: string | undefined
    let id = ''
    for (const correction of this.all) {
      if (!('mark' in correction.on) || correction.on.mark !== mark) continue
      if (correction.on.piece !== piece && !shared) continue
      this.taken.add(correction.id)
      if (correction.off || typeof correction.by === 'number') continue
      by = by ? { x: by.x + correction.by.x, y: by.y + correction.by.y } : correction.by
      note ??= correction.note
      id ||= correction.id
    }
    return by && { id, by, ...(note ? { note } : {}) }
  }

  /** What a seam is taken in by, lowest level last. */
  forSeam(seam: string): readonly SeamCorrection[] {
    const found: SeamCorrection[] = []
    for (const { id, on, by, off, note } of this.all) {
      if (!('seam' in on) || on.seam !== seam) continue
      this.taken.add(id)
      if (off || typeof by !== 'number') continue
      found.push({ id, level: on.level, by, ...(note ? { note } : {}) })
    }
    return found.sort((a, b) => a.level - b.level)
  }

  /** Ids of the corrections that are switched on. */
  get active(): readonly string[] {
    return this.all.filter((one) => !one.off).map((one) => one.id)
  }

  /** Corrections of marks and seams that this draft does not have. */
  unknown(): readonly Problem[] {
    return this.all
      .filter((correction) => !correction.off && !this.taken.has(correction.id))
      .map((correction) => ({
        field: `corrections.${correction.id}`,
        code: 'unknown-field',
        message:
          'mark' in correction.on
            ? `There is no point “${correction.on.mark}” on the ${correction.on.piece} to correct. Choose a point of this draft.`
            : `There is no seam “${correction.on.seam}” to take in. Choose a seam of this draft.`,
      }))
  }
}
