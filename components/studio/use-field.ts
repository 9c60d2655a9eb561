'use client'

import { useState, type ChangeEvent, type FocusEvent, type KeyboardEvent } from 'react'
import { DraftingError } from '@/drafting/drafting-error'
import { typesetTyped } from '@/components/ui/typed-fractions'
import type { FieldRef } from './field-ref'
import { problemsAt } from './store'
import { useStudio, useStudioState } from './use-store'
import { currentValue, kindOf, nudged, parseValue, shownText, typedWithUnit, unitWord } from './values'

/**
 * What an input needs to be one field of the order: text, problems, and the handlers of the keyboard.
 * @param over mm that the field shows on top of the value: a tag tells the whole length, of which the value may be a part
 */
export function useField(ref: FieldRef, label: string, over = 0) {
  const { store, garment, writable } = useStudio()
  const [editing, setEditing] = useState<string>()
  const kind = kindOf(garment, ref)
  const unit = useStudioState((state) => state.unit)
  const attempted = useStudioState((state) => state.attempts[ref]?.text)
  const value = useStudioState((state) => currentValue(garment, state.order, ref))
  const typed = useStudioState((state) => state.typed[ref])
  const shown = attempted ?? shownText(kind, typeof value === 'number' ? value + over : value, typed, unit)
  const problem = useStudioState((state) =>
    problemsAt(state, ref)
      .map((each) => each.message)
      .join(' '),
  )
  const refused = useStudioState((state) => state.attempts[ref] !== undefined)

  function type(text: string) {
    setEditing(text)
    const { order } = store.get()
    // A measurement taken off the tape again is estimated, where it can be.
    if (ref.startsWith('measurements.') && text.trim() === '') {
      store.put(ref, undefined)
      return
    }
    try {
      const value = parseValue(kind, text, unit, ref) - over
      if (value === currentValue(garment, order, ref)) store.putBack(ref)
      else store.put(ref, value, typedWithUnit(kind, text, unit))
    } catch (error) {
      if (!(error instanceof DraftingError)) throw error
      store.refuse(ref, text, error.problems)
    }
  }

  function step(direction: 1 | -1, large: boolean) {
    const value = currentValue(garment, store.get().order, ref)
    if (typeof value !== 'number') return
    const next = nudged(kind, value + over, unit, direction, large) - over
    store.begin()
    store.put(ref, next)
    setEditing(undefined)
  }

  function keep() {
    store.commit(label)
    setEditing(undefined)
  }

  function keyDown(event: KeyboardEvent<HTMLInputElement>) {
    const { key } = event
    const mod = event.ctrlKey || event.metaKey
    if (key === 'Enter') {
      keep()
      store.begin()
      event.currentTarget.select()
    } else if (key === 'Escape') {
      store.cancel()
      store.putBack(ref)
      setEditing(undefined)
      store.begin()
    } else if ((key === 'ArrowUp' || key === 'ArrowDown') && kind !== 'choice') {
      step(key === 'ArrowUp' ? 1 : -1, event.shiftKey)
    } else if (mod && key.toLowerCase() === 'z') {
      // The field's own text goes back first; then the draft's changes, one by one.
      if (editing === undefined) {
        store.commit(label)
        if (event.shiftKey) store.redo()
        else store.undo()
      } else store.cancel()
      setEditing(undefined)
      store.begin()
    } else return
    event.preventDefault()
    event.stopPropagation()
  }

  return {
    kind,
    unit: unitWord(kind, unit),
    problem,
    refused,
    type,
    step,
    keep,
    putBack: () => {
      store.putBack(ref)
      setEditing(undefined)
    },
    input: {
      value: typesetTyped(editing ?? shown),
      readOnly: !writable,
      inputMode: 'text' as const,
      autoComplete: 'off',
      spellCheck: false,
      'aria-invalid': problem ? (true as const) : undefined,
      onFocus: (event: FocusEvent<HTMLInputElement>) => {
        store.begin()
        event.currentTarget.select()
      },
      onBlur: keep,
      onChange: (event: ChangeEvent<HTMLInputElement>) => type(typesetTyped(event.currentTarget.value)),
      onKeyDown: keyDown,
    },
  }
}
