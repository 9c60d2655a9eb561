import type { Draft, DraftOrder, Problem } from '@/drafting/contract'
import type { FieldRef, FieldValue } from './field-ref'

export type Unit = 'in' | 'cm'

/** What one undo brings back, to the byte. */
export interface Snapshot {
  readonly order: DraftOrder
  /** The text of each field as its drafter typed it. */
  readonly typed: Readonly<Record<string, string>>
}

/** Something typed that cannot be drafted: kept where it was typed, with every reason, until it is put right or put back. */
export interface Attempt {
  readonly text: string
  /** What the text says, when it could be read at all: tried again whenever another field changes. */
  readonly value?: FieldValue
  readonly problems: readonly Problem[]
}

export interface StudioState extends Snapshot {
  readonly unit: Unit
  /** The last order that could be drafted, drawn. Undefined when even the first could not. */
  readonly draft: Draft | undefined
  /** The draft when no gesture was open: for what need not follow every frame of a drag. Its sums are always told. */
  readonly resting: Draft | undefined
  /** Why the opened order itself cannot be drafted; empty as soon as one could. */
  readonly problems: readonly Problem[]
  readonly attempts: Readonly<Partial<Record<FieldRef, Attempt>>>
  /** A field is being typed in or a point dragged. */
  readonly gesture: boolean
  /** Label of what undo would take back, and of what redo would do again. */
  readonly undoes: string | undefined
  readonly redoes: string | undefined
  /** What a screen reader is told after a change. */
  readonly said: string
}

/** True while the drawing is not of what stands in the fields, so that it is shown dimmed. */
export function isStale(state: StudioState): boolean {
  return state.problems.length > 0 || Object.keys(state.attempts).length > 0
}
