'use client'

import { useRouter } from 'next/navigation'
import { useState, useTransition } from 'react'
import { Button } from '@/components/ui/button'
import { archiveClient } from '../actions'

/** Puts a client away, or takes one out again. Nothing is lost either way, so it does not ask twice. */
export function ArchiveButton({ id, archived }: { readonly id: string; readonly archived: boolean }) {
  const router = useRouter()
  const [problem, setProblem] = useState('')
  const [busy, start] = useTransition()
  return (
    <>
      <Button
        look="quiet"
        busy={busy}
        onClick={() =>
          start(async () => {
            const result = await archiveClient({ id, archived: !archived })
            if (result.ok) router.refresh()
            else setProblem(result.problems.map((each) => each.message).join(' '))
          })
        }
      >
        {archived ? 'Back into the list' : 'Put away'}
      </Button>
      {problem && <p className="text-sm text-madder">{problem}</p>}
    </>
  )
}
