import { afterAll, beforeEach, describe, expect, it } from 'vitest'
import { changeRoles, setMemberDisabled } from '@/db/access/members'
import { Attempt } from '@/db/models/attempt'
import { Session } from '@/db/models/session'
import { User } from '@/db/models/user'
import { httpSignIn } from '../support/http-sign-in'
import { forgetTries } from '../support/tries'
import { Visitor, cookieFor } from '../support/visitor'
import { type Person, makeWorkroom, testPassword } from '../support/workroom'

beforeEach(forgetTries)
afterAll(forgetTries)

const day = 24 * 3_600_000

/** An owner on two devices; the second one's cookie was copied. */
async function onTwoDevices() {
  const workroom = await makeWorkroom()
  const person = await workroom.person('owner')
  const sign = () => httpSignIn({ email: person.email, password: testPassword })
  const [first, second] = [await sign(), await sign()]
  return {
    workroom,
    person,
    first: new Visitor(first.cookie ?? ''),
    second: new Visitor(second.cookie ?? ''),
  }
}

/** Whether the cookie opens a page that only an owner sees. */
async function opens(visitor: Visitor): Promise<boolean> {
  const { status, headers } = await visitor.get('/members')
  if (status === 307) expect(headers.get('location')).toContain('/sign-in')
  return status === 200
}

describe('a copied cookie', () => {
  it('is worth nothing after signing out, while other devices stay', async () => {
    const { first, second } = await onTwoDevices()
    expect(await opens(first)).toBe(true)
    await first.action('app/(auth)/actions.ts#signOut', {})
    expect(await opens(first)).toBe(false)
    expect(await opens(second)).toBe(true)
  })

  it('is worth nothing after the password was changed, on any device', async () => {
    const { first, second } = await onTwoDevices()
    const change = { current: testPassword, next: 'seven green buttons' }
    const { answer } = await first.action('app/(workroom)/account/actions.ts#setPassword', change)
    expect(answer).toMatchObject({ ok: true })
    expect([await opens(first), await opens(second)]).toEqual([false, false])
  })

  it('is replaced, in the same answer, on the device where the password was changed', async () => {
    const { first } = await onTwoDevices()
    const change = { current: testPassword, next: 'seven green buttons' }
    const { headers } = await first.action('app/(workroom)/account/actions.ts#setPassword', change)
    const [cookie = ''] = headers.getSetCookie().filter((each) => each.includes('session-token=ey'))
    expect(cookie).toMatch(/; HttpOnly/i)
    expect(cookie).toMatch(/; SameSite=lax/i)
    expect(await opens(new Visitor(cookie.split(';')[0]))).toBe(true)
  })

  it('is worth nothing once the person is disabled', async () => {
    const { first, person } = await onTwoDevices()
    await User.update({ disabledAt: new Date() }, { where: { id: person.actor.userId } })
    expect(await opens(first)).toBe(false)
  })

  it('is worth nothing when it was not used for two weeks, or is two months old', async () => {
    const { first, second, person } = await onTwoDevices()
    const { userId } = person.actor
    await Session.update({ lastSeenAt: new Date(Date.now() - 14.1 * day) }, { where: { userId } })
    expect(await opens(first)).toBe(false)
    await Session.update(
      { lastSeenAt: new Date(), startedAt: new Date(Date.now() - 60.1 * day) },
      { where: { userId } },
    )
    expect(await opens(second)).toBe(false)
  })

  it('is worth nothing when it was made up or altered', async () => {
    const { person } = await onTwoDevices()
    const cookie = await cookieFor(person.actor.sessionId)
    expect(await opens(new Visitor(cookie))).toBe(true)
    expect(await opens(new Visitor(`${cookie.slice(0, -3)}AAA`))).toBe(false)
    expect(await opens(new Visitor(`next-auth.session-token=${person.actor.sessionId}`))).toBe(false)
    const bearer = { authorization: `Bearer ${cookie.split('=')[1]}` }
    expect((await new Visitor().send('/members', { headers: bearer })).status).toBe(307)
  })
})

describe('on the very next request', () => {
  async function withHelper(): Promise<{ owner: Person; helper: Person; visitor: Visitor }> {
    const workroom = await makeWorkroom()
    const [owner, helper] = [await workroom.person('owner'), await workroom.person('owner', 'drafter')]
    return { owner, helper, visitor: await Visitor.signedIn(helper.actor.sessionId) }
  }

  it('a lost role counts', async () => {
    const { owner, helper, visitor } = await withHelper()
    expect((await visitor.get('/members')).status).toBe(200)
    await changeRoles(owner.actor, { membershipId: helper.actor.membershipId, roles: ['drafter'] })
    expect((await visitor.get('/members')).status).toBe(404)
    expect((await visitor.get('/account')).status).toBe(200)
  })

  it('a member who was shut out is led to the choice of workrooms', async () => {
    const { owner, helper, visitor } = await withHelper()
    await setMemberDisabled(owner.actor, { membershipId: helper.actor.membershipId, disabled: true })
    const { status, headers } = await visitor.get('/members')
    expect([status, headers.get('location')]).toEqual([307, '/workrooms'])
  })
})

describe('a session', () => {
  it('notes when it was last seen at most once a minute', async () => {
    const { first, person } = await onTwoDevices()
    const { userId } = person.actor
    const seen = async () =>
      (await Session.findAll({ where: { userId } })).map((row) => row.lastSeenAt.getTime())
    const before = await seen()
    await first.get('/members')
    expect(await seen()).toEqual(before)
    await Session.update({ lastSeenAt: new Date(Date.now() - 61_000) }, { where: { userId } })
    await first.get('/members')
    expect(Math.max(...(await seen()))).toBeGreaterThan(Date.now() - 10_000)
  })

  it('cannot be read or renewed round its row', async () => {
    const { first } = await onTwoDevices()
    for (const path of ['session', 'signout', 'signin', 'error', 'callback/credentials']) {
      const reply = await first.get(`/api/auth/${path}`)
      expect([path, reply.status]).toEqual([path, 404])
      expect(reply.headers.getSetCookie()).toEqual([])
    }
  })

  it('has a cookie that scripts and other sites cannot use', async () => {
    const { email } = await (await makeWorkroom()).person('owner')
    const { setCookie } = await httpSignIn({ email, password: testPassword })
    const cookie = setCookie.find((each) => each.includes('session-token')) ?? ''
    expect(cookie).toMatch(/HttpOnly/i)
    expect(cookie).toMatch(/SameSite=Lax/i)
  })
})

describe('signing in over HTTP', () => {
  it('answers a wrong password and an unknown address alike', async () => {
    const { email } = await (await makeWorkroom()).person('owner')
    const wrong = await httpSignIn({ email, password: 'not the password' })
    const unknown = await httpSignIn({ email: 'nobody@people.example', password: 'not the password' })
    expect(wrong).toMatchObject({ status: 401, cookie: null })
    expect([unknown.status, unknown.url]).toEqual([wrong.status, wrong.url])
  })

  it('needs the CSRF token and one of our own pages', async () => {
    const { email } = await (await makeWorkroom()).person('owner')
    const good = { email, password: testPassword }
    const forged = await httpSignIn({ ...good, csrfToken: 'made up' })
    expect(forged.cookie).toBeNull()
    const body = new URLSearchParams(good)
    const crossSite = await new Visitor().send('/api/auth/callback/credentials', {
      method: 'POST',
      headers: { origin: 'https://evil.example', 'sec-fetch-site': 'cross-site' },
      body,
    })
    expect(crossSite.status).toBe(403)
  })

  it.each(['https://evil.example/', '//evil.example', '/\\evil.example', 'javascript:alert(1)', '/a\tb'])(
    'never leaves for %s',
    async (callbackUrl) => {
      const { email } = await (await makeWorkroom()).person('owner')
      const { url, cookie } = await httpSignIn({ email, password: testPassword, callbackUrl })
      expect(new URL(url).origin).toBe(process.env.APP_ORIGIN)
      const page = await new Visitor(cookie ?? '').get(
        `/sign-in?callbackUrl=${encodeURIComponent(callbackUrl)}`,
      )
      expect([page.status, page.headers.get('location')]).toEqual([307, '/home'])
    },
  )

  it('goes back to the page that asked for it', async () => {
    const asked = await new Visitor().get('/members')
    expect(asked.headers.get('location')).toBe('/sign-in?callbackUrl=%2Fmembers')
  })

  it('counts by the address of the socket, whatever the visitor claims', async () => {
    for (const address of ['203.0.113.1', '203.0.113.2', '203.0.113.3'])
      await httpSignIn(
        { email: `x${address}@people.example`, password: 'wrong one' },
        { 'x-forwarded-for': address },
      )
    const counted = await Attempt.findAll({ where: { scope: 'sign-in address' } })
    expect(counted.map(({ count }) => count)).toEqual([3])
  })

  it('says when there were too many tries', async () => {
    const { email } = await (await makeWorkroom()).person('owner')
    for (let each = 0; each < 10; each += 1) await httpSignIn({ email, password: 'wrong one' })
    const { url, cookie } = await httpSignIn({ email, password: testPassword })
    expect(cookie).toBeNull()
    expect(new URL(url).searchParams.get('error')).toBe('limited')
  })
})

describe('joining and forgotten passwords', () => {
  it('answer a known and an unknown address alike', async () => {
    const { email } = await (await makeWorkroom()).person('owner')
    const unknown = 'nobody-yet@people.example'
    const visitor = new Visitor()
    for (const name of ['app/(auth)/join/actions.ts#join', 'app/(auth)/forgotten/actions.ts#askForReset']) {
      const rest = name.includes('join') ? { name: 'A', workroomName: 'B' } : {}
      const answers = await Promise.all(
        [email, unknown].map(
          async (address) => (await visitor.action(name, { email: address, ...rest })).answer,
        ),
      )
      expect(answers).toEqual([email, unknown].map((address) => ({ ok: true, value: { email: address } })))
    }
  })
})
