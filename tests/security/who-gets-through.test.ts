import { afterAll, describe, expect, it } from 'vitest'
import { Membership } from '@/db/models/membership'
import { type Actor, type Role, roles } from '@/db/permissions'
import { forgetTries } from '../support/tries'
import { makeThings } from '../support/things'
import { type Reply, Visitor, builtActions } from '../support/visitor'
import { type TestWorkroom, makeWorkroom } from '../support/workroom'
import { type Endpoint, type Things, endpoints } from './endpoints'

type Caller = Role | 'stranger' | 'expelled' | 'anonymous'
const callers: readonly Caller[] = [...roles, 'stranger', 'expelled', 'anonymous']

afterAll(forgetTries)

interface Scene {
  readonly workroom: TestWorkroom
  readonly owner: Actor
  readonly things: Things
}

/** A workroom with one of everything in it; new for each test, because endpoints change what they are tried on. */
async function scene(): Promise<Scene> {
  const workroom = await makeWorkroom()
  const { actor } = await workroom.person('owner')
  return { workroom, owner: actor, things: await makeThings(workroom, actor) }
}

/** The owner who calls is the one whose things they are: some belong to a person, not to the workroom. */
async function visitorFor(caller: Caller, { workroom, owner }: Scene): Promise<Visitor> {
  if (caller === 'anonymous') return new Visitor()
  if (caller === 'owner') return Visitor.signedIn(owner.sessionId)
  const home = caller === 'stranger' ? await makeWorkroom() : workroom
  const { actor } = await home.person(caller === 'stranger' || caller === 'expelled' ? 'owner' : caller)
  if (caller === 'expelled')
    await Membership.update({ disabledAt: new Date() }, { where: { id: actor.membershipId } })
  return Visitor.signedIn(actor.sessionId)
}

const query = (input: Record<string, unknown>) =>
  new URLSearchParams(Object.entries(input).map(([name, value]) => [name, String(value)])).toString()

function call(visitor: Visitor, name: string, { path, input }: Endpoint, things: Things): Promise<Reply> {
  if (!path) return visitor.action(name, input(things))
  const [method = 'GET'] = name.split(' ')
  if (method === 'GET') return visitor.get(`${path(things)}?${query(input(things))}`)
  return visitor.json(method, path(things), input(things))
}

/** What a refusal is about, read from its words, because a server action has no status of its own. */
function kindOf({ answer, status }: Reply): string {
  const message = answer?.problems?.[0]?.message ?? ''
  if (answer?.ok || (answer === undefined && status < 400)) return 'through'
  if (/signed out/.test(message)) return 'not signed in'
  if (/does not allow|no longer a member|own pages|own measurements/.test(message)) return 'forbidden'
  if (/does not exist/.test(message)) return 'not found'
  if (/on our side|cannot be reached/.test(message)) return 'broken'
  return 'through'
}

function expected(caller: Caller, { access, stranger, outOfReach = [] }: Endpoint): string {
  if (access === 'anybody') return 'through'
  if (caller === 'anonymous') return 'not signed in'
  if (access === 'signed-in') return stranger === 'not-found' ? 'not found' : 'through'
  if (caller === 'expelled') return 'forbidden'
  if (caller === 'stranger') return stranger === 'own' ? 'through' : 'not found'
  if (access.includes(caller)) return 'through'
  return outOfReach.includes(caller) ? 'not found' : 'forbidden'
}

const all = Object.entries(endpoints)

describe.each(all)('%s', (name, endpoint) => {
  it.each(callers)('for %s', async (caller) => {
    const made = await scene()
    const { things } = made
    const reply = await call(await visitorFor(caller, made), name, endpoint, things)
    expect(reply.status).not.toBe(500)
    expect(kindOf(reply), reply.text.slice(0, 500)).toBe(expected(caller, endpoint))
  })
})

it.each(all.filter(([, { plain }]) => !plain))(
  '%s refuses fields that are not its own',
  async (name, endpoint) => {
    const made = await scene()
    const { things } = made
    const input = () => ({ ...endpoint.input(things), price: 1 })
    const reply = await call(await visitorFor('owner', made), name, { ...endpoint, input }, things)
    expect(reply.answer).toMatchObject({ ok: false })
    expect(JSON.stringify(reply.answer)).toContain('"field":"price"')
  },
)

const elsewhere = [
  ['another site', { origin: 'https://evil.example', 'sec-fetch-site': 'cross-site' }],
  ['a page that does not say so', {}],
] as const
const changing = all.filter(([name]) => !/^(GET|HEAD) /.test(name))

describe.each(elsewhere)('a call from %s', (_where, from) => {
  it.each(changing)('is refused by %s', async (name, { path, input }) => {
    const made = await scene()
    const { things } = made
    const visitor = await visitorFor('owner', made)
    const [method] = name.split(' ')
    const body = JSON.stringify(input(things))
    const headers = { 'content-type': 'application/json', ...from }
    const reply = path
      ? await visitor.send(path(things), { method, headers, body })
      : await visitor.action(name, input(things), { ...from })
    expect(reply.answer?.ok ?? false).toBe(false)
    if (path) expect(reply.status).toBe(403)
  })
})

it('knows every server action of the build', () => {
  const built = Object.values(builtActions()).map(
    ({ filename, exportedName }) => `${filename}#${exportedName}`,
  )
  expect(built.filter((name) => !(name in endpoints))).toEqual([])
  expect(built.length).toBeGreaterThan(0)
})
