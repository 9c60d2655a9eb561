import { UserPlus } from 'lucide-react'
import type { Metadata } from 'next'
import Link from 'next/link'
import { forPage, requireActor } from '@/app/_server/session'
import { Pager } from '@/components/tables/pager'
import { SearchForm } from '@/components/tables/search-form'
import { SortLink } from '@/components/tables/sort-link'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { Page } from '@/components/ui/page'
import { Table } from '@/components/ui/table'
import { listClients } from '@/db/access/clients'
import { may } from '@/db/permissions'
import { dayText } from '../_data/dates'
import { addressOf, one, pageNumber, type SearchParams } from '../_data/list-address'

export const metadata: Metadata = { title: 'Clients' }

export default async function ClientsPage({ searchParams }: { searchParams: SearchParams }) {
  const actor = await requireActor('/clients')
  const asked = await searchParams
  const search = (one(asked.search) ?? '').slice(0, 100)
  const sort = one(asked.sort) === 'updatedAt' ? 'updatedAt' : 'name'
  const direction = one(asked.direction) === 'desc' ? 'desc' : 'asc'
  const archived = one(asked.archived) === 'yes'
  const list = await forPage(
    listClients(actor, { search, sort, direction, archived, page: pageNumber(asked.page) }),
  )
  const writable = may(actor, 'clients', 'write')
  const address = (change: Readonly<Record<string, string | number | undefined>>) =>
    addressOf('/clients', { search, sort, direction, archived: archived ? 'yes' : undefined, ...change })
  const sorting = (column: 'name' | 'updatedAt') =>
    sort === column ? (direction === 'asc' ? ('ascending' as const) : ('descending' as const)) : undefined
  const turned = (column: 'name' | 'updatedAt') =>
    address({ sort: column, direction: sorting(column) === 'ascending' ? 'desc' : 'asc', page: undefined })
  const add = writable && (
    <ButtonLink href="/clients/new" look="primary">
      <UserPlus size={18} aria-hidden />
      Add a client
    </ButtonLink>
  )

  return (
    <Page title={archived ? 'Clients put away' : 'Clients'} actions={add}>
      {(list.total > 0 || search) && (
        <SearchForm
          action="/clients"
          label="Search clients"
          search={search}
          kept={archived ? { archived: 'yes' } : {}}
        />
      )}
      {list.items.length > 0 && (
        <Table
          caption="Clients"
          rows={list.items}
          rowKey={(client) => client.id}
          columns={[
            {
              id: 'name',
              head: <SortLink label="Name" sorted={sorting('name')} href={turned('name')} />,
              sorted: sorting('name'),
              cell: (client) => (
                <Link
                  href={`/clients/${client.id}`}
                  className="font-semibold decoration-rule underline-offset-4 hover:text-indigo hover:underline"
                >
                  {client.name}
                </Link>
              ),
            },
            { id: 'phone', head: 'Telephone', cell: (client) => client.phone },
            { id: 'email', head: 'E-mail', cell: (client) => client.email },
            {
              id: 'updatedAt',
              head: <SortLink label="Last change" sorted={sorting('updatedAt')} href={turned('updatedAt')} />,
              sorted: sorting('updatedAt'),
              end: true,
              cell: (client) => dayText(client.updatedAt),
            },
          ]}
        />
      )}
      {list.items.length === 0 && search && (
        <EmptyState title={`Nobody is found for “${search}”`}>
          <p>Part of a name, an e-mail address or a telephone number is enough.</p>
        </EmptyState>
      )}
      {list.items.length === 0 && !search && (
        <EmptyState title={archived ? 'Nobody is put away' : 'No clients yet'} action={!archived && add}>
          <p>A client is the person a garment is made for. Add one, take the measurements, and draft.</p>
        </EmptyState>
      )}
      <Pager {...list} what="clients" href={(page) => address({ page })} />
      {writable && (
        <p className="mt-8 text-sm">
          <Link
            href={archived ? '/clients' : '/clients?archived=yes'}
            className="text-indigo underline underline-offset-4"
          >
            {archived ? 'Back to the clients' : 'Clients put away'}
          </Link>
        </p>
      )}
    </Page>
  )
}
