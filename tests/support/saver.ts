/**
 * Saves versions as fast as it can into the database of DATABASE_URL and prints `saved <id>` for each that was
 * acknowledged; when one is refused it prints `refused <status>` and ends.
 */
import { refusalOf } from '@/app/_server/problems'
import { createDraft } from '@/db/access/drafts'
import { saveRevision } from '@/db/access/revisions'
import { newId } from '@/db/new-id'
import { nextRevision, order } from './draft-inputs'
import { makeWorkroom } from './workroom'

const { actor } = await (await makeWorkroom()).person('owner')

async function saveOn(): Promise<void> {
  const first = { id: newId(), revisionId: newId(), name: 'Under load', order: order(), typed: {} }
  const { id } = await createDraft(actor, first)
  let basedOn = first.revisionId
  for (let bust = 900; ; bust += 0.001) {
    const next = nextRevision(id, basedOn, bust)
    await saveRevision(actor, next)
    process.stdout.write(`saved ${next.id}\n`)
    basedOn = next.id
  }
}

try {
  await Promise.all(Array.from({ length: 8 }, saveOn))
} catch (error) {
  process.stdout.write(`refused ${refusalOf(error).status}\n`)
  process.exit(0)
}
