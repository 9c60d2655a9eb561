import { readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { Visitor } from '../support/visitor'
import { makeWorkroom } from '../support/workroom'

const pages = ['/sign-in', '/join', '/members']

async function visit(path: string) {
  const { actor } = await (await makeWorkroom()).person('owner')
  const visitor = path === '/members' ? await Visitor.signedIn(actor.sessionId) : new Visitor()
  const reply = await visitor.get(path)
  return { ...reply, policy: reply.headers.get('content-security-policy') ?? '' }
}

describe.each(pages)('the answer for %s', (path) => {
  it('lets only our own scripts run, each time under a new nonce that stands on every script', async () => {
    const [first, second] = [await visit(path), await visit(path)]
    const nonceOf = (policy: string) => /script-src [^;]*'nonce-([^']+)'/.exec(policy)?.[1] ?? ''
    expect(nonceOf(first.policy)).not.toBe('')
    expect(nonceOf(first.policy)).not.toBe(nonceOf(second.policy))
    expect(first.policy).not.toMatch(/script-src[^;]*unsafe/)
    for (const words of [
      "object-src 'none'",
      "base-uri 'none'",
      "frame-ancestors 'none'",
      "worker-src 'self'",
    ])
      expect(first.policy).toContain(words)
    const scripts = first.text.match(/<script[^>]*>/g) ?? []
    expect(scripts.length).toBeGreaterThan(0)
    expect(scripts.filter((script) => !script.includes(`nonce="${nonceOf(first.policy)}"`))).toEqual([])
  })

  it('is not sniffed, not kept, and does not say what it runs on', async () => {
    const { headers } = await visit(path)
    expect(headers.get('x-content-type-options')).toBe('nosniff')
    expect(headers.get('cache-control')).toContain('no-store')
    expect(headers.get('x-powered-by')).toBeNull()
    expect(headers.get('referrer-policy')).toMatch(/^(same-origin|no-referrer)$/)
  })
})

it('keeps secrets out of what browsers load', () => {
  const folder = join(process.env.NEXT_DIST_DIR ?? '.next', 'static')
  const files = readdirSync(folder, { recursive: true, withFileTypes: true }).filter((entry) =>
    entry.isFile(),
  )
  const password = new URL(process.env.DATABASE_URL ?? '').password
  const secrets = [
    process.env.NEXTAUTH_SECRET ?? '',
    process.env.FILES_SECRET_KEY ?? '',
    process.env.STRIPE_SECRET_KEY ?? '',
    password,
    'sequelize',
    'argon2',
    'memoryCost',
  ]
  expect(secrets.every((secret) => secret.length > 5)).toBe(true)
  const leaks = files.filter((file) => {
    const text = readFileSync(join(file.parentPath, file.name), 'utf8')
    return secrets.some((secret) => text.includes(secret))
  })
  expect(leaks.map((file) => file.name)).toEqual([])
})
