'use client'

import { type FormEvent, useState } from 'react'

interface FormProblem {
  readonly field: string
  readonly message: string
}

/** What the work behind a form answers: a value, or what is wrong field by field. */
type FormAnswer<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problems: readonly FormProblem[] }

const unsent: readonly FormProblem[] = [
  {
    field: '',
    message: 'This could not be sent. Check the connection and try again; what you typed stays here.',
  },
]

/** A problem with a part of a field is a problem with the field. */
const concerns = (problem: FormProblem, field: string) =>
  problem.field === field || problem.field.startsWith(`${field}.`)

/** Puts the focus on the first field that is refused, so that a keyboard and a screen reader land where the work is. */
function focusFirst(form: HTMLFormElement, problems: readonly FormProblem[]): void {
  const controls = [...form.elements].filter((element) => element instanceof HTMLElement)
  const isWrong = (name: string | null) => problems.some((problem) => name && concerns(problem, name))
  controls.find((control) => isWrong(control.getAttribute('name')))?.focus()
}

/**
 * Sends a form without leaving the page and keeps what is wrong with it.
 * @param send gets the form's fields
 * @param onDone runs after a good answer; the form stays busy until it is through
 */
export function useActionForm<T>(
  send: (form: FormData) => Promise<FormAnswer<T>>,
  onDone: (value: T, form: FormData) => void | Promise<void>,
) {
  const [busy, setBusy] = useState(false)
  const [problems, setProblems] = useState<readonly FormProblem[]>([])

  async function submit(form: HTMLFormElement) {
    setBusy(true)
    const fields = new FormData(form)
    const answer = await send(fields).catch(() => ({ ok: false as const, problems: unsent }))
    if (answer.ok) {
      setProblems([])
      await onDone(answer.value, fields)
    } else {
      setProblems(answer.problems)
      focusFirst(form, answer.problems)
    }
    setBusy(false)
  }

  return {
    busy,
    onSubmit: (event: FormEvent<HTMLFormElement>) => {
      event.preventDefault()
      if (!busy) void submit(event.currentTarget)
    },
    /** What is wrong with a field. */
    errorOf: (field: string) => problems.find((problem) => concerns(problem, field))?.message,
    /** What is wrong with the whole, or with a field that is not among these. */
    errorBeside: (...fields: readonly string[]) =>
      problems.find((problem) => !fields.some((field) => concerns(problem, field)))?.message,
  }
}
