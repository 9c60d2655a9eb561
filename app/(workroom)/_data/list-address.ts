/** What a list's address says: strings only; the access functions check them. */
export type SearchParams = Promise<Readonly<Record<string, string | string[] | undefined>>>

/** One parameter of an address; the first when it stands there twice. */
export function one(value: string | string[] | undefined): string | undefined {
  return Array.isArray(value) ? value[0] : value
}

/** A page's number from an address: 1 for anything that is none. */
export function pageNumber(value: string | string[] | undefined): number {
  const page = Number(one(value))
  return Number.isInteger(page) && page >= 1 && page <= 100_000 ? page : 1
}

/** An address with parameters; what is empty or undefined is left out. */
export function addressOf(
  path: string,
  parameters: Readonly<Record<string, string | number | undefined>>,
): string {
  const search = new URLSearchParams()
  for (const [name, value] of Object.entries(parameters)) {
    if (value !== undefined && value !== '') search.set(name, String(value))
  }
  const text = search.toString()
  return text ? `${path}?${text}` : path
}
