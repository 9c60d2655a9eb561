import { invalid } from '@/db/access-error'
import { sizeTables } from '@/drafting/body'

/** What every garment needs and nothing should estimate: sizes whose table does not give it are not offered. */
const needed = ['bust', 'waist', 'hip'] as const

const tables = sizeTables
  .map(({ name, sizes }) => ({
    name,
    sizes: sizes.filter((size) => needed.every((id) => size.card[id] !== undefined)),
  }))
  .filter(({ sizes }) => sizes.length > 0)

const offered = tables.flatMap(({ sizes }) => sizes)

export interface SizeTable {
  readonly name: string
  readonly sizes: readonly { readonly id: string; readonly name: string }[]
}

/** Published sizes that can be drafted on, table by table, for drafts that are for nobody in particular. */
export function publishedSizes(): readonly SizeTable[] {
  return tables.map(({ name, sizes }) => ({ name, sizes: sizes.map(({ id, name }) => ({ id, name })) }))
}

/** The size in the middle of the first table: what pictures are drawn on and the choice of a size begins with. */
export function middleSize(): { readonly id: string; readonly card: Readonly<Record<string, number>> } {
  const sizes = tables[0]?.sizes ?? []
  const size = sizes[Math.floor((sizes.length - 1) / 2)]
  if (!size) throw new Error('No published size gives bust, waist and hip.')
  return size
}

/** The measurements of a published size, mm. @throws AccessError invalid when there is none of that id */
export function publishedSize(id: string | undefined): Readonly<Record<string, { readonly mm: number }>> {
  const size = offered.find((each) => each.id === id)
  if (!size) throw invalid('sizeId', 'Choose a size from the list.')
  return Object.fromEntries(Object.entries(size.card).map(([measurement, mm]) => [measurement, { mm }]))
}
