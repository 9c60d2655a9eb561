import { Pencil, Ruler, Scissors } from 'lucide-react'
import type { Metadata } from 'next'
import Link from 'next/link'
import { forPage, requireActor } from '@/app/_server/session'
import { ButtonLink } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Page } from '@/components/ui/page'
import { listMakers } from '@/db/access/assigning'
import { listBlocks } from '@/db/access/blocks'
import { listCards } from '@/db/access/cards'
import { getClient } from '@/db/access/clients'
import { listDrafts } from '@/db/access/drafts'
import { may, reachOf } from '@/db/permissions'
import { garments } from '@/drafting'
import { dayText } from '../../_data/dates'
import { DraftRows } from '../../drafts/_parts/draft-rows'
import { ArchiveButton } from '../_parts/archive-button'
import { BlocksCard } from '../_parts/blocks-card'
import { CardRows } from '../_parts/card-rows'

export const metadata: Metadata = { title: 'Client' }

const garmentName = (id: string) => garments.find((garment) => garment.id === id)?.name ?? id

export default async function ClientPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/clients/${id}`)
  const client = await forPage(getClient(actor, id))
  const [cards, drafts, makers, blocks] = await forPage(
    Promise.all([
      listCards(actor, id),
      listDrafts(actor, { clientId: id }),
      reachOf(actor, 'drafts', 'write').has('all') ? listMakers(actor) : [],
      may(actor, 'blocks', 'write') ? listBlocks(actor, id) : [],
    ]),
  )
  const writable = may(actor, 'clients', 'write')
  const draftable = may(actor, 'drafts', 'write')
  return (
    <Page
      title={client.name}
      trail={[{ href: '/clients', label: 'Clients' }]}
      lead={client.archived ? 'Put away: not in the list of clients.' : undefined}
      actions={
        draftable &&
        cards.length > 0 && (
          <ButtonLink href={`/drafts/new?client=${id}`} look="primary">
            <Scissors size={18} aria-hidden />
            New draft
          </ButtonLink>
        )
      }
    >
      <div className="grid items-start gap-6 lg:grid-cols-[1fr_20rem]">
        <div className="grid gap-6">
          <Card
            title="Measure cards"
            actions={
              writable && (
                <ButtonLink href={`/clients/${id}/cards/new`} look={cards.length === 0 ? 'primary' : 'plain'}>
                  <Ruler size={18} aria-hidden />
                  New measure card
                </ButtonLink>
              )
            }
          >
            {cards.length === 0 ? (
              <p className="text-walnut">
                No measurements yet. Take them once, and every draft starts from them.
              </p>
            ) : (
              <CardRows cards={cards} />
            )}
          </Card>
          <Card title="Drafts">
            {drafts.items.length === 0 ? (
              <p className="text-walnut">
                {cards.length === 0
                  ? 'A draft starts from a measure card: add one first.'
                  : 'Nothing drafted yet. Choose a garment and a measure card with “New draft”.'}
              </p>
            ) : (
              <DraftRows drafts={drafts.items} withClient={false} makers={makers} />
            )}
            {drafts.pages > 1 && (
              <p className="mt-4 text-sm">
                <Link href="/drafts" className="text-indigo underline underline-offset-4">
                  All {drafts.total} drafts
                </Link>
              </p>
            )}
          </Card>
          {may(actor, 'blocks', 'write') && (drafts.items.length > 0 || blocks.length > 0) && (
            <BlocksCard
              clientId={id}
              blocks={blocks.map(({ garment, draftId, draftName, versionName, setAt }) => ({
                garment,
                garmentName: garmentName(garment),
                draftId,
                draftName,
                version: versionName ?? `as it was on ${dayText(setAt)}`,
              }))}
              drafts={drafts.items.map((draft) => ({ id: draft.id, name: draft.name }))}
            />
          )}
        </div>
        <Card title="Contact">
          <dl className="grid gap-3">
            <Known term="Telephone">
              {client.phone && (
                <a
                  href={`tel:${client.phone.replaceAll(/[^\d+]/g, '')}`}
                  className="text-indigo underline underline-offset-4"
                >
                  {client.phone}
                </a>
              )}
            </Known>
            <Known term="E-mail">
              {client.email && (
                <a
                  href={`mailto:${client.email}`}
                  className="break-all text-indigo underline underline-offset-4"
                >
                  {client.email}
                </a>
              )}
            </Known>
            <Known term="Notes">
              {client.note && <span className="whitespace-pre-line">{client.note}</span>}
            </Known>
            <Known term="Last change">{dayText(client.updatedAt)}</Known>
          </dl>
          {writable && (
            <div className="mt-5 flex flex-wrap gap-2">
              <ButtonLink href={`/clients/${id}/edit`}>
                <Pencil size={16} aria-hidden />
                Change
              </ButtonLink>
              <ArchiveButton id={id} archived={client.archived} />
            </div>
          )}
        </Card>
      </div>
    </Page>
  )
}

function Known({ term, children }: { term: string; children: React.ReactNode }) {
  return (
    <div>
      <dt className="text-sm text-walnut">{term}</dt>
      <dd>{children || '–'}</dd>
    </div>
  )
}
