import { invalid } from '@/db/access-error'
import { sizeTables, type PublishedSize, type SizeTable } from '@/drafting/body'

/** Every published size by id and name, for drafts that are for nobody in particular. */
export function publishedSizes(): readonly { readonly id: string; readonly name: string }[] {
  return sizeTables.flatMap((table) =>
    table.sizes.map(({ id, name }) => ({ id, name: `${table.name}, ${name}` })),
  )
}

function whole(table: SizeTable): readonly PublishedSize[] {
  return table.sizes.filter((size) => needed.every((id) => size.card[id] !== undefined))
}

/** The measurements of a published size, mm. @throws AccessError invalid when there is none of that id */
export function publishedSize(id: string | undefined): Readonly<Record<string, { readonly mm: number }>> {
  const size = sizeTables.flatMap(whole).find((each) => each.id === id)
  if (!size) throw invalid('sizeId', 'Choose a size from the list.')
  return Object.fromEntries(Object.entries(size.card).map(([measurement, mm]) => [measurement, { mm }]))
}
