import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { runDueJobs } from '@/app/_server/jobs/runner'
import { inviteMember, openInvitation, withdrawInvitation } from '@/db/access/invitations'
import { confirmJoin, openJoin, requestJoin } from '@/db/access/joining'
import { openReset, requestReset, resetPassword } from '@/db/access/new-passwords'
import { enqueue } from '@/db/access/outbox'
import { signIn } from '@/db/access/sign-in'
import { signedInBy } from '@/db/access/sessions'
import { Job } from '@/db/models/job'
import { Token } from '@/db/models/token'
import { newId } from '@/db/new-id'
import { inTransaction } from '@/db/transactions'
import { refusal } from '../support/refusal'
import { type TestSmtp, startSmtp } from '../support/smtp'
import { forgetTries } from '../support/tries'
import { makeWorkroom, testPassword } from '../support/workroom'

let smtp: TestSmtp
beforeAll(async () => {
  smtp = await startSmtp()
  process.env.SMTP_URL = smtp.url
})
beforeEach(async () => {
  await Job.destroy({ where: {} })
  await forgetTries()
  smtp.received.length = 0
  smtp.refusing = false
})
afterAll(() => smtp.close())

const someAddress = () => `${newId()}@people.example`
const letter = () => smtp.received[0]

/** The secret in the link of the only letter that came. */
function tokenInMail(): string {
  const [, token] = /[?&]token=([\w-]+)/.exec(letter()?.text ?? '') ?? []
  if (!token) throw new Error(`There is no link in: ${letter()?.text}`)
  return token
}

describe('the outbox', () => {
  it('sends nothing for a transaction that was rolled back', async () => {
    const email = someAddress()
    await inTransaction(async (transaction) => {
      await enqueue('mail-reset', { email }, { transaction })
      throw new Error('changed my mind')
    }).catch(() => {})
    await runDueJobs()
    expect(smtp.received).toEqual([])
  })

  it('sends once after the commit, however many runners there are', async () => {
    await inTransaction(async (transaction) => {
      for (let each = 0; each < 6; each += 1)
        await enqueue('mail-reset', { email: someAddress() }, { transaction })
    })
    await Promise.all([runDueJobs(), runDueJobs(), runDueJobs()])
    await runDueJobs()
    expect(smtp.received).toHaveLength(6)
    expect(new Set(smtp.received.map((mail) => mail.messageId)).size).toBe(6)
  })

  it('tries again later when the mail server refuses, under the same Message-ID, then forgets whom it was for', async () => {
    const id = await enqueue('mail-reset', { email: someAddress() })
    smtp.refusing = true
    await runDueJobs()
    const job = await Job.findByPk(id, { rejectOnEmpty: true })
    expect(job).toMatchObject({ attempts: 1, doneAt: null, failedAt: null, leaseUntil: null })
    expect(job.runAfter.getTime()).toBeGreaterThan(Date.now() + 2000)
    expect(JSON.stringify(job)).not.toContain('451')

    smtp.refusing = false
    await job.update({ runAfter: new Date() })
    await runDueJobs()
    expect(letter()?.messageId).toBe(`<${id}@localhost>`)
    await job.reload()
    expect(job).toMatchObject({ attempts: 2, payload: {} })
    expect(job.doneAt).not.toBeNull()
  })

  it('takes over a job whose runner died', async () => {
    const id = await enqueue('mail-reset', { email: someAddress() })
    const gone = { leaseOwner: newId(), leaseUntil: new Date(Date.now() + 60_000), attempts: 1 }
    await Job.update(gone, { where: { id } })
    expect(await runDueJobs()).toBe(0)
    await Job.update({ leaseUntil: new Date(Date.now() - 1) }, { where: { id } })
    expect(await runDueJobs()).toBe(1)
    expect(smtp.received).toHaveLength(1)
  })

  it('gives up after ten tries', async () => {
    const id = await enqueue('mail-reset', { email: someAddress() })
    await Job.update({ attempts: 9 }, { where: { id } })
    smtp.refusing = true
    await runDueJobs()
    expect((await Job.findByPk(id))?.failedAt).not.toBeNull()
  })
})

describe('letters', () => {
  it('have a text and an HTML part, link to the configured origin, and leave markup in names inert', async () => {
    const wanted = {
      email: someAddress(),
      name: '<b>Eve</b>\r\nBcc: x@y.z',
      workroomName: '<script>alert(1)</script>',
    }
    await enqueue('mail-join', wanted)
    await runDueJobs()
    expect(letter()?.text).toContain(`${process.env.APP_ORIGIN}/join/confirm?token=`)
    expect(letter()?.html).toContain('&lt;script&gt;')
    expect(letter()?.html).not.toContain('<script>')
    expect(letter()?.bcc).toBeUndefined()
    expect(letter()?.headers.get('auto-submitted')).toBe('auto-generated')
  })
})

describe('joining', () => {
  it('opens a workroom with its owner, once', async () => {
    const email = someAddress()
    await requestJoin({ email: ` ${email.toUpperCase()} `, name: 'Ada', workroomName: 'Ada sews' }, 'a place')
    await runDueJobs()
    const token = tokenInMail()
    expect(await openJoin(token)).toEqual({ email, name: 'Ada', workroomName: 'Ada sews' })
    const choice = { token, password: testPassword, unit: 'in', timeZone: 'Africa/Lagos' } as const
    await confirmJoin(choice)
    await refusal(confirmJoin(choice), 'invalid')
    expect(await openJoin(token)).toBeNull()

    const { sessionId } = await signIn({ email, password: testPassword }, 'a place')
    expect(await signedInBy(sessionId)).toMatchObject({
      actor: { roles: ['owner'] },
      workroom: { name: 'Ada sews', unit: 'in' },
    })
  })

  it('tells a known address by mail only, and gives it no second account', async () => {
    const { email } = await (await makeWorkroom()).person('owner')
    await requestJoin({ email, name: 'Again', workroomName: 'Again' }, 'a place')
    await runDueJobs()
    expect(letter()?.subject).toBe('You have a Chalkfold account already')
    expect(letter()?.text).not.toContain('token=')
  })

  it.each([
    ['short', 'nine chrs'],
    ['the word everybody uses', 'Password123'],
    ['a run of keys', 'qwertyuiop'],
    ['digits', '1234567890123'],
    ['a repetition', 'abcabcabcabc'],
    ['a common word in disguise', 'P@ssw0rd2026!'],
  ])('refuses a password that is %s', async (_what, password) => {
    const { problems } = await refusal(
      confirmJoin({ token: 'x', password, unit: 'in', timeZone: 'Africa/Lagos' }),
      'invalid',
    )
    expect(problems.map((problem) => problem.field)).toEqual(['password'])
  })
})

it.each(['ẹ̀kọ́ ṣíṣe aṣọ', 'молоко и нитки', 'correct horse battery', '8392746150283746'])(
  'takes the password %s',
  async (password) => {
    const choice = { token: 'x', password, unit: 'in', timeZone: 'Africa/Lagos' } as const
    const { problems } = await refusal(confirmJoin(choice), 'invalid')
    expect(problems.map((problem) => problem.field)).toEqual(['token'])
  },
)

describe('a forgotten password', () => {
  async function askFor() {
    const person = await (await makeWorkroom()).person('owner')
    await requestReset({ email: person.email }, 'a place')
    await runDueJobs()
    return { ...person, token: tokenInMail() }
  }

  it('is replaced once; every session ends and a mail says so', async () => {
    const { actor, email, token } = await askFor()
    const password = 'seven green buttons'
    await resetPassword({ token, password })
    expect(await signedInBy(actor.sessionId)).toBeNull()
    await refusal(signIn({ email, password: testPassword }, 'a place'), 'not-signed-in')
    await signIn({ email, password }, 'a place')
    await refusal(resetPassword({ token, password: 'another good one' }), 'invalid')
    await runDueJobs()
    expect(smtp.received.at(-1)?.subject).toBe('Your password was changed')
  })

  it('opens an account again that wrong tries had closed', async () => {
    const { email, token } = await askFor()
    const tries = Array.from({ length: 10 }, () => signIn({ email, password: 'a wrong one' }, 'a place'))
    await Promise.allSettled(tries)
    await refusal(signIn({ email, password: testPassword }, 'a place'), 'limited')
    const password = 'seven green buttons'
    await resetPassword({ token, password })
    await signIn({ email, password }, 'a place')
  })

  it('gives way to one only when a link is used twice at once', async () => {
    const { token } = await askFor()
    const tries = ['eleven red needles', 'twelve blue needles'].map((password) =>
      resetPassword({ token, password }),
    )
    const outcomes = await Promise.allSettled(tries)
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
  })

  it('cannot be replaced after an hour, nor by what stands in the database', async () => {
    const { token, email } = await askFor()
    const row = await Token.findOne({ where: { email }, rejectOnEmpty: true })
    expect(JSON.stringify(row)).not.toContain(token)
    expect(await openReset(row.tokenHash)).toBeNull()
    await row.update({ expiresAt: new Date(Date.now() - 1) })
    await refusal(resetPassword({ token, password: 'seven green buttons' }), 'invalid')
  })

  it('tells an unknown address so, by mail only', async () => {
    const email = someAddress()
    await requestReset({ email }, 'a place')
    await runDueJobs()
    expect(letter()?.subject).toBe('No Chalkfold account with this address')
    expect(letter()?.text).not.toContain('token=')
  })
})

describe('an invitation', () => {
  async function invited() {
    const owner = await (await makeWorkroom()).person('owner')
    const input = { id: newId(), email: someAddress(), roles: ['maker', 'student'] }
    await inviteMember(owner.actor, input)
    await inviteMember(owner.actor, input)
    return { owner, input }
  }

  it('sent twice by a retry is one mail with both roles', async () => {
    await invited()
    await runDueJobs()
    expect(smtp.received).toHaveLength(1)
    expect(await openInvitation(tokenInMail())).toMatchObject({ roles: ['maker', 'student'], known: false })
  })

  it('that is withdrawn before the mail left is not sent', async () => {
    const { owner, input } = await invited()
    await withdrawInvitation(owner.actor, input.id)
    await runDueJobs()
    expect(smtp.received).toEqual([])
  })
})
