import { beforeAll, describe, expect, it } from 'vitest'
import { listBlocks, removeBlock, setBlock } from '@/db/access/blocks'
import { createCard } from '@/db/access/cards'
import { createClient } from '@/db/access/clients'
import { getDraft } from '@/db/access/drafts'
import { thinRevisions } from '@/db/access/housekeeping'
import { getRevision, saveRevision } from '@/db/access/revisions'
import { Draft } from '@/db/models/draft'
import { newId } from '@/db/new-id'
import { cardInput, clientInput, nextRevision, startDraft } from '../support/draft-inputs'
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

async function clientWithDraft() {
  const client = await createClient(owner.actor, clientInput())
  const card = cardInput()
  await createCard(owner.actor, { ...card, clientId: client.id })
  return { client, card, draft: await startDraft(owner.actor, { clientId: client.id, cardId: card.id }) }
}

describe('a client’s block', () => {
  it('is the version of a draft that counted when it was chosen, with its order', async () => {
    const { client, card, draft } = await clientWithDraft()
    await setBlock(owner.actor, draft.id)
    await saveRevision(owner.actor, nextRevision(draft.id, draft.head.id, 950))
    expect(await listBlocks(owner.actor, client.id)).toMatchObject([
      {
        garment: 'flared-dress',
        draftId: draft.id,
        draftName: draft.name,
        cardId: card.id,
        revisionId: draft.head.id,
        order: draft.head.order,
      },
    ])
  })

  it('may be an earlier version, named as it was', async () => {
    const { client, draft } = await clientWithDraft()
    const fitted = {
      ...nextRevision(draft.id, draft.head.id, 950),
      kind: 'named',
      name: 'First fitting',
    } as const
    await saveRevision(owner.actor, fitted)
    await saveRevision(owner.actor, nextRevision(draft.id, fitted.id, 955))
    await setBlock(owner.actor, draft.id, fitted.id)
    expect((await listBlocks(owner.actor, client.id))[0]?.versionName).toBe('First fitting')
  })

  it('is one a garment: a later choice takes its place', async () => {
    const { client, card, draft } = await clientWithDraft()
    const second = await startDraft(owner.actor, { clientId: client.id, cardId: card.id })
    const skirt = { order: { garment: 'straight-skirt', measurements: {} } }
    const other = await startDraft(owner.actor, { clientId: client.id, cardId: card.id, ...skirt })
    await setBlock(owner.actor, draft.id)
    await setBlock(owner.actor, other.id)
    await setBlock(owner.actor, second.id)
    const blocks = await listBlocks(owner.actor, client.id)
    expect(blocks.map(({ draftId }) => draftId).sort()).toEqual([second.id, other.id].sort())
    await removeBlock(owner.actor, client.id, 'flared-dress')
    expect((await listBlocks(owner.actor, client.id)).map(({ garment }) => garment)).toEqual([
      'straight-skirt',
    ])
    expect((await getDraft(owner.actor, second.id)).id).toBe(second.id)
  })

  it('set twice at the same moment is set once', async () => {
    const { client, draft } = await clientWithDraft()
    await Promise.all([1, 2, 3].map(() => setBlock(owner.actor, draft.id)))
    expect(await listBlocks(owner.actor, client.id)).toHaveLength(1)
  })

  it('is never thinned away', async () => {
    const { draft } = await clientWithDraft()
    await setBlock(owner.actor, draft.id)
    const next = nextRevision(draft.id, draft.head.id, 950)
    const last = nextRevision(draft.id, next.id, 951)
    await saveRevision(owner.actor, next)
    await saveRevision(owner.actor, last)
    await thinRevisions(new Date(Date.now() + 3 * 24 * 3_600_000))
    expect((await getRevision(owner.actor, draft.head.id)).id).toBe(draft.head.id)
    expect((await getRevision(owner.actor, last.id)).id).toBe(last.id)
  })

  it('belongs to a client: a draft for nobody cannot be one, nor a version of another draft', async () => {
    const nobody = await startDraft(owner.actor)
    const { problems } = await refusal(setBlock(owner.actor, nobody.id), 'invalid')
    expect(problems[0]?.field).toBe('draftId')
    const { draft } = await clientWithDraft()
    await refusal(setBlock(owner.actor, draft.id, nobody.head.id), 'not-found')
    await refusal(setBlock(owner.actor, draft.id, newId()), 'not-found')
  })

  it('goes with its draft', async () => {
    const { client, draft } = await clientWithDraft()
    await setBlock(owner.actor, draft.id)
    await Draft.destroy({ where: { id: draft.id } })
    expect(await listBlocks(owner.actor, client.id)).toEqual([])
  })

  it('of another workroom does not exist', async () => {
    const { client, draft } = await clientWithDraft()
    await setBlock(owner.actor, draft.id)
    await refusal(listBlocks(stranger.actor, client.id), 'not-found')
    await refusal(setBlock(stranger.actor, draft.id), 'not-found')
    await refusal(removeBlock(stranger.actor, client.id, 'flared-dress'), 'not-found')
    expect(await listBlocks(owner.actor, client.id)).toHaveLength(1)
  })

  it.each(['tutor', 'maker', 'student'] as const)('is not for the %s', async (role) => {
    const { client, draft } = await clientWithDraft()
    const { actor } = await workroom.person(role)
    await refusal(listBlocks(actor, client.id), 'forbidden')
    await refusal(setBlock(actor, draft.id), 'forbidden')
    await refusal(removeBlock(actor, client.id, 'flared-dress'), 'forbidden')
  })

  it('is for the drafter', async () => {
    const { client, draft } = await clientWithDraft()
    const { actor } = await workroom.person('drafter')
    await setBlock(actor, draft.id)
    expect(await listBlocks(actor, client.id)).toHaveLength(1)
  })
})
