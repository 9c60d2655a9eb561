import { Ruler } from 'lucide-react'
import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { ButtonLink } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { EmptyState } from '@/components/ui/empty-state'
import { Page } from '@/components/ui/page'
import { listCards } from '@/db/access/cards'
import { CardRows } from '../clients/_parts/card-rows'

export const metadata: Metadata = { title: 'My measurements' }

/** A member's own measure cards, as students draft on. */
export default async function OwnCardsPage() {
  const actor = await requireActor('/cards')
  const cards = await forPage(listCards(actor, null))
  const add = (
    <ButtonLink href="/cards/new" look="primary">
      <Ruler size={18} aria-hidden />
      New measure card
    </ButtonLink>
  )
  return (
    <Page title="My measurements" actions={add} narrow>
      {cards.length === 0 ? (
        <EmptyState title="No measurements yet" action={add}>
          <p>Have somebody measure you, and draft on your own figures.</p>
        </EmptyState>
      ) : (
        <Card>
          <CardRows cards={cards} />
        </Card>
      )}
    </Page>
  )
}
