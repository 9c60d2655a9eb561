import { afterEach, expect, it, vi } from 'vitest'
import { appOrigin, assertSettings } from '@/app/_server/config'

const right = {
  CHALKFOLD_ENV: 'production',
  DATABASE_URL: 'mariadb://chalkfold:x@db:3306/chalkfold',
  SMTP_URL: 'smtps://mail.example',
  MAIL_FROM: 'post@chalkfold.example',
  NEXTAUTH_SECRET: 'q7G2-nothing-anybody-would-guess-91x',
  APP_ORIGIN: 'https://chalkfold.example',
}

function given(change: Partial<typeof right>): void {
  for (const [name, value] of Object.entries({ ...right, ...change })) vi.stubEnv(name, value)
}
afterEach(() => {
  vi.unstubAllEnvs()
})

it('starts in production with everything set', () => {
  given({})
  expect(() => assertSettings()).not.toThrow()
  expect(appOrigin()).toBe('https://chalkfold.example')
})

it.each([
  ['NEXTAUTH_SECRET', { NEXTAUTH_SECRET: '' }],
  ['NEXTAUTH_SECRET', { NEXTAUTH_SECRET: 'changeme' }],
  ['APP_ORIGIN', { APP_ORIGIN: 'http://chalkfold.example' }],
  ['SMTP_URL', { SMTP_URL: '' }],
  ['DATABASE_URL', { DATABASE_URL: '' }],
])('does not start in production with a bad %s, and names it', (name, change) => {
  given(change)
  expect(() => assertSettings()).toThrow(name)
})

it('starts anywhere else without them', () => {
  given({ CHALKFOLD_ENV: 'development', NEXTAUTH_SECRET: '', SMTP_URL: '' })
  expect(() => assertSettings()).not.toThrow()
})
