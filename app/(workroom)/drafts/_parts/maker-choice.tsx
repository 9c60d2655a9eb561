'use client'

import { useRouter } from 'next/navigation'
import { useId, useState } from 'react'
import { useToast } from '@/components/ui/toast'
import type { Maker } from '@/db/access/assigning'
import { giveDraft } from '../actions'

/** Who makes a draft up: chosen here, it is theirs at once; “Nobody yet” takes it back. */
export function MakerChoice({
  draft,
  makers,
}: {
  readonly draft: {
    readonly id: string
    readonly name: string
    readonly assignedTo: string | null
    readonly assignedToName: string | null
  }
  readonly makers: readonly Maker[]
}) {
  const id = useId()
  const router = useRouter()
  const say = useToast()
  const [chosen, setChosen] = useState(draft.assignedTo)
  const [busy, setBusy] = useState(false)
  // Somebody who is no maker any more keeps what was given to them until it is given on.
  const former = draft.assignedTo && !makers.some((maker) => maker.membershipId === draft.assignedTo)

  async function give(next: string | null) {
    const before = chosen
    setChosen(next)
    setBusy(true)
    const answer = await giveDraft({ id: draft.id, membershipId: next }).catch(() => undefined)
    setBusy(false)
    if (answer?.ok) {
      const { assignedToName: name } = answer.value
      say(name ? `${name} now sees “${draft.name}” and can print it.` : `“${draft.name}” is taken back.`)
      router.refresh()
      return
    }
    setChosen(before)
    say(answer?.problems[0]?.message ?? 'This could not be sent. Check the connection and try again.')
  }

  return (
    <span className="flex items-center gap-2">
      <label htmlFor={id} className="text-walnut sm:sr-only">
        Made up by<span className="sr-only">: {draft.name}</span>
      </label>
      <select
        id={id}
        value={chosen ?? ''}
        disabled={busy}
        onChange={(event) => void give(event.target.value || null)}
        className="min-h-9 max-w-52 rounded border hairline bg-transparent px-2 hover:border-rule"
      >
        <option value="">Nobody yet</option>
        {former && <option value={draft.assignedTo ?? ''}>{draft.assignedToName}</option>}
        {makers.map(({ membershipId, name }) => (
          <option key={membershipId} value={membershipId}>
            {name}
          </option>
        ))}
      </select>
    </span>
  )
}
