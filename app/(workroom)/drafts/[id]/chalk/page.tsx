import type { Metadata } from 'next'
import { onTape } from '@/app/_server/print/chalk-answer'
import { forPage, requireActor } from '@/app/_server/session'
import { ChalkCards } from '@/components/chalk/chalk-cards'
import { ButtonLink, buttonClass } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { Page } from '@/components/ui/page'
import { getDraft } from '@/db/access/drafts'
import type { Draft, DraftOrder } from '@/drafting/contract'
import { chalkGuide } from '@/drafting/chalk/guide'
import { tapes } from '@/drafting/chalk/tapes'
import { DraftingError } from '@/drafting/drafting-error'

export const metadata: Metadata = { title: 'Chalk guide' }

export default async function ChalkPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/drafts/${id}/chalk`)
  const { name, head } = await forPage(getDraft(actor, id))
  const { draft, problem } = drafted(head.order)
  const unit = head.order.unit ?? 'cm'
  return (
    <Page
      title={`Chalk guide: ${name}`}
      trail={[
        { href: '/drafts', label: 'Drafts' },
        { href: `/drafts/${id}`, label: name },
      ]}
      lead={`Every length is a mark of the tape: ${unit === 'in' ? 'eighths of an inch' : 'half centimetres'}. Lengths are without allowances, which are chalked outside the lines last.`}
      actions={
        draft && (
          <a className={buttonClass('plain')} href={`/api/revisions/${head.id}/chalk.pdf`} download>
            Print it (PDF)
          </a>
        )
      }
    >
      {draft ? (
        <ChalkCards guide={chalkGuide(draft, unit, tapes[unit])} pieces={draft.pieces} version={head.id} />
      ) : (
        <EmptyState
          title="This draft cannot be chalked yet"
          action={<ButtonLink href={`/drafts/${id}`}>Open the draft</ButtonLink>}
        >
          <p>{problem}</p>
        </EmptyState>
      )}
    </Page>
  )
}

/** The draft on the tape, or what keeps it from being drafted, in words. */
function drafted(order: DraftOrder): { readonly draft?: Draft; readonly problem?: string } {
  try {
    return { draft: onTape(order) }
  } catch (error) {
    if (error instanceof DraftingError)
      return { problem: error.problems.map(({ message }) => message).join(' ') }
    throw error
  }
}
