import { createDraft } from '@/db/access/drafts'
import { newId } from '@/db/new-id'
import type { Actor } from '@/db/permissions'
import type { DraftInput } from '@/db/shapes/draft'
import type { RevisionInput } from '@/db/shapes/revision'

/** A card's details without an owner. */
export const cardInput = () => ({
  id: newId(),
  name: 'Before the fitting',
  takenOn: '2026-11-02',
  unit: 'in' as const,
  note: '',
  values: {
    bust: { mm: 927.1, typed: '36 1/2', unit: 'in' as const },
    waist: { mm: 740, typed: '74', unit: 'cm' as const },
  },
})

export const clientInput = (name = 'Amara Obi') => ({ id: newId(), name, email: '', phone: '', note: '' })

export const order = (bust = 927.1) => ({ garment: 'flared-dress', measurements: { bust } })

/** Starts a draft in the workroom of the actor. */
export function startDraft(actor: Actor, about: Partial<DraftInput> = {}) {
  return createDraft(actor, {
    id: newId(),
    revisionId: newId(),
    name: 'Flared dress',
    order: order(),
    typed: {},
    ...about,
  })
}

/** The next version of a draft. */
export const nextRevision = (draftId: string, basedOn: string, bust: number): RevisionInput => ({
  draftId,
  id: newId(),
  basedOn,
  order: order(bust),
  typed: { 'measurements.bust': String(bust) },
  kind: 'auto',
})
