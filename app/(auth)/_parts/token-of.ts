export type Search = Promise<Readonly<Record<string, string | string[] | undefined>>>

/** The secret part of the link that was opened; empty when there is none. */
export async function tokenOf(search: Search): Promise<string> {
  const { token } = await search
  return typeof token === 'string' ? token : ''
}
