import { Visitor } from './visitor'

const pairsOf = (headers: Headers) =>
  headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0] ?? '')
    .join('; ')

export interface SignInReply {
  readonly status: number
  /** Where the answer sends the browser. */
  readonly url: string
  /** The session cookie, or null when there is none. */
  readonly cookie: string | null
  readonly setCookie: readonly string[]
}

/** Signs in over HTTP the way the page does: a CSRF token first, then the form. */
export async function httpSignIn(
  fields: Readonly<Record<string, string>>,
  headers: Readonly<Record<string, string>> = {},
): Promise<SignInReply> {
  const csrf = await new Visitor().get('/api/auth/csrf')
  const { csrfToken } = JSON.parse(csrf.text) as { csrfToken: string }
  const reply = await new Visitor(pairsOf(csrf.headers)).send('/api/auth/callback/credentials', {
    method: 'POST',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      'sec-fetch-site': 'same-origin',
      ...headers,
    },
    body: new URLSearchParams({ json: 'true', csrfToken, ...fields }),
  })
  const { url } = JSON.parse(reply.text) as { url: string }
  const setCookie = reply.headers.getSetCookie()
  const session = setCookie.find((each) => each.includes('session-token=ey'))
  return { status: reply.status, url, cookie: session?.split(';')[0] ?? null, setCookie }
}
