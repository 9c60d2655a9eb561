'use client'

import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useState, useTransition } from 'react'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { ErrorNote } from '@/components/ui/error-note'
import { Select } from '@/components/ui/select'
import { dropBlock, makeBlock } from '../actions'

interface Shown {
  readonly garment: string
  readonly garmentName: string
  readonly draftId: string
  readonly draftName: string
  /** The version, or when it was made the block. */
  readonly version: string
}

/** The client's blocks, and a way to make one of the drafts a block. */
export function BlocksCard({
  clientId,
  blocks,
  drafts,
}: {
  readonly clientId: string
  readonly blocks: readonly Shown[]
  /** Drafts that may become a block. */
  readonly drafts: readonly { readonly id: string; readonly name: string }[]
}) {
  const router = useRouter()
  const [draftId, setDraftId] = useState(drafts[0]?.id ?? '')
  const [problem, setProblem] = useState('')
  const [busy, start] = useTransition()

  function act(work: () => ReturnType<typeof makeBlock>) {
    start(async () => {
      try {
        const result = await work()
        setProblem(result.ok ? '' : result.problems.map(({ message }) => message).join(' '))
        if (result.ok) router.refresh()
      } catch {
        setProblem('The server could not be reached. Try again.')
      }
    })
  }

  return (
    <Card title="Blocks">
      <div className="grid gap-4">
        {blocks.length === 0 ? (
          <p className="text-walnut">
            None yet. Correct a bodice or a skirt after its fitting and make it the block: every later style
            starts from its corrections.
          </p>
        ) : (
          <ul className="grid gap-3">
            {blocks.map(({ garment, garmentName, draftId: id, draftName, version }) => (
              <li key={garment} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
                <span>
                  <Link
                    href={`/drafts/${id}`}
                    className="font-semibold decoration-rule underline-offset-4 hover:text-indigo hover:underline"
                  >
                    {draftName}
                  </Link>{' '}
                  <span className="text-walnut">
                    {garmentName}, {version}
                  </span>
                </span>
                <Button
                  look="quiet"
                  busy={busy}
                  aria-label={`${draftName}: no longer a block`}
                  onClick={() => act(() => dropBlock({ clientId, garment }))}
                >
                  No longer a block
                </Button>
              </li>
            ))}
          </ul>
        )}
        {drafts.length > 0 && (
          <div className="flex flex-wrap items-end gap-3">
            <Select
              label="Draft to start from"
              className="min-w-52 grow"
              value={draftId}
              onChange={(event) => setDraftId(event.target.value)}
              choices={drafts.map(({ id, name }) => ({ value: id, label: name }))}
            />
            <Button busy={busy} onClick={() => act(() => makeBlock({ draftId }))}>
              Use as the block
            </Button>
          </div>
        )}
        <ErrorNote>{problem}</ErrorNote>
      </div>
    </Card>
  )
}
