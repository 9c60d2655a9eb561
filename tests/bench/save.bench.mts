/**
 * Saving a version while others save too: fifty saves a second arrive by the clock, on forty drafts in turn, whether
 * or not the ones before are done. A duration counts from the moment the save was due, so that waiting in line shows.
 */
import { setTimeout as sleep } from 'node:timers/promises'
import { saveRevision } from '@/db/access/revisions'
import { connection } from '@/db/connection'
import { nextRevision, startDraft } from '../support/draft-inputs'
import { makeWorkroom } from '../support/workroom'
import { report } from './support/bench'

const perSecond = 50
const seconds = 10

const { actor } = await (await makeWorkroom()).person('owner')
const drafts = await Promise.all(
  Array.from({ length: 40 }, async () => {
    const { id, head } = await startDraft(actor)
    return { id, base: head.id, queue: Promise.resolve() as Promise<unknown> }
  }),
)

const durations: number[] = []
const start = performance.now()
const saves = Array.from({ length: perSecond * seconds }, async (_, number) => {
  const due = start + (number * 1000) / perSecond
  await sleep(Math.max(0, due - performance.now()))
  const draft = drafts[number % drafts.length]!
  // One drafter's saves follow each other; different drafters do not wait for one another.
  const save = draft.queue.then(async () => {
    const revision = nextRevision(draft.id, draft.base, 900 + number)
    const { outcome } = await saveRevision(actor, revision)
    if (outcome !== 'saved') throw new Error(`save ${number}: ${outcome}`)
    draft.base = revision.id
    durations.push(performance.now() - due)
  })
  draft.queue = save
  await save
})
await Promise.all(saves)
await connection.close()
report(`save a version, ${perSecond} a second`, durations, { aim95: 60, note: 'on disk when answered' })
