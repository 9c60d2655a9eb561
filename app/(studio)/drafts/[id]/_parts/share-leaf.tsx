'use client'

import { useQuery, useQueryClient } from '@tanstack/react-query'
import { v7 as newId } from 'uuid'
import { ShareDialog } from '@/components/print/share-dialog'
import { ask } from '../../../_data/api'
import { Queries } from '../../../_data/queries'

type Shares = Parameters<typeof ShareDialog>[0]['shares']

interface ShareLeafProps {
  readonly onClose: () => void
  readonly draftId: string
  readonly draftName: string
  /** A link shows the newest saved version: what is on the table is saved first. */
  readonly beforeMaking: () => Promise<unknown>
}

/** Links to this draft: asked for when the dialog opens, made and taken back through our own routes. */
export function ShareLeaf(props: ShareLeafProps) {
  return (
    <Queries>
      <Share {...props} />
    </Queries>
  )
}

function Share({ onClose, draftId, draftName, beforeMaking }: ShareLeafProps) {
  const queries = useQueryClient()
  const key = ['shares', draftId]
  const path = `/api/drafts/${draftId}/shares`
  const list = useQuery({ queryKey: key, queryFn: () => ask<NonNullable<Shares>>(path) })
  const again = () => queries.invalidateQueries({ queryKey: key })

  return (
    <ShareDialog
      open
      onClose={onClose}
      draftName={draftName}
      shares={list.data}
      onCreate={async (share) => {
        await beforeMaking()
        const { url } = await ask<{ url: string }>(path, { json: { ...share, shareId: newId() } })
        await again()
        return url
      }}
      onRevoke={async (id) => {
        await ask(`${path}/${id}`, { method: 'DELETE', json: {} })
        await again()
      }}
    />
  )
}
