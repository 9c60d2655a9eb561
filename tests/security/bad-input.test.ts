import { describe, expect, it } from 'vitest'
import { newId } from '@/db/new-id'
import { Visitor } from '../support/visitor'
import { makeWorkroom } from '../support/workroom'

const inviteName = 'app/(workroom)/members/actions.ts#invite'

async function owner(): Promise<Visitor> {
  const { actor } = await (await makeWorkroom()).person('owner')
  return Visitor.signedIn(actor.sessionId)
}

describe('a server action', () => {
  it.each([
    ['nothing', null],
    ['a number', 7],
    ['a list', [1, 2, 3]],
    ['a text', 'hello'],
    ['a deep thing', JSON.parse(`${'{"a":'.repeat(500)}1${'}'.repeat(500)}`)],
    ['an operator', { id: { ne: '' }, email: { like: '%' }, roles: ['owner'] }],
    ['numbers for text', { id: 1e308, email: -1, roles: [0] }],
    [
      'a list too long',
      { id: newId(), email: 'a@b.example', roles: Array.from({ length: 10_000 }, () => 'owner') },
    ],
    ['a prototype', { id: newId(), email: 'a@b.example', roles: ['maker'], constructor: { prototype: {} } }],
  ])('answers %s with what is wrong, never with a failure', async (_what, input) => {
    const reply = await (await owner()).action(inviteName, input)
    expect(reply.status).toBeLessThan(500)
    expect(reply.answer).toMatchObject({ ok: false })
    expect(reply.answer?.problems?.[0]?.message).not.toMatch(/on our side|sql|undefined|\bat \//i)
  })

  it('refuses ten megabytes without falling over', async () => {
    const visitor = await owner()
    const input = { id: newId(), email: 'x'.repeat(10_000_000), roles: ['maker'] }
    const reply = await visitor.action(inviteName, input).catch(() => null)
    expect(reply?.answer?.ok ?? false).toBe(false)
    expect((await visitor.get('/members')).status).toBe(200)
  })
})

describe('a page', () => {
  it.each([
    '/reset?token=',
    '/reset?token=a&token=b',
    `/invitation?token=${'x'.repeat(5000)}`,
    '/join/confirm?token=%00',
  ])('%s says that the link works no more', async (path) => {
    const { status, text } = await new Visitor().get(path)
    expect(status).toBe(200)
    expect(text).toContain('This link works no more')
  })
})
