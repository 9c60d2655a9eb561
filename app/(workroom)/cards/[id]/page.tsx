import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { getCard } from '@/db/access/cards'
import { getClient } from '@/db/access/clients'
import { may } from '@/db/permissions'
import { usualMeasurements } from '../../_data/usual-measurements'
import { CardForm } from '../_parts/card-form'

export const metadata: Metadata = { title: 'Measure card' }

export default async function CardPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/cards/${id}`)
  const card = await forPage(getCard(actor, id))
  const client = card.clientId ? await forPage(getClient(actor, card.clientId)) : undefined
  const trail = client
    ? [
        { href: '/clients', label: 'Clients' },
        { href: `/clients/${client.id}`, label: client.name },
      ]
    : [{ href: '/cards', label: 'My measurements' }]
  return (
    <Page title={card.name} trail={trail}>
      <CardForm
        card={card}
        isNew={false}
        readOnly={!may(actor, 'cards', 'write')}
        usual={usualMeasurements()}
        draftable={may(actor, 'drafts', 'write')}
      />
    </Page>
  )
}
