import { beforeAll, expect, it } from 'vitest'
import { createClient } from '@/db/access/clients'
import { getRevision, saveRevision } from '@/db/access/revisions'
import { createShare, listShares, openShare, revokeShare } from '@/db/access/shares'
import { Share } from '@/db/models/share'
import { newId } from '@/db/new-id'
import { clientInput, nextRevision, startDraft } from '../support/draft-inputs'
import { refusal } from '../support/refusal'
import { type Person, type TestWorkroom, makeWorkroom } from '../support/workroom'

let workroom: TestWorkroom
let owner: Person
beforeAll(async () => {
  workroom = await makeWorkroom()
  owner = await workroom.person('owner')
})

async function shared() {
  const client = await createClient(owner.actor, { ...clientInput('Secret Client'), phone: '555 0100' })
  const draft = await startDraft(owner.actor, { clientId: client.id })
  const input = { draftId: draft.id, id: newId(), scope: 'drawing', expiresOn: '2027-02-01' } as const
  return { draft, input, ...(await createShare(owner.actor, input)) }
}

it('opens the newest version and nothing about the client', async () => {
  const { draft, token } = await shared()
  const next = nextRevision(draft.id, draft.head.id, 935)
  await saveRevision(owner.actor, next)
  const opened = await openShare(token)
  expect(opened).toMatchObject({ revisionId: next.id, workroomName: workroom.name, scope: 'drawing' })
  expect(JSON.stringify(opened)).not.toMatch(/Secret|555|client/i)
  expect((await getRevision(owner.actor, next.id)).shared).toBe(true)
})

it('keeps only a hash of the token, and gives the same link for the same id', async () => {
  const { input, token, share } = await shared()
  expect(token).toMatch(/^[\w-]{43}$/)
  expect(JSON.stringify(await Share.findByPk(share.id))).not.toContain(token)
  expect((await createShare(owner.actor, input)).token).toBe(token)
  expect(await listShares(owner.actor, input.draftId)).toHaveLength(1)
})

it('is closed at once when it is revoked, has expired, or was never made', async () => {
  const first = await shared()
  await revokeShare(owner.actor, first.share.id)
  expect(await openShare(first.token)).toBeNull()
  const second = await shared()
  await Share.update({ expiresAt: new Date(Date.now() - 1) }, { where: { id: second.share.id } })
  expect(await openShare(second.token)).toBeNull()
  expect(await openShare('x'.repeat(43))).toBeNull()
  expect(await openShare({ ne: '' } as never)).toBeNull()
})

it('lasts to the end of its last day where the workroom is', async () => {
  const { share } = await shared()
  const { expiresAt } = await Share.findByPk(share.id, { rejectOnEmpty: true })
  // Lagos is an hour ahead of UTC.
  expect(expiresAt.toISOString()).toBe('2027-02-01T23:00:00.000Z')
})

it('refuses a day that is past or years away, and drafts of others', async () => {
  const { draft } = await shared()
  const input = { draftId: draft.id, id: newId(), scope: 'drawing', expiresOn: '2020-01-01' } as const
  await refusal(createShare(owner.actor, input), 'invalid')
  await refusal(createShare(owner.actor, { ...input, expiresOn: '2036-01-01' }), 'invalid')
  const stranger = await (await makeWorkroom()).person('owner')
  await refusal(createShare(stranger.actor, { ...input, expiresOn: '2027-01-01' }), 'not-found')
  const maker = await workroom.person('maker')
  await refusal(createShare(maker.actor, { ...input, expiresOn: '2027-01-01' }), 'forbidden')
})

it('cannot be revoked from another workroom', async () => {
  const { share, token } = await shared()
  const stranger = await (await makeWorkroom()).person('owner')
  await refusal(revokeShare(stranger.actor, share.id), 'not-found')
  expect(await openShare(token)).not.toBeNull()
})
