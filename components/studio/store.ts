import type { Draft, DraftOrder, Problem } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import { changeInWords } from './announce'
import type { Engine } from './engine'
import { isAbout, withValue, type FieldRef, type FieldValue } from './field-ref'
import { isStale, type Attempt, type Snapshot, type StudioState, type Unit } from './state'

interface Entry {
  readonly label: string
  readonly snapshot: Snapshot
}

/** What was on the table before a gesture began. */
interface Before extends Snapshot {
  readonly draft: Draft | undefined
  readonly attempts: StudioState['attempts']
}

export interface StoreOptions {
  readonly engine: Engine
  readonly order: DraftOrder
  readonly typed?: Readonly<Record<string, string>>
  readonly unit: Unit
}

/** Told after every change of the state. */
type Listener = () => void

/**
 * Holds the order, the draft that follows from it and the way back. One gesture (a field typed in, a point dragged, a choice made) is one
 * undo entry; while it lasts every change is drafted at once. An order that cannot be drafted never replaces one that can: it
 * stands as an attempt at its field.
 */
export function createStudioStore({ engine, order, typed = {}, unit }: StoreOptions) {
  const listeners = new Set<Listener>()
  let past: readonly Entry[] = []
  let future: readonly Entry[] = []
  let before: Before | undefined
  let state: StudioState = {
    order,
    typed,
    unit,
    draft: undefined,
    resting: undefined,
    problems: [],
    attempts: {},
    gesture: false,
    undoes: undefined,
    redoes: undefined,
    said: '',
  }
  const first = draftOf(order, true)
  state = {
    ...state,
    ...('draft' in first ? { draft: first.draft, resting: first.draft } : { problems: first.problems }),
  }

  function draftOf(next: DraftOrder, explain: boolean): { draft: Draft } | { problems: readonly Problem[] } {
    try {
      return { draft: engine.draftGarment({ ...next, unit: state.unit, explain }) }
    } catch (error) {
      if (error instanceof DraftingError) return { problems: error.problems }
      throw error
    }
  }

  function set(change: Partial<StudioState>) {
    state = { ...state, ...change, undoes: past.at(-1)?.label, redoes: future.at(-1)?.label }
    if (!state.gesture && state.resting !== state.draft) state = { ...state, resting: state.draft }
    for (const listener of listeners) listener()
  }

  function without(ref: FieldRef): StudioState['attempts'] {
    return Object.fromEntries(Object.entries(state.attempts).filter(([key]) => key !== ref))
  }

  /** Takes fields into the order; their refused texts are settled. */
  function accept(fields: readonly Put[], draft: Draft) {
    const settled = new Set<string>(fields.map((field) => field.ref))
    const kept = <T>(record: Readonly<Record<string, T>>) =>
      Object.fromEntries(Object.entries(record).filter(([key]) => !settled.has(key)))
    const texts = fields.flatMap(({ ref, text }) => (text === undefined ? [] : [[ref, text] as const]))
    set({
      order: withAll(state.order, fields),
      typed: { ...kept(state.typed), ...Object.fromEntries(texts) },
      draft,
      problems: [],
      attempts: kept(state.attempts as Record<string, Attempt>),
    })
  }

  const store = {
    get: (): StudioState => state,

    subscribe(listener: Listener): () => void {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },

    /** Opens a gesture; a second call while one is open changes nothing. */
    begin() {
      if (before) return
      before = { order: state.order, typed: state.typed, draft: state.draft, attempts: state.attempts }
      set({ gesture: true })
    },

    /**
     * Drafts with one field changed, and with every value that had to wait for it. `text` is what was typed, to be shown again; undefined
     * value: the garment's default.
     * @returns the problems, empty when it could be drafted.
     */
    put(ref: FieldRef, value: FieldValue | undefined, text?: string, explain = true): readonly Problem[] {
      const waiting = readable(without(ref))
      const together = [{ ref, value, text }, ...waiting]
      const all = draftOf(withAll(state.order, together), explain)
      if ('draft' in all) {
        accept(together, all.draft)
        return []
      }
      const alone = [{ ref, value, text }]
      const own = waiting.length > 0 ? draftOf(withAll(state.order, alone), explain) : all
      if ('draft' in own) {
        accept(alone, own.draft)
        return []
      }
      store.refuse(ref, text ?? String(value ?? ''), own.problems, value)
      return own.problems
    },

    /** Like put for several values at once, as a point on two moves needs. Changes nothing when it cannot be drafted. */
    putAll(fields: readonly Put[], explain: boolean): readonly Problem[] {
      const result = draftOf(withAll(state.order, fields), explain)
      if ('problems' in result) return result.problems
      accept(fields, result.draft)
      return []
    },

    /** Takes in values whose draft the caller has made already, as a drag does in every frame. */
    take(fields: readonly Put[], draft: Draft) {
      accept(fields, draft)
    },

    /** Keeps a text that cannot be drafted at its field; the drawing stays the last good one. */
    refuse(ref: FieldRef, text: string, problems: readonly Problem[], value?: FieldValue) {
      const attempt: Attempt = { text, problems, ...(value === undefined ? {} : { value }) }
      set({ attempts: { ...state.attempts, [ref]: attempt } })
    },

    /** Drops a refused text: the field shows again what is drawn. */
    putBack(ref: FieldRef) {
      set({ attempts: without(ref) })
    },

    /** Closes a gesture: one undo entry when anything changed, and its consequence said in words. */
    commit(label: string) {
      if (!before) return
      const start = before
      before = undefined
      const changed = start.order !== state.order && !sameOrder(start, state)
      if (!changed) {
        const refused = Object.values(state.attempts).at(-1)?.problems[0]?.message
        const said = refused ? { said: refused } : {}
        set({
          gesture: false,
          order: start.order,
          typed: start.typed,
          draft: start.draft ?? state.draft,
          ...said,
        })
        return
      }
      past = [...past, { label, snapshot: { order: start.order, typed: start.typed } }]
      future = []
      const explained = draftOf(state.order, true)
      const draft = 'draft' in explained ? explained.draft : state.draft
      set({ gesture: false, draft, said: changeInWords(label, start.draft, draft, state.unit) })
    },

    /** Leaves a gesture as though it had not begun. */
    cancel() {
      if (!before) return
      const { order, typed, draft, attempts } = before
      before = undefined
      set({ order, typed, draft, attempts, gesture: false })
    },

    /** A whole gesture in one call: a choice made, a tick set, a rule put back. */
    change(ref: FieldRef, value: FieldValue | undefined, label: string, text?: string) {
      store.begin()
      store.put(ref, value, text)
      store.commit(label)
    },

    undo() {
      const entry = past.at(-1)
      if (!entry || before) return
      past = past.slice(0, -1)
      future = [...future, { label: entry.label, snapshot: { order: state.order, typed: state.typed } }]
      restore(entry.snapshot, `Undone: ${entry.label}`)
    },

    redo() {
      const entry = future.at(-1)
      if (!entry || before) return
      future = future.slice(0, -1)
      past = [...past, { label: entry.label, snapshot: { order: state.order, typed: state.typed } }]
      restore(entry.snapshot, `Done again: ${entry.label}`)
    },

    /** Puts a whole saved version on the table, undoable like any change. */
    replace(snapshot: Snapshot, label: string) {
      before = undefined
      past = [...past, { label, snapshot: { order: state.order, typed: state.typed } }]
      future = []
      restore(snapshot, label)
    },

    /** Words of sums and values only: no length moves, and undo does not count it. */
    setUnit(unit: Unit) {
      if (unit === state.unit) return
      state = { ...state, unit }
      const result = draftOf(state.order, true)
      set('draft' in result ? { draft: result.draft } : {})
    },

    /** Says something without changing anything. */
    say(words: string) {
      set({ said: words })
    },
  }

  function restore(snapshot: Snapshot, said: string) {
    const result = draftOf(snapshot.order, true)
    const outcome = 'draft' in result ? { draft: result.draft, problems: [] } : { problems: result.problems }
    set({ ...snapshot, ...outcome, attempts: {}, gesture: false, said })
  }

  return store
}

export type StudioStore = ReturnType<typeof createStudioStore>

export interface Put {
  readonly ref: FieldRef
  readonly value: FieldValue | undefined
  readonly text?: string | undefined
}

function withAll(order: DraftOrder, fields: readonly Put[]): DraftOrder {
  return fields.reduce((sum, { ref, value }) => withValue(sum, ref, value), order)
}

/** Refused texts that could be read, as fields to try again. */
function readable(attempts: StudioState['attempts']): readonly Put[] {
  return Object.entries(attempts).flatMap(([ref, attempt]) =>
    attempt?.value === undefined ? [] : [{ ref: ref as FieldRef, value: attempt.value, text: attempt.text }],
  )
}

function sameOrder(a: Snapshot, b: Snapshot): boolean {
  return JSON.stringify(a.order) === JSON.stringify(b.order)
}

/**
 * The problems that stand at a field: all that name it, whichever field brought them up; else, for a text that waits on other fields or
 * cannot be read, its own.
 */
export function problemsAt(state: StudioState, ref: FieldRef): readonly Problem[] {
  if (!isStale(state)) return []
  const attempts = Object.values(state.attempts)
  const all = [...state.problems, ...attempts.flatMap((attempt) => attempt?.problems ?? [])]
  const named = all.filter((problem) => isAbout(problem.field, ref))
  const own = state.attempts[ref]?.problems ?? []
  const distinct = new Map((named.length > 0 ? named : own).map((problem) => [problem.message, problem]))
  return [...distinct.values()]
}
