import { invalid } from '@/db/access-error'
import { sizeTables } from '@/drafting/body'

/** What every garment needs and nothing should estimate: sizes whose table does not give it are not offered. */
const needed = ['bust', 'waist', 'hip'] as const

const offered = sizeTables.flatMap((table) =>
  table.sizes
    .filter((size) => needed.every((id) => size.card[id] !== undefined))
    .map(({ id, name, card }) => ({ id, name: `${table.name}, ${name}`, card })),
)

/** Published sizes that can be drafted on, by id and name, for drafts that are for nobody in particular. */
export function publishedSizes(): readonly { readonly id: string; readonly name: string }[] {
  return offered.map(({ id, name }) => ({ id, name }))
}

/** The measurements of a published size, mm. @throws AccessError invalid when there is none of that id */
export function publishedSize(id: string | undefined): Readonly<Record<string, { readonly mm: number }>> {
  const size = offered.find((each) => each.id === id)
  if (!size) throw invalid('sizeId', 'Choose a size from the list.')
  return Object.fromEntries(Object.entries(size.card).map(([measurement, mm]) => [measurement, { mm }]))
}
