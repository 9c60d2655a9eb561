import { carryBlock } from '@/drafting'
import type { DraftOrder } from '@/drafting/contract'
import { formatLength } from '@/drafting/lengths'
import { measurementById } from '@/drafting/body'

/** A client's block, as far as a new draft needs it. */
export interface StartingBlock {
  readonly garment: string
  readonly cardId: string | null
  readonly order: DraftOrder
}

interface Start {
  readonly order: DraftOrder
  readonly typed: Readonly<Record<string, string>>
}

/** The card that the new draft stands on. */
interface Card {
  readonly id: string
  readonly values: Readonly<Record<string, { readonly mm: number }>>
}

/**
 * Starts a draft from a client's blocks: from that of the same garment, else from every one whose points and rules the garment
 * has. A measurement that was changed in a block comes along when both stand on the same card; a newer card counts for itself.
 *
 * @returns the order, what stood in its fields, and in words what came along and what was left
 */
export function fromBlocks(
  start: Start,
  blocks: readonly StartingBlock[],
  card: Card | undefined,
): Start & { readonly carried: readonly string[]; readonly left: readonly string[] } {
  const same = blocks.filter(({ garment }) => garment === start.order.garment)
  let { order, typed } = start
  const carried: string[] = []
  const left: string[] = []
  for (const block of same.length > 0 ? same : blocks) {
    for (const [id, mm] of card && block.cardId === card.id ? changedIn(block.order, card) : []) {
      order = { ...order, measurements: { ...order.measurements, [id]: mm } }
      typed = Object.fromEntries(Object.entries(typed).filter(([field]) => field !== `measurements.${id}`))
      carried.push(`${measurementById(id)?.name ?? id}: ${formatLength(mm, order.unit ?? 'cm')}`)
    }
    const next = carryBlock(order, block.order)
    order = next.order
    carried.push(...next.carried)
    left.push(...next.left)
  }
  return { order, typed, carried, left }
}

/** Measurements of an order that are not those of the card it stands on. */
function changedIn(order: DraftOrder, { values }: Card): [string, number][] {
  return Object.entries(order.measurements).filter(
    ([id, mm]) => values[id] !== undefined && Math.abs(values[id].mm - mm) > 0.001,
  )
}
