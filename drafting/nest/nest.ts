import type { Draft, DraftOrder, Nest, NestFit, NestSize, Problem } from '../contract'
import { draftGarment } from '../draft-garment'
import { DraftingError } from '../drafting-error'
import { isNumber, isRecord } from '../pen/plain-data'
import { alignPieces } from './align-pieces'

/** More lines than these nobody can tell apart. */
const most = 12

export interface NestOptions {
  /**
   * The mark at which the sizes of each piece lie on each other, by piece. A single name holds for every piece that has such a
   * mark. Any other piece lies at its first mark.
   */
  readonly alignAt?: string | Readonly<Record<string, string>>
}

/**
 * A garment in a range of sizes at once.
 *
 * @param order garment, style, rules; its measurements are those of each size in turn.
 * @param sizes 2 to 12, each with all measurements that the garment cannot do without, mm.
 * @throws DraftingError naming each size that cannot be drafted, and why: fields are 'sizes.<id>.<field>'
 */
export function nest(order: DraftOrder, sizes: readonly NestSize[], options: NestOptions = {}): Nest {
  const problems = checkSizes(sizes)
  if (problems.length > 0) throw new DraftingError(problems)
  const drafts = sizes.map((size) => draftSize(order, size, problems))
  if (problems.length > 0) throw new DraftingError(problems)
  const drafted = drafts.flatMap((draft, index) => {
    const { id, name } = sizes[index] as NestSize
    return draft ? [{ id, name, style: `size-${index + 1}`, draft }] : []
  })
  const pieces = alignPieces(drafted, options.alignAt, problems)
  if (problems.length > 0) throw new DraftingError(problems)
  return { garment: order.garment, sizes: drafted, pieces, fits: fitsBySize(drafted) }
}

function checkSizes(sizes: unknown): Problem[] {
  const wrong = (field: string, message: string): Problem => ({ field, code: 'out-of-range', message })
  if (!Array.isArray(sizes) || sizes.length < 2 || sizes.length > most)
    return [wrong('sizes', `A nest holds 2 to ${most} sizes.`)]
  return sizes.flatMap((size: unknown, index) => {
    const good = isRecord(size) && typeof size.id === 'string' && typeof size.name === 'string'
    if (!good || !isRecord(size.card))
      return [wrong(`sizes.${index}`, 'A size has an id, a name and its measurements in millimetres.')]
    const twice = sizes.findIndex((other: unknown) => isRecord(other) && other.id === size.id) !== index
    return twice ? [wrong(`sizes.${index}`, `The size ${String(size.name)} is there twice.`)] : []
  })
}

function draftSize(order: DraftOrder, { id, name, card }: NestSize, problems: Problem[]): Draft | undefined {
  try {
    return draftGarment({ ...order, measurements: card, explain: false })
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error
    problems.push(
      ...error.problems.map((problem) => ({
        ...problem,
        field: `sizes.${id}.${problem.field}`,
        message: `Size ${name}: ${problem.message}`,
      })),
    )
    return undefined
  }
}

function fitsBySize(sizes: Nest['sizes']): NestFit[] {
  const ids = [...new Set(sizes.flatMap(({ draft }) => draft.fits.map((fit) => fit.id)))]
  return ids.map((id) => ({
    id,
    sizes: Object.fromEntries(
      sizes.flatMap((size) => {
        const fit = size.draft.fits.find((one) => one.id === id)
        if (!fit) return []
        const { body, ease, length } = fit
        return [[size.id, { ...(isNumber(body) ? { body } : {}), ease, length }] as const]
      }),
    ),
  }))
}
