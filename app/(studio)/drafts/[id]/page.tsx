import type { Metadata } from 'next'
import { OnThisDevice } from '@/app/(workroom)/_parts/on-this-device'
import { buildId } from '@/app/_server/build'
import { drawnOtherwise } from '@/app/_server/print/kept-or-drawn'
import { forPage, requireActor } from '@/app/_server/session'
import { getDraft } from '@/db/access/drafts'
import { keptDraft } from '@/db/access/kept-drafts'
import { may } from '@/db/permissions'
import { OpenDraft } from './_parts/open-draft'

export const metadata: Metadata = { title: 'Draft' }

export default async function DraftPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/drafts/${id}`)
  const { name, clientId, clientName, head, writable } = await forPage(getDraft(actor, id))
  const kept = head.printed || head.shared ? await forPage(keptDraft(actor, head.id)) : null
  const otherwise = drawnOtherwise(head.order, kept)
  return (
    <>
      <OnThisDevice build={buildId} userId={actor.userId} workroomId={actor.workroomId} />
      <OpenDraft
        key={id}
        draft={{ id, name, head, writable, shareable: writable && may(actor, 'shares', 'write') }}
        back={
          clientId && clientName
            ? { href: `/clients/${clientId}`, label: clientName }
            : { href: '/drafts', label: 'Drafts' }
        }
        otherwise={
          otherwise && {
            keptAt: otherwise.keptAt,
            differences: otherwise.differences,
            drawable: otherwise.drawable,
          }
        }
        userId={actor.userId}
        workroomId={actor.workroomId}
      />
    </>
  )
}
