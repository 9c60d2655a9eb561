import { beforeEach, describe, expect, it } from 'vitest'
import { signIn } from '@/db/access/sign-in'
import { connection } from '@/db/connection'
import { User } from '@/db/models/user'
import { newId } from '@/db/new-id'
import { refusal } from '../support/refusal'
import { forgetTries } from '../support/tries'
import { makeWorkroom, testPassword } from '../support/workroom'

beforeEach(forgetTries)

const wrong = 'not the password at all'
const person = async () => (await makeWorkroom()).person('owner')
/** A place of its own for each test. */
const place = () => `198.51.100.${newId()}`

async function timed(work: () => Promise<unknown>): Promise<number> {
  const from = performance.now()
  await work().catch(() => {})
  return performance.now() - from
}

describe('signing in', () => {
  it('is refused in the same words for a wrong password, an unknown address and a disabled person', async () => {
    const { email } = await person()
    const disabled = await person()
    await User.update({ disabledAt: new Date() }, { where: { email: disabled.email } })
    const tries = [
      { email, password: wrong },
      { email: `${newId()}@people.example`, password: wrong },
      { email: disabled.email, password: testPassword },
      { email: { ne: '' } as never, password: ['x'] as never },
    ]
    const refusals = await Promise.all(tries.map((input) => refusal(signIn(input, place()), 'not-signed-in')))
    expect(new Set(refusals.map(({ message }) => message)).size).toBe(1)
  })

  it('takes about as long for an unknown address as for a known one', async () => {
    const { email } = await person()
    const [known, unknown]: [number[], number[]] = [[], []]
    for (let each = 0; each < 20; each += 1) {
      await forgetTries()
      known.push(await timed(() => signIn({ email, password: wrong }, place())))
      unknown.push(
        await timed(() => signIn({ email: `${newId()}@people.example`, password: wrong }, place())),
      )
    }
    // The quickest of each: a busy machine makes some slower, never quicker.
    const ratio = Math.min(...unknown) / Math.min(...known)
    expect(ratio).toBeGreaterThan(0.5)
    expect(ratio).toBeLessThan(2)
  })
})

describe('the limits', () => {
  it('close an account for a while after ten wrong passwords, even to the right one, and no other account', async () => {
    const { email } = await person()
    for (let each = 0; each < 10; each += 1)
      await refusal(signIn({ email, password: wrong }, place()), 'not-signed-in')
    const { message } = await refusal(signIn({ email, password: testPassword }, place()), 'limited')
    expect(message).toBe('Too many tries. Try again in 15 minutes.')
    const other = await person()
    await signIn({ email: other.email, password: testPassword }, place())
  })

  it('count tries that come at once', async () => {
    const { email } = await person()
    const tries = Array.from({ length: 30 }, () =>
      signIn({ email, password: wrong }, place()).catch((error: { code: string }) => error.code),
    )
    expect((await Promise.all(tries)).filter((code) => code === 'not-signed-in')).toHaveLength(10)
  })

  it('close an address that tries many accounts', async () => {
    const from = place()
    const tries = Array.from({ length: 61 }, () =>
      signIn({ email: `${newId()}@people.example`, password: wrong }, from).catch(
        (error: { code: string }) => error.code,
      ),
    )
    expect((await Promise.all(tries)).filter((code) => code === 'limited')).toHaveLength(1)
  })

  it('are given back by a good sign-in', async () => {
    const { email } = await person()
    const from = place()
    for (let each = 0; each < 9; each += 1)
      await refusal(signIn({ email, password: wrong }, from), 'not-signed-in')
    await signIn({ email, password: testPassword }, from)
    for (let each = 0; each < 9; each += 1)
      await refusal(signIn({ email, password: wrong }, from), 'not-signed-in')
    await signIn({ email, password: testPassword }, from)
  })

  it('refuse everybody when they cannot count', async () => {
    const { email } = await person()
    const tables = connection.getQueryInterface()
    await tables.renameTable('attempts', 'attempts_away')
    try {
      await refusal(signIn({ email, password: testPassword }, place()), 'unavailable')
    } finally {
      await tables.renameTable('attempts_away', 'attempts')
    }
    await signIn({ email, password: testPassword }, place())
  })
})
