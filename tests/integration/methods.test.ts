import { beforeAll, describe, expect, it } from 'vitest'
import { createCard, getCard } from '@/db/access/cards'
import { getDraft } from '@/db/access/drafts'
import {
  archiveMethod,
  copyMethod,
  createMethod,
  getMethod,
  listMethods,
  updateMethod,
} from '@/db/access/methods'
import {
  archiveOwnMeasurement,
  createOwnMeasurement,
  engineMeasurements,
  getOwnMeasurement,
  listOwnMeasurements,
  updateOwnMeasurement,
} from '@/db/access/own-measurements'
import { newId } from '@/db/new-id'
import { draftGarment, methods } from '@/drafting'
import { sanityBodies } from '../support/bodies'
import { cardInput, startDraft } from '../support/draft-inputs'
import { refusal } from '../support/refusal'
import { makeWorkroom, type Person, type TestWorkroom } from '../support/workroom'

let workroom: TestWorkroom
let owner: Person
let stranger: Person
beforeAll(async () => {
  workroom = await makeWorkroom()
  owner = await workroom.person('owner')
  stranger = await (await makeWorkroom()).person('owner')
})

const depth = (formula: string) => ({
  'flared-dress': [{ id: 'armholeDepth', formula, source: 'our school' }],
})
const methodInput = (name: string, formula = 'bust / 8 + 9.5cm') => ({
  id: newId(),
  name,
  description: 'As we teach it.',
  garments: depth(formula),
})
const cm = (typed: string) => ({ mm: Number(typed) * 10, typed, unit: 'cm' as const })
const ownInput = (measurement: string, place = 0) => ({
  id: newId(),
  measurement,
  name: 'Back arc',
  how: 'Round the back from side to side.',
  place,
  least: cm('30'),
  most: cm('80'),
})

describe('a workroom’s drafting methods', () => {
  it('are made once when the same request is sent twice, and listed by name', async () => {
    const { actor } = await (await makeWorkroom()).person('tutor')
    const input = methodInput('Ours')
    await createMethod(actor, input)
    await createMethod(actor, input)
    await createMethod(actor, methodInput('Another'))
    expect((await listMethods(actor)).map(({ name }) => name)).toEqual(['Another', 'Ours'])
    expect(await getMethod(actor, input.id)).toMatchObject({ version: 1, garments: input.garments })
  })

  it('start as a copy of a built-in one and draft alike', async () => {
    const id = newId()
    const copy = await copyMethod(owner.actor, { id, name: 'Our handbook', from: 'handbook' })
    expect(copy).toMatchObject({ copiedFrom: 'handbook', version: 1 })
    const order = { garment: 'bodice', measurements: sanityBodies.one }
    const rules = copy.garments.bodice ?? []
    expect(draftGarment({ ...order, method: { id, version: 1, rules } })).toEqual(
      draftGarment({ ...order, method: { id: 'handbook' } }),
    )
    const { problems } = await refusal(
      copyMethod(owner.actor, { id: newId(), name: 'None', from: 'nobody' }),
      'invalid',
    )
    expect(problems[0]?.field).toBe('from')
  })

  it('are changed on the version that was seen: the second of two is told', async () => {
    const input = methodInput('Changing')
    await createMethod(owner.actor, input)
    const second = await updateMethod(owner.actor, {
      ...input,
      garments: depth('bust / 6 + 4cm'),
      version: 1,
    })
    expect(second.version).toBe(2)
    const late = { ...input, name: 'Mine', version: 1 }
    const { message } = await refusal(updateMethod(owner.actor, late), 'conflict')
    expect(message).toContain('meanwhile')
    expect(await getMethod(owner.actor, input.id)).toMatchObject({ name: 'Changing', version: 2 })
  })

  it('of two changes at the same moment one stands', async () => {
    const input = methodInput('Raced')
    await createMethod(owner.actor, input)
    const tries = ['One', 'Two', 'Three'].map((name) =>
      updateMethod(owner.actor, { ...input, name, version: 1 }),
    )
    const done = await Promise.allSettled(tries)
    expect(done.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    expect((await getMethod(owner.actor, input.id)).version).toBe(2)
  })

  it('leave old drafts as they were', async () => {
    const input = methodInput('Followed')
    const method = await createMethod(owner.actor, input)
    const rules = method.garments['flared-dress'] ?? []
    const order = {
      garment: 'flared-dress',
      measurements: sanityBodies.one,
      method: { id: method.id, name: method.name, version: method.version, rules },
    }
    const draft = await startDraft(owner.actor, { order })
    const before = draftGarment((await getDraft(owner.actor, draft.id)).head.order)
    await updateMethod(owner.actor, { ...input, garments: depth('bust / 5 + 4cm'), version: 1 })
    const kept = (await getDraft(owner.actor, draft.id)).head.order
    expect(kept.method).toEqual(order.method)
    expect(draftGarment(kept)).toEqual(before)
  })

  it('are refused with every formula at fault at its field', async () => {
    const garments = {
      'flared-dress': [
        { id: 'armholeDepth', formula: 'bust +', source: '' },
        { id: 'neckWidth', formula: 'bust * bust', source: '' },
      ],
      cloak: [{ id: 'length', formula: '1cm', source: '' }],
    }
    const { problems } = await refusal(
      createMethod(owner.actor, { ...methodInput('Wrong'), garments }),
      'invalid',
    )
    expect(problems.map(({ field }) => field).sort()).toEqual([
      'garments.cloak',
      'garments.flared-dress.armholeDepth',
      'garments.flared-dress.neckWidth',
    ])
    const good = methodInput('Good at first')
    await createMethod(owner.actor, good)
    await refusal(updateMethod(owner.actor, { ...good, garments, version: 1 }), 'invalid')
  })

  it.each([
    ['an unknown field', { workroomId: newId() }, 'workroomId'],
    ['no name', { name: '  ' }, 'name'],
    ['rules that are no list', { garments: { bodice: {} } }, 'garments.bodice'],
    [
      'ten megabytes of formula',
      { garments: depth('1'.repeat(10_000_000)) },
      'garments.flared-dress.0.formula',
    ],
    ['a garment that is no name', { garments: { 'a dress!': [] } }, 'garments.a dress!'],
  ])('are refused with %s', async (_, change, field) => {
    const sent = { ...methodInput('Refused'), ...change } as never
    const { problems } = await refusal(createMethod(owner.actor, sent), 'invalid')
    expect(problems.map((problem) => problem.field)).toContain(field)
  })

  it('leave the list when archived and come back', async () => {
    const { actor } = await (await makeWorkroom()).person('owner')
    const input = methodInput('Put away')
    await createMethod(actor, input)
    await archiveMethod(actor, input.id)
    expect(await listMethods(actor)).toEqual([])
    expect(await listMethods(actor, { archived: true })).toHaveLength(1)
    await archiveMethod(actor, input.id, false)
    expect(await listMethods(actor)).toHaveLength(1)
  })

  it('of another workroom do not exist', async () => {
    const input = methodInput('Private')
    await createMethod(owner.actor, input)
    await refusal(getMethod(stranger.actor, input.id), 'not-found')
    await refusal(updateMethod(stranger.actor, { ...input, version: 1 }), 'not-found')
    await refusal(archiveMethod(stranger.actor, input.id), 'not-found')
    await refusal(createMethod(stranger.actor, input), 'conflict')
    expect((await listMethods(stranger.actor)).map(({ id }) => id)).not.toContain(input.id)
  })
})

describe('a workroom’s own measurements', () => {
  it('are listed in the order in which they are taken', async () => {
    const { actor } = await (await makeWorkroom()).person('drafter')
    await createOwnMeasurement(actor, { ...ownInput('front_arc', 2), name: 'Front arc' })
    await createOwnMeasurement(actor, ownInput('back_arc', 1))
    expect((await listOwnMeasurements(actor)).map(({ measurement }) => measurement)).toEqual([
      'back_arc',
      'front_arc',
    ])
    expect((await engineMeasurements(actor))[0]).toEqual({
      id: 'back_arc',
      name: 'Back arc',
      how: 'Round the back from side to side.',
      min: 300,
      max: 800,
    })
  })

  it('stand on a card and in the rules of a method, and are drafted with', async () => {
    const { actor } = await (await makeWorkroom()).person('owner')
    const own = ownInput('back_arc')
    await createOwnMeasurement(actor, own)
    const card = { ...cardInput(), clientId: null, values: { back_arc: cm('46') } }
    await createCard(actor, card)
    expect((await getCard(actor, card.id)).values).toEqual(card.values)
    const method = await createMethod(actor, methodInput('By the back', 'back_arc / 4 + 8cm'))
    const draft = await startDraft(actor, {
      order: {
        garment: 'flared-dress',
        measurements: { ...sanityBodies.one, back_arc: 460 },
        method: { id: method.id, rules: method.garments['flared-dress'] ?? [] },
        ownMeasurements: await engineMeasurements(actor),
      },
      typed: { 'measurements.back_arc': '46 cm' },
    })
    const drafted = draftGarment((await getDraft(actor, draft.id)).head.order)
    expect(drafted.steps.find(({ rule }) => rule === 'armholeDepth')?.length).toBeCloseTo(195, 6)
    const { message } = await refusal(archiveOwnMeasurement(actor, own.id), 'invalid')
    expect(message).toContain('By the back')
    await archiveMethod(actor, method.id)
    expect(await archiveOwnMeasurement(actor, own.id)).toMatchObject({ archived: true })
  })

  it('are unknown to the methods of a workroom that does not take them', async () => {
    const { problems } = await refusal(
      createMethod(stranger.actor, methodInput('Foreign', 'back_arc / 4 + 8cm')),
      'invalid',
    )
    expect(problems[0]?.message).toContain('back_arc')
  })

  it('keep their short name; the rest changes on the version that was seen', async () => {
    const own = ownInput('hip_arc')
    await createOwnMeasurement(owner.actor, own)
    const { measurement: _short, ...details } = own
    const changed = await updateOwnMeasurement(owner.actor, { ...details, name: 'Hip arc', version: 1 })
    expect(changed).toMatchObject({ name: 'Hip arc', measurement: 'hip_arc', version: 2 })
    await refusal(updateOwnMeasurement(owner.actor, { ...details, version: 1 }), 'conflict')
    await refusal(updateOwnMeasurement(owner.actor, { ...own, version: 2 } as never), 'invalid')
  })

  it('have one short name each in a workroom, and may have it in another', async () => {
    await createOwnMeasurement(owner.actor, ownInput('knee_girth'))
    const { problems } = await refusal(createOwnMeasurement(owner.actor, ownInput('knee_girth')), 'invalid')
    expect(problems[0]?.field).toBe('measurement')
    await createOwnMeasurement(stranger.actor, ownInput('knee_girth'))
  })

  it.each([
    ['a name like the engine’s', { measurement: 'backArc' }, 'measurement'],
    ['a name of one word', { measurement: 'arc' }, 'measurement'],
    ['no way of taking it', { how: ' ' }, 'how'],
    ['a range upside down', { least: cm('80'), most: cm('30') }, 'most'],
    ['a place that is none', { place: -1 }, 'place'],
  ])('are refused with %s', async (_, change, field) => {
    const sent = { ...ownInput('calf_girth'), ...change }
    const { problems } = await refusal(createOwnMeasurement(owner.actor, sent), 'invalid')
    expect(problems.map((problem) => problem.field)).toEqual([field])
  })

  it('of another workroom do not exist', async () => {
    const own = ownInput('ankle_girth')
    await createOwnMeasurement(owner.actor, own)
    const { measurement: _short, ...details } = own
    await refusal(getOwnMeasurement(stranger.actor, own.id), 'not-found')
    await refusal(updateOwnMeasurement(stranger.actor, { ...details, version: 1 }), 'not-found')
    await refusal(archiveOwnMeasurement(stranger.actor, own.id), 'not-found')
  })
})

describe('who may', () => {
  it.each(['owner', 'drafter', 'tutor'] as const)('%s: read and write', async (role) => {
    const { actor } = await workroom.person(role)
    const input = methodInput(`By the ${role}`)
    await createMethod(actor, input)
    await createOwnMeasurement(actor, ownInput(`arc_of_${role}`))
    expect((await listMethods(actor)).map(({ id }) => id)).toContain(input.id)
  })

  it.each(['maker', 'student'] as const)('%s: read only', async (role) => {
    const { actor } = await workroom.person(role)
    const input = methodInput('Read by all')
    await createMethod(owner.actor, input)
    expect((await getMethod(actor, input.id)).name).toBe('Read by all')
    expect((await listOwnMeasurements(actor)).length).toBeGreaterThan(0)
    await refusal(createMethod(actor, methodInput('Mine')), 'forbidden')
    await refusal(copyMethod(actor, { id: newId(), name: 'Mine', from: 'freehand' }), 'forbidden')
    await refusal(updateMethod(actor, { ...input, version: 1 }), 'forbidden')
    await refusal(archiveMethod(actor, input.id), 'forbidden')
    await refusal(createOwnMeasurement(actor, ownInput('my_own')), 'forbidden')
  })

  it('built in are the same for all and stand in no workroom', async () => {
    expect(
      (await listMethods(stranger.actor)).filter(({ id }) => methods.some((one) => one.id === id)),
    ).toEqual([])
  })
})
