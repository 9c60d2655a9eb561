'use client'

import { homePath } from '@/app/_server/session/safe-path'
import { ChevronRight } from 'lucide-react'
import { useState } from 'react'
import { ErrorNote } from '@/components/ui/error-note'
import { changeWorkroom } from '../../actions'
import { enter } from '../../_parts/enter'

/** The person's workrooms, each a way in. */
export function WorkroomChoice({
  workrooms,
  present,
}: {
  readonly workrooms: readonly { readonly id: string; readonly name: string }[]
  /** Id of the one the session is in. */
  readonly present?: string
}) {
  const [problem, setProblem] = useState<string>()

  async function choose(workroomId: string) {
    const answer = await changeWorkroom({ workroomId }).catch(() => null)
    if (answer?.ok) return enter(homePath)
    setProblem(answer?.problems[0]?.message ?? 'This could not be sent. Check the connection and try again.')
  }

  return (
    <div className="grid gap-4">
      <ErrorNote>{problem}</ErrorNote>
      <ul className="border-t hairline">
        {workrooms.map(({ id, name }) => (
          <li key={id} className="border-b hairline">
            <button
              type="button"
              onClick={() => void choose(id)}
              className="flex min-h-14 w-full items-center justify-between gap-4 px-1 py-2.5 text-left text-lg hover:bg-sheet"
            >
              <span>
                {name}
                {id === present && <span className="ml-2 text-sm text-walnut">you are here</span>}
              </span>
              <ChevronRight size={20} className="shrink-0 text-walnut" aria-hidden />
            </button>
          </li>
        ))}
      </ul>
    </div>
  )
}
