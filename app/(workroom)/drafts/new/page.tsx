import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { Page } from '@/components/ui/page'
import { listBlocks } from '@/db/access/blocks'
import { listCards } from '@/db/access/cards'
import { getClient, listClients } from '@/db/access/clients'
import { listMethods } from '@/db/access/methods'
import { may, reachOf } from '@/db/permissions'
import { methods } from '@/drafting'
import { dayText } from '../../_data/dates'
import { one, type SearchParams } from '../../_data/list-address'
import { picturedGarments } from '../_parts/garment-pictures'
import { NewDraftForm } from '../_parts/new-draft-form'
import { ClientChoice } from '../_parts/client-choice'
import { middleSize, publishedSizes } from '../_parts/published-sizes'

export const metadata: Metadata = { title: 'New draft' }

export default async function NewDraftPage({ searchParams }: { searchParams: SearchParams }) {
  const actor = await requireActor('/drafts/new')
  const asked = await searchParams
  const clientId = one(asked.client)
  const trail = [{ href: '/drafts', label: 'Drafts' }]
  const withClients = may(actor, 'clients', 'write')

  if (!clientId && withClients && one(asked.for) !== 'nobody') {
    const search = (one(asked.search) ?? '').slice(0, 100)
    const clients = await forPage(listClients(actor, { search }))
    return (
      <Page title="New draft" trail={trail} lead="Who is it for?" narrow>
        <ClientChoice clients={clients.items} search={search} />
      </Page>
    )
  }

  const [client, cards, own, blocks] = await forPage(
    Promise.all([
      clientId ? getClient(actor, clientId) : undefined,
      clientId || may(actor, 'cards', 'read') ? listCards(actor, clientId ?? null) : [],
      listMethods(actor),
      clientId && may(actor, 'blocks', 'read') ? listBlocks(actor, clientId) : [],
    ]),
  )
  // A draft for a client stands on her own measurements; any other may stand on a published size.
  const sizes = client ? [] : publishedSizes()
  if (cards.length === 0 && sizes.length === 0) {
    return (
      <Page title="New draft" trail={trail} narrow>
        <EmptyState
          title="A draft starts from a measure card"
          action={
            <ButtonLink href={client ? `/clients/${client.id}/cards/new` : '/cards/new'} look="primary">
              New measure card
            </ButtonLink>
          }
        >
          <p>
            {client ? `${client.name} has none yet.` : 'You have none yet.'} Ten measurements are enough for a
            dress.
          </p>
        </EmptyState>
      </Page>
    )
  }
  return (
    <Page
      title="New draft"
      trail={trail}
      lead={client ? `For ${client.name}` : withClients ? 'For nobody in particular' : undefined}
      narrow
    >
      <NewDraftForm
        garments={picturedGarments()}
        cards={cards.map((card) => ({ id: card.id, name: `${card.name}, ${dayText(card.takenOn)}` }))}
        sizes={sizes}
        methods={[...methods, ...own].map(({ id, name, description }) => ({ id, name, description }))}
        blocks={blocks.map(({ draftName, versionName }) =>
          [draftName, versionName].filter(Boolean).join(', '),
        )}
        first={(cards.find(({ id }) => id === one(asked.card)) ?? cards[0] ?? middleSize()).id}
        teachable={!client && reachOf(actor, 'drafts', 'write').has('all')}
      />
    </Page>
  )
}
