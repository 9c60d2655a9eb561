import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { encode } from 'next-auth/jwt'

const origin = () => process.env.APP_ORIGIN ?? ''

/** A cookie that carries a session, as the sign-in would have set it. */
export async function cookieFor(sessionId: string): Promise<string> {
  const secret = process.env.NEXTAUTH_SECRET ?? ''
  return `next-auth.session-token=${await encode({ token: { sessionId }, secret })}`
}

interface BuiltAction {
  readonly workers: Readonly<Record<string, unknown>>
  readonly filename: string
  readonly exportedName: string
}

/** Every server action of the build, by id. */
export function builtActions(): Readonly<Record<string, BuiltAction>> {
  const path = join(process.env.NEXT_DIST_DIR ?? '.next', 'server', 'server-reference-manifest.json')
  return (JSON.parse(readFileSync(path, 'utf8')) as { node: Record<string, BuiltAction> }).node
}

/** The path of a page that a server action is called from; ids in it are made up. */
function pageOf(action: BuiltAction): string {
  const page = Object.keys(action.workers)[0] ?? ''
  const path = page
    .replace(/^app/, '')
    .replace(/\/page$/, '')
    .replace(/\/\([^)]*\)/g, '')
  return path.replace(/\[[^\]]*\]/g, '00000000-0000-7000-8000-000000000000') || '/'
}

/** What came back: the status, the text, and the answer `{ok, …}` inside it when there is one. */
export interface Reply {
  readonly status: number
  readonly text: string
  readonly headers: Headers
  readonly answer?: {
    readonly ok: boolean
    readonly value?: unknown
    readonly problems?: { message: string }[]
  }
}

function answerIn(text: string): Reply['answer'] {
  for (const line of text.split('\n')) {
    const json = line.replace(/^[0-9a-f]+:/, '')
    if (!json.startsWith('{"ok":')) continue
    return JSON.parse(json) as Reply['answer']
  }
  return undefined
}

/** Somebody who talks to the running application as a browser would, with or without a session. */
export class Visitor {
  constructor(private readonly cookie?: string) {}

  static async signedIn(sessionId: string): Promise<Visitor> {
    return new Visitor(await cookieFor(sessionId))
  }

  async send(path: string, init: RequestInit = {}): Promise<Reply> {
    const headers = new Headers(init.headers)
    if (this.cookie) headers.set('cookie', this.cookie)
    const response = await fetch(`${origin()}${path}`, { redirect: 'manual', ...init, headers })
    const text = await response.text()
    return { status: response.status, text, headers: response.headers, answer: answerIn(text) }
  }

  get(path: string): Promise<Reply> {
    return this.send(path, { headers: { 'sec-fetch-site': 'same-origin' } })
  }

  /** Sends JSON from one of our own pages. */
  json(method: string, path: string, body: unknown, headers: Record<string, string> = {}): Promise<Reply> {
    return this.send(path, {
      method,
      headers: { 'content-type': 'application/json', 'sec-fetch-site': 'same-origin', ...headers },
      body: JSON.stringify(body),
    })
  }

  /**
   * Calls a server action as the page would.
   * @param name as `app/…/actions.ts#name`
   * @param headers replace those that say where the call comes from
   */
  async action(
    name: string,
    input: unknown,
    headers: Record<string, string> = { origin: origin(), 'sec-fetch-site': 'same-origin' },
  ): Promise<Reply> {
    const [filename, exportedName] = name.split('#')
    const found = Object.entries(builtActions()).find(
      ([, action]) => action.filename === filename && action.exportedName === exportedName,
    )
    if (!found) throw new Error(`The build has no action ${name}.`)
    return this.send(pageOf(found[1]), {
      method: 'POST',
      headers: { 'next-action': found[0], 'content-type': 'text/plain;charset=UTF-8', ...headers },
      body: JSON.stringify([input]),
    })
  }
}
