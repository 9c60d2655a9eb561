import { Scissors } from 'lucide-react'
import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Pager } from '@/components/tables/pager'
import { SearchForm } from '@/components/tables/search-form'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { Page } from '@/components/ui/page'
import { listDrafts } from '@/db/access/drafts'
import { may } from '@/db/permissions'
import { addressOf, one, pageNumber, type SearchParams } from '../_data/list-address'
import { DraftRows } from './_parts/draft-rows'

export const metadata: Metadata = { title: 'Drafts' }

export default async function DraftsPage({ searchParams }: { searchParams: SearchParams }) {
  const actor = await requireActor('/drafts')
  const asked = await searchParams
  const search = (one(asked.search) ?? '').slice(0, 100)
  const list = await forPage(listDrafts(actor, { search, page: pageNumber(asked.page) }))
  const add = may(actor, 'drafts', 'write') && (
    <ButtonLink href="/drafts/new" look="primary">
      <Scissors size={18} aria-hidden />
      New draft
    </ButtonLink>
  )
  return (
    <Page title="Drafts" actions={add}>
      {(list.total > 0 || search) && <SearchForm action="/drafts" label="Search drafts" search={search} />}
      {list.items.length > 0 && <DraftRows drafts={list.items} withClient={may(actor, 'clients', 'read')} />}
      {list.items.length === 0 && (
        <EmptyState
          title={search ? `No draft is found for “${search}”` : 'No drafts yet'}
          action={!search && add}
        >
          <p>
            {search
              ? 'Part of a draft’s name is enough.'
              : 'A draft is a garment and a measure card: the pattern follows from them, and redraws as you type.'}
          </p>
        </EmptyState>
      )}
      <Pager {...list} what="drafts" href={(page) => addressOf('/drafts', { search, page })} />
    </Page>
  )
}
