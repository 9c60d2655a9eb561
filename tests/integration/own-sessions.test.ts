import { beforeEach, expect, it } from 'vitest'
import { endOwnSession, listOwnSessions } from '@/db/access/own-sessions'
import { signedInBy } from '@/db/access/sessions'
import { signIn } from '@/db/access/sign-in'
import { Session } from '@/db/models/session'
import { refusal } from '../support/refusal'
import { forgetTries } from '../support/tries'
import { makeWorkroom, testPassword } from '../support/workroom'

beforeEach(forgetTries)

/** Somebody who is signed in on a phone and on a laptop. */
async function onTwoDevices() {
  const { actor, email } = await (await makeWorkroom()).person('owner')
  await Session.destroy({ where: { userId: actor.userId } })
  const phone = await signIn({ email, password: testPassword }, 'a place', 'Chrome on Android')
  const laptop = await signIn({ email, password: testPassword }, 'a place', 'Firefox on Windows')
  return { phone, laptop }
}

it('are listed with the device each began on, the one that asks marked and first', async () => {
  const { phone, laptop } = await onTwoDevices()
  const list = (await listOwnSessions(phone)).map(({ device, here }) => ({ device, here }))
  expect(list).toEqual([
    { device: 'Chrome on Android', here: true },
    { device: 'Firefox on Windows', here: false },
  ])
  expect((await listOwnSessions(laptop))[0]?.device).toBe('Firefox on Windows')
})

it('end at once, one by one, and are gone from the list', async () => {
  const { phone, laptop } = await onTwoDevices()
  await endOwnSession(phone, laptop.sessionId)
  expect(await signedInBy(laptop.sessionId)).toBeNull()
  expect(await signedInBy(phone.sessionId)).not.toBeNull()
  expect(await listOwnSessions(phone)).toHaveLength(1)
})

it('are the person’s alone: nobody ends or sees another’s', async () => {
  const { phone } = await onTwoDevices()
  const stranger = (await (await makeWorkroom()).person('owner')).actor
  await refusal(endOwnSession(stranger, phone.sessionId), 'not-found')
  expect(await signedInBy(phone.sessionId)).not.toBeNull()
  expect((await listOwnSessions(stranger)).map(({ id }) => id)).toEqual([stranger.sessionId])
})

it('that lapsed are not listed', async () => {
  const { phone, laptop } = await onTwoDevices()
  const fifteenDaysAgo = new Date(Date.now() - 15 * 24 * 3_600_000)
  await Session.update({ lastSeenAt: fifteenDaysAgo }, { where: { id: laptop.sessionId } })
  expect(await listOwnSessions(phone)).toHaveLength(1)
})
