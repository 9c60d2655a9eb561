import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { getDraft } from '@/db/access/drafts'
import { may } from '@/db/permissions'
import { OpenDraft } from './_parts/open-draft'

export const metadata: Metadata = { title: 'Draft' }

export default async function DraftPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/drafts/${id}`)
  const { name, clientId, clientName, head, writable } = await forPage(getDraft(actor, id))
  return (
    <OpenDraft
      key={id}
      draft={{ id, name, head, writable, shareable: writable && may(actor, 'shares', 'write') }}
      back={
        clientId && clientName
          ? { href: `/clients/${clientId}`, label: clientName }
          : { href: '/drafts', label: 'Drafts' }
      }
      userId={actor.userId}
      workroomId={actor.workroomId}
    />
  )
}
