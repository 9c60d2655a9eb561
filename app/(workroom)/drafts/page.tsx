import { Scissors } from 'lucide-react'
import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Pager } from '@/components/tables/pager'
import { SearchForm } from '@/components/tables/search-form'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { Page } from '@/components/ui/page'
import { listMakers } from '@/db/access/assigning'
import { listDrafts } from '@/db/access/drafts'
import { may, reachOf } from '@/db/permissions'
import { addressOf, one, pageNumber, type SearchParams } from '../_data/list-address'
import { DraftRows } from './_parts/draft-rows'

export const metadata: Metadata = { title: 'Drafts' }

export default async function DraftsPage({ searchParams }: { searchParams: SearchParams }) {
  const actor = await requireActor('/drafts')
  const asked = await searchParams
  const search = (one(asked.search) ?? '').slice(0, 100)
  const write = reachOf(actor, 'drafts', 'write')
  const [list, makers] = await forPage(
    Promise.all([
      listDrafts(actor, { search, page: pageNumber(asked.page) }),
      write.has('all') ? listMakers(actor) : [],
    ]),
  )
  const add = write.size > 0 && (
    <ButtonLink href="/drafts/new" look="primary">
      <Scissors size={18} aria-hidden />
      New draft
    </ButtonLink>
  )
  return (
    <Page title="Drafts" actions={add}>
      {(list.total > 0 || search) && <SearchForm action="/drafts" label="Search drafts" search={search} />}
      {list.items.length > 0 && (
        <DraftRows drafts={list.items} withClient={may(actor, 'clients', 'read')} makers={makers} />
      )}
      {list.items.length === 0 && (
        <EmptyState
          title={
            search ? `No draft is found for “${search}”` : add ? 'No drafts yet' : 'Nothing to make up yet'
          }
          action={!search && add}
        >
          <p>
            {search
              ? 'Part of a draft’s name is enough.'
              : add
                ? 'A draft is a garment and a measure card: the pattern follows from them, and redraws as you type.'
                : 'Drafts stand here once the owner or a drafter gives them to you to make up.'}
          </p>
        </EmptyState>
      )}
      <Pager {...list} what="drafts" href={(page) => addressOf('/drafts', { search, page })} />
    </Page>
  )
}
