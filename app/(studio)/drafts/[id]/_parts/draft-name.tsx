'use client'

import { Pencil } from 'lucide-react'
import { useState } from 'react'
import { renameDraft } from '@/app/(workroom)/drafts/actions'
import { useToast } from '@/components/ui/toast'

/** The name of the draft in the bar; press it to change it. */
export function DraftName({
  id,
  name,
  onName,
  writable,
}: {
  readonly id: string
  readonly name: string
  readonly onName: (name: string) => void
  readonly writable: boolean
}) {
  const say = useToast()
  const [text, setText] = useState<string>()

  async function keep() {
    const next = text?.trim()
    setText(undefined)
    if (!next || next === name) return
    onName(next)
    const answer = await renameDraft({ id, name: next }).catch(() => undefined)
    if (answer?.ok) return
    onName(name)
    say(answer?.problems[0]?.message ?? 'The name could not be saved. Check the connection and try again.')
  }

  if (text === undefined) {
    if (!writable) return <>{name}</>
    return (
      <button
        type="button"
        onClick={() => setText(name)}
        title="Change the name"
        className="group flex min-h-8 max-w-full items-center gap-1.5 rounded px-1 hover:text-indigo"
      >
        <span className="truncate">{name}</span>
        <Pencil
          size={14}
          aria-hidden
          className="shrink-0 opacity-0 group-hover:opacity-100 group-focus-visible:opacity-100"
        />
        <span className="sr-only">, change the name</span>
      </button>
    )
  }
  return (
    <input
      aria-label="Name of the draft"
      value={text}
      maxLength={120}
      autoFocus
      onFocus={(event) => event.currentTarget.select()}
      onChange={(event) => setText(event.target.value)}
      onBlur={() => void keep()}
      onKeyDown={(event) => {
        if (event.key === 'Enter') void keep()
        if (event.key === 'Escape') setText(undefined)
      }}
      className="min-h-8 w-full rounded border border-rule bg-sheet px-2"
    />
  )
}
