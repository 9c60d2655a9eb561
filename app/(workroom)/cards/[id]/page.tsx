import { Scissors } from 'lucide-react'
import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { ButtonLink } from '@/components/ui/button'
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
    <Page
      title={card.name}
      trail={trail}
      actions={
        may(actor, 'drafts', 'write') && (
          <ButtonLink href={`/drafts/new?card=${id}${client ? `&client=${client.id}` : ''}`} look="primary">
            <Scissors size={18} aria-hidden />
            Draft from this card
          </ButtonLink>
        )
      }
    >
      <CardForm
        card={card}
        isNew={false}
        readOnly={!may(actor, 'cards', 'write')}
        usual={usualMeasurements()}
      />
    </Page>
  )
}
