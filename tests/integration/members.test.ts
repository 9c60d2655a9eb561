import { describe, expect, it } from 'vitest'
import { acceptAsSignedIn, acceptInvitation, inviteMember, listInvitations } from '@/db/access/invitations'
import { changeRoles, listMembers, setMemberDisabled } from '@/db/access/members'
import { type SignedIn, signedInBy, switchWorkroom } from '@/db/access/sessions'
import { getWorkroom, listOwnWorkrooms, updateWorkroom } from '@/db/access/workrooms'
import { newId } from '@/db/new-id'
import { secretToken } from '@/db/secret-tokens'
import { refusal } from '../support/refusal'
import { makeWorkroom, testPassword } from '../support/workroom'

async function inviting(email = `${newId()}@people.example`) {
  const workroom = await makeWorkroom()
  const owner = await workroom.person('owner')
  const id = newId()
  await inviteMember(owner.actor, { id, email, roles: ['maker', 'student'] })
  return { workroom, owner, email, token: secretToken('invitation', id) }
}

async function signedIn(sessionId: string): Promise<SignedIn> {
  const found = await signedInBy(sessionId)
  if (!found) throw new Error('The session has ended.')
  return found
}

describe('an invitation', () => {
  it('makes somebody new a member with several roles, once', async () => {
    const { owner, email, token } = await inviting()
    const input = { token, name: 'Nia', password: testPassword }
    await acceptInvitation(input)
    await refusal(acceptInvitation(input), 'invalid')
    expect(await listMembers(owner.actor)).toContainEqual(
      expect.objectContaining({
        email,
        name: 'Nia',
        roles: ['maker', 'student'],
        disabled: false,
        self: false,
      }),
    )
    expect(await listInvitations(owner.actor)).toEqual([])
  })

  it('takes somebody known into a second workroom, where they may do other things', async () => {
    const known = await (await makeWorkroom()).person('owner')
    const { token, workroom } = await inviting(known.email)
    await refusal(acceptInvitation({ token, name: 'Other', password: testPassword }), 'conflict')
    await acceptAsSignedIn(await signedIn(known.actor.sessionId), token)
    const now = await signedIn(known.actor.sessionId)
    expect(now).toMatchObject({ workroom: { id: workroom.id }, actor: { roles: ['maker', 'student'] } })
    expect(await listOwnWorkrooms(now)).toHaveLength(2)
    await switchWorkroom(now, known.actor.workroomId)
    expect(await signedIn(known.actor.sessionId)).toMatchObject({ actor: { roles: ['owner'] } })
  })

  it('is for the address it was sent to, and stays whole when somebody else tries', async () => {
    const { token } = await inviting()
    const other = await (await makeWorkroom()).person('owner')
    await refusal(acceptAsSignedIn(await signedIn(other.actor.sessionId), token), 'forbidden')
    await acceptInvitation({ token, name: 'Right', password: testPassword })
  })
})

describe('members', () => {
  it('lose a role, and the whole workroom, from the next look on', async () => {
    const workroom = await makeWorkroom()
    const owner = await workroom.person('owner')
    const { actor } = await workroom.person('drafter', 'tutor')
    const { membershipId, sessionId } = actor
    await changeRoles(owner.actor, { membershipId, roles: ['student'] })
    expect(await signedInBy(sessionId)).toMatchObject({ actor: { roles: ['student'] } })
    await setMemberDisabled(owner.actor, { membershipId, disabled: true })
    expect(await signedInBy(sessionId)).toMatchObject({ actor: null, workroom: null })
    await setMemberDisabled(owner.actor, { membershipId, disabled: false })
    expect(await signedInBy(sessionId)).toMatchObject({ actor: { roles: ['student'] } })
  })

  it('always have an owner, also when two owners give up at once', async () => {
    const workroom = await makeWorkroom()
    const [first, second] = [await workroom.person('owner'), await workroom.person('owner')]
    const leaving = [first, second].map(({ actor }) =>
      changeRoles(actor, { membershipId: actor.membershipId, roles: ['drafter'] }),
    )
    const outcomes = await Promise.allSettled(leaving)
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    const [left] = outcomes[0]?.status === 'rejected' ? [first] : [second]
    if (!left) throw new Error('Nobody is left.')
    const { membershipId } = left.actor
    await refusal(setMemberDisabled(left.actor, { membershipId, disabled: true }), 'invalid')
  })

  it('of another workroom cannot be touched', async () => {
    const { actor } = await (await makeWorkroom()).person('maker')
    const stranger = await (await makeWorkroom()).person('owner')
    const { membershipId } = actor
    await refusal(changeRoles(stranger.actor, { membershipId, roles: ['owner'] }), 'not-found')
    await refusal(setMemberDisabled(stranger.actor, { membershipId, disabled: true }), 'not-found')
    await refusal(switchWorkroom(await signedIn(stranger.actor.sessionId), actor.workroomId), 'not-found')
  })
})

describe('settings', () => {
  it('are read by every member and written by owners only', async () => {
    const workroom = await makeWorkroom()
    const [owner, student] = [await workroom.person('owner'), await workroom.person('student')]
    const settings = { ...(await getWorkroom(student.actor)), currency: 'NGN', unit: 'cm' as const }
    await refusal(updateWorkroom(student.actor, settings), 'forbidden')
    await updateWorkroom(owner.actor, settings)
    expect(await getWorkroom(student.actor)).toEqual(settings)
  })

  it('refuse what is no currency, no time zone and no allowance', async () => {
    const owner = await (await makeWorkroom()).person('owner')
    const settings = await getWorkroom(owner.actor)
    const hem = { mm: 900, typed: '90', unit: 'cm' as const }
    const wrong = {
      ...settings,
      currency: 'XXQ',
      timeZone: 'Moon/Base',
      allowances: { ...settings.allowances, hem },
    }
    const { problems } = await refusal(updateWorkroom(owner.actor, wrong), 'invalid')
    expect(problems.map((problem) => problem.field)).toEqual(['currency', 'timeZone', 'allowances.hem'])
  })
})
