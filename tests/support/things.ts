import { createCard } from '@/db/access/cards'
import { createClient } from '@/db/access/clients'
import { inviteMember } from '@/db/access/invitations'
import { keepPrinter } from '@/db/access/printers'
import { createShare } from '@/db/access/shares'
import { newId } from '@/db/new-id'
import type { Actor } from '@/db/permissions'
import type { Things } from '../security/endpoints'
import { cardInput, clientInput, startDraft } from './draft-inputs'
import type { TestWorkroom } from './workroom'

/** One of each kind in a workroom, made by its owner. */
export async function makeThings(workroom: TestWorkroom, owner: Actor): Promise<Things> {
  const client = await createClient(owner, clientInput())
  const card = await createCard(owner, { ...cardInput(), clientId: client.id })
  const draft = await startDraft(owner, { clientId: client.id, cardId: card.id })
  const link = { draftId: draft.id, id: newId(), scope: 'lesson', expiresOn: '2027-03-01' } as const
  const { share, token } = await createShare(owner, link)
  const invitation = { id: newId(), email: `${newId()}@people.example`, roles: ['maker'] }
  const spare = await workroom.person('maker')
  const printer = await keepPrinter(owner, {
    id: newId(),
    name: `Printer ${newId()}`,
    short: 98.5,
    long: 99.2,
  })
  return {
    clientId: client.id,
    cardId: card.id,
    draftId: draft.id,
    headId: draft.head.id,
    shareId: share.id,
    shareToken: token,
    invitationId: (await inviteMember(owner, invitation)).id,
    membershipId: spare.actor.membershipId,
    printerId: printer.id,
  }
}
