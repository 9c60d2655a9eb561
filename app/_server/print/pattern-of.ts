import 'server-only'
import { garments } from '@/drafting'
import type { DraftOrder } from '@/drafting/contract'
import type { PatternTitle } from './pattern-title'

/** A version of a draft, as far as its paper pattern needs it. */
export interface Printable {
  readonly name: string
  /** As named by the drafter; absent when the version was saved by itself. */
  readonly version?: string | null
  readonly maker: string
  readonly savedAt: string
  /** Of the workroom. */
  readonly timeZone: string
  /** Whether the paper goes to somebody who may live in another zone: then it says whose time it is. */
  readonly zoneSaid?: boolean
  readonly order: DraftOrder
}

/** The name of a garment as it is said. */
export function garmentName(id: string): string {
  return garments.find((garment) => garment.id === id)?.name ?? id
}

/** What stands on the sheets: the draft, its version, and when that was saved. The client is nowhere in it. */
export function titleOf(printable: Printable): PatternTitle {
  const { date, time } = inWords(printable)
  return {
    name: printable.name,
    garment: garmentName(printable.order.garment),
    version: printable.version ?? `saved at ${time}`,
    date,
    maker: printable.maker,
  }
}

function inWords({ savedAt, timeZone, zoneSaid }: Printable): { date: string; time: string } {
  const at = new Date(savedAt)
  const date = at.toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric', timeZone })
  const time = at.toLocaleTimeString('en-GB', {
    hour: '2-digit',
    minute: '2-digit',
    timeZone,
    timeZoneName: zoneSaid ? 'short' : undefined,
  })
  return { date, time }
}
