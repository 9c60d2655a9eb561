import Link from 'next/link'
import { SearchForm } from '@/components/tables/search-form'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'

/** Whom the draft is for, found by name. */
export function ClientChoice({
  clients,
  search,
}: {
  readonly clients: readonly { readonly id: string; readonly name: string }[]
  readonly search: string
}) {
  const forNobody = (
    <p className="mt-6">
      <ButtonLink href="/drafts/new?for=nobody">For nobody in particular: a published size</ButtonLink>
    </p>
  )
  if (clients.length === 0 && !search) {
    return (
      <>
        <EmptyState
          title="No clients yet"
          action={
            <ButtonLink href="/clients/new" look="primary">
              Add a client
            </ButtonLink>
          }
        >
          <p>Add the person first, take the measurements, then draft.</p>
        </EmptyState>
        {forNobody}
      </>
    )
  }
  return (
    <>
      <SearchForm action="/drafts/new" label="Search clients" search={search} />
      {clients.length === 0 && <p className="text-walnut">Nobody is found for “{search}”.</p>}
      <ul className="border hairline bg-sheet">
        {clients.map((client) => (
          <li key={client.id} className="border-b hairline last:border-b-0">
            <Link
              href={`/drafts/new?client=${client.id}`}
              className="flex min-h-11 items-center px-4 font-semibold hover:text-indigo"
            >
              {client.name}
            </Link>
          </li>
        ))}
      </ul>
      {forNobody}
    </>
  )
}
