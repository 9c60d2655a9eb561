import type { Draft, DraftOrder, Handle } from '@/drafting/contract'

/** The two engine functions that the studio runs on every change. */
export interface Engine {
  readonly draftGarment: (order: DraftOrder) => Draft
  readonly handles: (order: DraftOrder) => readonly Handle[]
}
