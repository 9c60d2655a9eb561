/** Where people land when nothing better is known: it leads on to where their work begins. */
export const homePath = '/home'

/**
 * A place inside Chalkfold to go to after signing in. Whatever would leave the origin (another host, `//host`, `/\host`,
 * `javascript:`) becomes the home page.
 * @param wanted a path, or an address as next-auth passes it on
 * @returns a path that begins with one slash
 */
export function safePath(wanted: string | null | undefined): string {
  const base = 'https://inside.invalid'
  if (!wanted || !wanted.startsWith('/') || /[\\\p{Cc}]/u.test(wanted) || wanted.startsWith('//'))
    return homePath
  if (!URL.canParse(wanted, base)) return homePath
  const url = new URL(wanted, base)
  return url.origin === base ? `${url.pathname}${url.search}${url.hash}` : homePath
}
