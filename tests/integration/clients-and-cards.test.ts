import { beforeAll, describe, expect, it } from 'vitest'
import { createCard, getCard, listCards, updateCard } from '@/db/access/cards'
import { archiveClient, createClient, getClient, listClients, updateClient } from '@/db/access/clients'
import { assignDraft, listMakers } from '@/db/access/assigning'
import { listDrafts } from '@/db/access/drafts'
import type { Actor } from '@/db/permissions'
import { newId } from '@/db/new-id'
import { cardInput, clientInput, startDraft } from '../support/draft-inputs'
import { refusal } from '../support/refusal'
import { type Person, type TestWorkroom, makeWorkroom } from '../support/workroom'

let workroom: TestWorkroom
let owner: Person
let stranger: Person
beforeAll(async () => {
  workroom = await makeWorkroom()
  owner = await workroom.person('owner')
  stranger = await (await makeWorkroom()).person('owner')
})

describe('clients', () => {
  it('are found by any part of name, e-mail or telephone, what is typed meant literally', async () => {
    const { actor } = await (await makeWorkroom()).person('drafter')
    await createClient(actor, { ...clientInput('Zofia 100%'), email: 'zofia@sea.example' })
    await createClient(actor, { ...clientInput('Zoë'), phone: '+234 80 55' })
    const names = async (search: string) =>
      (await listClients(actor, { search })).items.map((client) => client.name)
    expect(await names('SEA.ex')).toEqual(['Zofia 100%'])
    expect(await names('80 5')).toEqual(['Zoë'])
    expect(await names('0%')).toEqual(['Zofia 100%'])
    expect(await names('_')).toEqual([])
    expect(await names("' OR 1=1 --")).toEqual([])
  })

  it('come in pages of fifty in a stable order', async () => {
    const { actor } = await (await makeWorkroom()).person('owner')
    for (let each = 0; each < 53; each += 1) await createClient(actor, clientInput('Same name'))
    const first = await listClients(actor, { sort: 'name' })
    const second = await listClients(actor, { sort: 'name', page: 2 })
    expect([first.items.length, second.items.length, first.total, first.pages]).toEqual([50, 3, 53, 2])
    expect(new Set([...first.items, ...second.items].map((client) => client.id)).size).toBe(53)
  })

  it('are made once when the same request is sent twice', async () => {
    const input = clientInput('Once')
    await createClient(owner.actor, input)
    await createClient(owner.actor, input)
    expect((await listClients(owner.actor, { search: 'Once' })).total).toBe(1)
  })

  it('leave the list when archived and come back', async () => {
    const input = clientInput('Hidden')
    await createClient(owner.actor, input)
    await archiveClient(owner.actor, input.id)
    expect((await listClients(owner.actor, { search: 'Hidden' })).total).toBe(0)
    expect((await listClients(owner.actor, { search: 'Hidden', archived: true })).total).toBe(1)
    await archiveClient(owner.actor, input.id, false)
    expect((await listClients(owner.actor, { search: 'Hidden' })).total).toBe(1)
  })

  it('of another workroom do not exist', async () => {
    const input = clientInput('Private')
    await createClient(owner.actor, input)
    await refusal(getClient(stranger.actor, input.id), 'not-found')
    await refusal(updateClient(stranger.actor, { ...input, name: 'Taken' }), 'not-found')
    await refusal(archiveClient(stranger.actor, input.id), 'not-found')
    await refusal(createClient(stranger.actor, input), 'conflict')
    expect((await getClient(owner.actor, input.id)).name).toBe('Private')
  })

  it('take no field that is not theirs', async () => {
    const sent = { ...clientInput(), workroomId: stranger.actor.workroomId, createdAt: '2020-01-01' }
    const { problems } = await refusal(createClient(owner.actor, sent), 'invalid')
    expect(problems.map((problem) => problem.field)).toEqual(['workroomId', 'createdAt'])
  })

  it.each([
    ['an id that is none', { id: 'first' }, 'id'],
    ['a list for a name', { name: ['a', 'b'] as never }, 'name'],
    ['an operator for a name', { name: { ne: '' } as never }, 'name'],
    ['an empty name', { name: '  ' }, 'name'],
    ['ten megabytes of note', { note: 'x'.repeat(10_000_000) }, 'note'],
    ['an address that is none', { email: 'not at all' }, 'email'],
  ])('refuse %s at its field', async (_what, change, field) => {
    const { problems } = await refusal(createClient(owner.actor, { ...clientInput(), ...change }), 'invalid')
    expect(problems.map((problem) => problem.field)).toContain(field)
  })
})

describe('measure cards', () => {
  it('keep what was typed beside the millimetres', async () => {
    const client = await createClient(owner.actor, clientInput())
    const input = cardInput()
    await createCard(owner.actor, { ...input, clientId: client.id })
    expect((await getCard(owner.actor, input.id)).values).toEqual(input.values)
  })

  it('replace all their measurements when they change', async () => {
    const client = await createClient(owner.actor, clientInput())
    const input = cardInput()
    await createCard(owner.actor, { ...input, clientId: client.id })
    const values = { hip: { mm: 980, typed: '98', unit: 'cm' as const } }
    await updateCard(owner.actor, { ...input, takenOn: '2026-11-30', values })
    expect(await listCards(owner.actor, client.id)).toMatchObject([{ takenOn: '2026-11-30', values }])
  })

  it.each([Number.NaN, Number.POSITIVE_INFINITY, 1e308, -1])('refuse a length of %d mm', async (mm) => {
    const values = { bust: { mm, typed: '36', unit: 'in' as const } }
    const { problems } = await refusal(
      createCard(owner.actor, { ...cardInput(), clientId: null, values }),
      'invalid',
    )
    expect(problems[0]?.field).toBe('values.bust.mm')
  })

  it('of another workroom do not exist, nor can one be put on its clients', async () => {
    const client = await createClient(owner.actor, clientInput())
    const input = cardInput()
    await createCard(owner.actor, { ...input, clientId: client.id })
    await refusal(getCard(stranger.actor, input.id), 'not-found')
    await refusal(updateCard(stranger.actor, input), 'not-found')
    await refusal(createCard(stranger.actor, { ...cardInput(), clientId: client.id }), 'not-found')
    expect(await listCards(stranger.actor, client.id)).toEqual([])
  })

  it('of a student are the own one only, and nobody else reads it', async () => {
    const student = await workroom.person('student')
    const input = cardInput()
    await createCard(student.actor, { ...input, clientId: null })
    expect(await listCards(student.actor, null)).toHaveLength(1)
    await refusal(getCard(owner.actor, input.id), 'not-found')
    await refusal(getCard((await workroom.person('student')).actor, input.id), 'not-found')
    const client = await createClient(owner.actor, clientInput())
    await refusal(createCard(student.actor, { ...cardInput(), clientId: client.id }), 'forbidden')
  })

  it('and the client of an assigned draft are all that a maker sees', async () => {
    const maker = await workroom.person('maker')
    const client = await createClient(owner.actor, clientInput('For the maker'))
    const other = await createClient(owner.actor, clientInput('Somebody else'))
    const card = cardInput()
    await createCard(owner.actor, { ...card, clientId: client.id })
    const draft = await startDraft(owner.actor, { clientId: client.id, cardId: card.id })
    expect((await listClients(maker.actor)).total).toBe(0)
    await assignDraft(owner.actor, draft.id, maker.actor.membershipId)
    expect((await listClients(maker.actor)).items.map((each) => each.name)).toEqual(['For the maker'])
    expect((await getCard(maker.actor, card.id)).values.bust?.typed).toBe('36 1/2')
    await refusal(getClient(maker.actor, other.id), 'not-found')
    await refusal(updateCard(maker.actor, card), 'forbidden')
  })

  it('go with the draft: given on or taken back, the maker sees it no more', async () => {
    const [maker, other] = [await workroom.person('maker'), await workroom.person('maker')]
    const draft = await startDraft(owner.actor)
    const seen = async (actor: Actor) => (await listDrafts(actor)).items.map(({ id }) => id)
    const given = await assignDraft(owner.actor, draft.id, maker.actor.membershipId)
    expect(given.assignedToName).toBe('Test maker')
    expect([await seen(maker.actor), await seen(other.actor)]).toEqual([[draft.id], []])
    await assignDraft(owner.actor, draft.id, other.actor.membershipId)
    expect([await seen(maker.actor), await seen(other.actor)]).toEqual([[], [draft.id]])
    await assignDraft(owner.actor, draft.id, null)
    expect([await seen(maker.actor), await seen(other.actor)]).toEqual([[], []])
  })

  it('are given to makers of the workroom only, by its owner and drafters only', async () => {
    const [maker, tutor] = [await workroom.person('maker'), await workroom.person('tutor')]
    const stranger = await (await makeWorkroom()).person('maker')
    const draft = await startDraft(owner.actor)
    for (const { actor } of [tutor, stranger])
      await refusal(assignDraft(owner.actor, draft.id, actor.membershipId), 'invalid')
    const own = await startDraft(tutor.actor)
    await refusal(assignDraft(tutor.actor, own.id, maker.actor.membershipId), 'forbidden')
    await refusal(listMakers(maker.actor), 'forbidden')
    const makers = (await listMakers(owner.actor)).map(({ membershipId }) => membershipId)
    expect(makers).toContain(maker.actor.membershipId)
    expect(makers).not.toContain(tutor.actor.membershipId)
  })

  it('are not for tutors', async () => {
    const tutor = await workroom.person('tutor')
    await refusal(listClients(tutor.actor), 'forbidden')
    await refusal(getCard(tutor.actor, newId()), 'forbidden')
  })
})
