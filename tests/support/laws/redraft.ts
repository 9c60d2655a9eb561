import type { Draft, DraftOrder } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import type { Engine } from './violation'

/** The draft of an order, or why it was refused. Anything else that is thrown is thrown on. */
export function attempt(order: DraftOrder, engine: Engine): Draft | DraftingError {
  try {
    return engine.draftGarment(order)
  } catch (error) {
    // An engine that was broken on purpose has an error class of its own.
    if (error instanceof Error && error.name === 'DraftingError') return error as DraftingError
    throw error
  }
}

/** The draft, or undefined when the order was refused. */
export function drafted(order: DraftOrder, engine: Engine): Draft | undefined {
  const result = attempt(order, engine)
  return result instanceof Error ? undefined : result
}

/** The order with one measurement, or one style value, set anew. */
export function withMeasurement(order: DraftOrder, id: string, mm: number): DraftOrder {
  return { ...order, measurements: { ...order.measurements, [id]: mm } }
}

export function withStyle(order: DraftOrder, id: string, value: number | string | boolean): DraftOrder {
  return { ...order, design: { ...order.design, [id]: value } }
}
