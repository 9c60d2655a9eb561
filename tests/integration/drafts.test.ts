import { beforeAll, describe, expect, it } from 'vitest'
import { createClient } from '@/db/access/clients'
import { archiveDraft, createDraft, getDraft, listDrafts, renameDraft } from '@/db/access/drafts'
import { keepPrinted, keptDraft } from '@/db/access/kept-drafts'
import { thinRevisions } from '@/db/access/housekeeping'
import { getRevision, listRevisions, saveRevision } from '@/db/access/revisions'
import { createShare } from '@/db/access/shares'
import { Revision } from '@/db/models/revision'
import { newId } from '@/db/new-id'
import { clientInput, nextRevision, order, startDraft } from '../support/draft-inputs'
import { refusal } from '../support/refusal'
import { sampleDraft } from '../support/sample-draft'
import { type Person, type TestWorkroom, makeWorkroom } from '../support/workroom'

let workroom: TestWorkroom
let owner: Person
let stranger: Person
beforeAll(async () => {
  workroom = await makeWorkroom()
  owner = await workroom.person('owner')
  stranger = await (await makeWorkroom()).person('owner')
})

describe('saving versions', () => {
  it('moves the head and answers the same save again as already saved', async () => {
    const { id, head } = await startDraft(owner.actor)
    const next = nextRevision(id, head.id, 930)
    expect(await saveRevision(owner.actor, next)).toMatchObject({ outcome: 'saved', head: { id: next.id } })
    expect(await saveRevision(owner.actor, next)).toMatchObject({ outcome: 'already-saved' })
    expect((await getDraft(owner.actor, id)).head).toMatchObject({
      order: order(930),
      typed: { 'measurements.bust': '930' },
    })
  })

  it('keeps both when two tabs save on the same version', async () => {
    const { id, head } = await startDraft(owner.actor)
    const saves = [nextRevision(id, head.id, 931), nextRevision(id, head.id, 932)]
    const outcomes = await Promise.all(saves.map((save) => saveRevision(owner.actor, save)))
    expect(outcomes.map(({ outcome }) => outcome).sort()).toEqual(['conflict', 'saved'])
    const winner = outcomes.findIndex(({ outcome }) => outcome === 'saved')
    expect(outcomes[1 - winner]?.head.id).toBe(saves[winner]?.id)
    const kept = await listRevisions(owner.actor, id)
    expect(kept.filter((each) => each.conflict).map((each) => each.id)).toEqual([saves[1 - winner]?.id])
    expect(kept).toHaveLength(3)
    expect((await getRevision(owner.actor, saves[1 - winner]?.id ?? '')).order).toEqual(
      saves[1 - winner]?.order,
    )
  })

  it('never loses a save among twenty at once', async () => {
    const { id, head } = await startDraft(owner.actor)
    const saves = Array.from({ length: 20 }, (_, each) => nextRevision(id, head.id, 900 + each))
    await Promise.all(saves.map((save) => saveRevision(owner.actor, save)))
    const kept = await listRevisions(owner.actor, id)
    expect(kept).toHaveLength(21)
    expect(kept.filter((each) => !each.conflict)).toHaveLength(2)
  })

  it('keeps an edit whose base was thinned away beside the head', async () => {
    const { id } = await startDraft(owner.actor)
    expect(await saveRevision(owner.actor, nextRevision(id, newId(), 940))).toMatchObject({
      outcome: 'conflict',
    })
  })

  it('refuses an id that was used for something else', async () => {
    const { id, head } = await startDraft(owner.actor)
    const next = nextRevision(id, head.id, 930)
    await saveRevision(owner.actor, next)
    await refusal(saveRevision(owner.actor, { ...next, order: order(999) }), 'conflict')
    expect((await getRevision(owner.actor, next.id)).order).toEqual(order(930))
  })

  it('refuses another garment, a named version without a name, and unknown fields', async () => {
    const { id, head } = await startDraft(owner.actor)
    const next = nextRevision(id, head.id, 930)
    const fields = async (change: object) =>
      (await refusal(saveRevision(owner.actor, { ...next, ...change }), 'invalid')).problems.map(
        (problem) => problem.field,
      )
    expect(await fields({ order: { ...order(), garment: 'circle-skirt' } })).toEqual(['order.garment'])
    expect(await fields({ kind: 'named' })).toEqual(['name'])
    expect(await fields({ conflict: true, workroomId: newId() })).toEqual(['conflict', 'workroomId'])
    expect(await fields({ order: { ...order(), price: 1 } })).toEqual(['order.price'])
  })

  it('is for the own workroom only', async () => {
    const { id, head } = await startDraft(owner.actor)
    await refusal(saveRevision(stranger.actor, nextRevision(id, head.id, 930)), 'not-found')
    await refusal(getDraft(stranger.actor, id), 'not-found')
    await refusal(listRevisions(stranger.actor, id), 'not-found')
    await refusal(getRevision(stranger.actor, head.id), 'not-found')
    await refusal(renameDraft(stranger.actor, id, 'Mine'), 'not-found')
    await refusal(archiveDraft(stranger.actor, id), 'not-found')
    await refusal(keepPrinted(stranger.actor, { revisionId: head.id, draft: sampleDraft() }), 'not-found')
  })
})

describe('drafts', () => {
  it('are made once, under the ids that the client made', async () => {
    const input = { id: newId(), revisionId: newId(), name: 'Once', order: order(), typed: {} }
    await createDraft(owner.actor, input)
    expect(await createDraft(owner.actor, input)).toMatchObject({
      id: input.id,
      head: { id: input.revisionId },
    })
    expect((await listDrafts(owner.actor, { search: 'Once' })).total).toBe(1)
  })

  it('cannot be for the client of another workroom', async () => {
    const client = await createClient(stranger.actor, clientInput())
    await refusal(startDraft(owner.actor, { clientId: client.id }), 'not-found')
  })

  it('are for tutors the own ones and the teaching ones, without the client', async () => {
    const tutor = await workroom.person('tutor')
    const client = await createClient(owner.actor, clientInput())
    const work = await startDraft(owner.actor)
    const lesson = await startDraft(owner.actor, { purpose: 'teaching', clientId: client.id })
    await refusal(getDraft(tutor.actor, work.id), 'not-found')
    expect(await getDraft(tutor.actor, lesson.id)).toMatchObject({
      writable: false,
      clientId: null,
      clientName: null,
    })
    await refusal(saveRevision(tutor.actor, nextRevision(lesson.id, lesson.head.id, 900)), 'not-found')
    expect(await startDraft(tutor.actor)).toMatchObject({ purpose: 'teaching', writable: true })
  })

  it('are for students the own practice ones and shared lessons', async () => {
    const student = await workroom.person('student')
    const lesson = await startDraft(owner.actor, { purpose: 'teaching' })
    await refusal(getDraft(student.actor, lesson.id), 'not-found')
    const link = { draftId: lesson.id, id: newId(), scope: 'lesson', expiresOn: '2027-03-01' } as const
    await createShare(owner.actor, link)
    expect(await getDraft(student.actor, lesson.id)).toMatchObject({ writable: false })
    expect(await startDraft(student.actor)).toMatchObject({ purpose: 'practice', writable: true })
    await refusal(startDraft(student.actor, { purpose: 'work' }), 'invalid')
  })

  it('that were printed can be printed again as they were', async () => {
    const { head } = await startDraft(owner.actor)
    expect(await keptDraft(owner.actor, head.id)).toBeNull()
    await keepPrinted(owner.actor, { revisionId: head.id, draft: sampleDraft() })
    await keepPrinted(owner.actor, { revisionId: head.id, draft: { ...sampleDraft(), garment: 'other' } })
    expect((await keptDraft(owner.actor, head.id))?.draft).toEqual(sampleDraft())
    expect(await getRevision(owner.actor, head.id)).toMatchObject({ printed: true })
  })
})

describe('thinning', () => {
  it('leaves one automatic version an hour after a day, and every named, printed, branched and newest one', async () => {
    const { id, head } = await startDraft(owner.actor)
    let basedOn = head.id
    const ids: string[] = []
    for (let each = 0; each < 6; each += 1) {
      const next = nextRevision(id, basedOn, 900 + each)
      await saveRevision(owner.actor, each === 1 ? { ...next, kind: 'named', name: 'First fitting' } : next)
      ids.push((basedOn = next.id))
    }
    const branch = nextRevision(id, head.id, 1)
    await saveRevision(owner.actor, branch)
    await keepPrinted(owner.actor, { revisionId: ids[2] ?? '', draft: sampleDraft() })
    await Revision.update({ savedAt: new Date('2026-01-05T10:20:00Z') }, { where: { draftId: id } })
    await Revision.update({ savedAt: new Date('2026-01-05T10:40:00Z') }, { where: { id: ids[4] ?? '' } })
    await thinRevisions()
    const kept = (await listRevisions(owner.actor, id)).map((each) => each.id)
    expect(kept.sort()).toEqual([ids[1], ids[2], ids[4], ids[5], branch.id].sort())
  })
})
