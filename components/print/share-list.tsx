'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { dayInWords, scopeNames, stateWords } from './share-words'
import type { MadeShare } from './share-words'

/** The links of a draft with what they show and whether they still work. */
export function ShareList({
  shares,
  onRevoke,
}: {
  readonly shares: readonly MadeShare[] | undefined
  readonly onRevoke: (id: string) => Promise<void>
}) {
  if (!shares) return <p className="text-sm text-walnut">Looking up the links there are…</p>
  if (shares.length === 0) return null
  return (
    <section>
      <h3 className="mb-1 text-sm font-semibold">Links to this draft</h3>
      <ul>
        {shares.map((share) => (
          <ShareRow key={share.id} share={share} onRevoke={onRevoke} />
        ))}
      </ul>
    </section>
  )
}

function ShareRow({
  share,
  onRevoke,
}: {
  readonly share: MadeShare
  readonly onRevoke: (id: string) => Promise<void>
}) {
  const [busy, setBusy] = useState(false)
  const made = dayInWords(share.createdAt.slice(0, 10))

  async function takeBack() {
    setBusy(true)
    try {
      await onRevoke(share.id)
    } finally {
      setBusy(false)
    }
  }

  return (
    <li className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 border-b hairline py-2">
      <span>
        <span className="font-semibold">{scopeNames[share.scope]}</span>, made {made}
        <span className="block text-sm text-walnut">
          {share.state === 'live'
            ? `Works until ${dayInWords(share.expiresOn)}`
            : `It ${stateWords[share.state]}`}
        </span>
      </span>
      {share.state === 'live' && (
        <Button
          look="danger"
          busy={busy}
          onClick={() => void takeBack()}
          aria-label={`Take back the ${scopeNames[share.scope].toLowerCase()} link made ${made}`}
        >
          Take back
        </Button>
      )}
    </li>
  )
}
