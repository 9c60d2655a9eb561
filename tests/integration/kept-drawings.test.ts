import { beforeAll, describe, expect, it } from 'vitest'
import { drawnOtherwise, drawnToday, keptOrDrawn } from '@/app/_server/print/kept-or-drawn'
import { sharedDrawing } from '@/app/_server/share/shared-drawing'
import { sharedView } from '@/app/_server/share/shared-view'
import { keepPrinted, keptDraft } from '@/db/access/kept-drafts'
import { createShare, openShare } from '@/db/access/shares'
import { newId } from '@/db/new-id'
import type { Draft } from '@/drafting/contract'
import { mirrorX, transformPath } from '@/drafting/geometry'
import { sanityBodies } from '../support/bodies'
import { startDraft } from '../support/draft-inputs'
import { type Person, makeWorkroom } from '../support/workroom'

const order = { garment: 'flared-dress', measurements: sanityBodies.one }

/** The dress as an engine might have drawn it that set the hem of the front by so many mm lower. */
function olderDraft(lower: number): Draft {
  const draft = drawnToday(order)
  const moved = { ...mirrorX, a: 1, f: lower }
  return {
    ...draft,
    engineVersion: '0.9.0',
    pieces: draft.pieces.map((piece) =>
      piece.id === 'front'
        ? {
            ...piece,
            edges: piece.edges.map((edge) =>
              edge.id === 'hem' ? { ...edge, path: transformPath(moved, edge.path) } : edge,
            ),
          }
        : piece,
    ),
  }
}

let owner: Person
beforeAll(async () => {
  owner = await (await makeWorkroom()).person('owner')
})

describe('a version that was printed', () => {
  it('says nothing while it is drawn as it was', async () => {
    const { head } = await startDraft(owner.actor, { order })
    await keepPrinted(owner.actor, { revisionId: head.id, draft: drawnToday(order) })
    expect(drawnOtherwise(order, await keptDraft(owner.actor, head.id))).toBeNull()
  })

  it('says where it is drawn otherwise by more than a hundredth of a millimetre, and is printed as it was', async () => {
    const { head } = await startDraft(owner.actor, { order })
    await keepPrinted(owner.actor, { revisionId: head.id, draft: olderDraft(1.5) })
    const kept = await keptDraft(owner.actor, head.id)
    const otherwise = drawnOtherwise(order, kept)
    expect(otherwise?.differences).toHaveLength(1)
    expect(otherwise?.differences[0]).toMatchObject({ piece: 'Front', where: 'hem, stitching line' })
    expect(otherwise?.differences[0]?.by).toBeCloseTo(1.5, 6)
    expect(keptOrDrawn(order, kept).engineVersion).toBe('0.9.0')
    expect(drawnOtherwise(order, kept && { ...kept, draft: olderDraft(0.009) })).toBeNull()
  })

  it('is printed as it was even when the engine refuses it today', async () => {
    const { head } = await startDraft(owner.actor, { order })
    await keepPrinted(owner.actor, { revisionId: head.id, draft: olderDraft(0) })
    const kept = await keptDraft(owner.actor, head.id)
    const refused = { ...order, measurements: { bust: 1 } }
    expect(drawnOtherwise(refused, kept)).toMatchObject({ drawable: false, differences: [] })
    expect(keptOrDrawn(refused, kept)).toEqual(kept?.draft)
  })
})

describe('a version that was shared', () => {
  it('is kept with the first look, and shown as it was from then on', async () => {
    const { id, head } = await startDraft(owner.actor, { order })
    const link = { id: newId(), draftId: id, scope: 'drawing', expiresOn: '2027-03-01' } as const
    const { token } = await createShare(owner.actor, link)
    const share = await openShare(token)
    if (!share) throw new Error('The link opens nothing.')
    expect(await keptDraft(owner.actor, head.id)).toBeNull()
    await sharedView(share)
    expect((await keptDraft(owner.actor, head.id))?.draft).toEqual(
      JSON.parse(JSON.stringify(drawnToday(order))),
    )
    expect((await sharedView(share)).otherwise).toEqual([])
  })

  it('that is drawn otherwise today says so to the visitor, and shows the kept drawing', async () => {
    const { id, head } = await startDraft(owner.actor, { order })
    await keepPrinted(owner.actor, { revisionId: head.id, draft: olderDraft(2) })
    const link = { id: newId(), draftId: id, scope: 'drawing', expiresOn: '2027-03-01' } as const
    const share = await openShare((await createShare(owner.actor, link)).token)
    if (!share) throw new Error('The link opens nothing.')
    expect((await sharedDrawing(share)).draft.engineVersion).toBe('0.9.0')
    expect((await sharedView(share)).otherwise).toEqual(['Front'])
  })
})
