import 'server-only'

const defaults = new Set([
  '',
  'secret',
  'changeme',
  'change-me',
  'default',
  'development',
  'password',
  'test',
])

/** Settings that must be there, and what is wrong with them, in words for whoever starts the server. */
function settingProblems(env: NodeJS.ProcessEnv): string[] {
  const problems: string[] = []
  for (const name of ['DATABASE_URL', 'SMTP_URL', 'MAIL_FROM', 'NEXTAUTH_SECRET', 'APP_ORIGIN'] as const)
    if (!env[name]) problems.push(`${name} is not set.`)
  const secret = env.NEXTAUTH_SECRET ?? ''
  if (secret !== '' && (secret.length < 32 || defaults.has(secret.toLowerCase())))
    problems.push('NEXTAUTH_SECRET is a default or too short: give it at least 32 random characters.')
  if (env.APP_ORIGIN && !env.APP_ORIGIN.startsWith('https://'))
    problems.push('APP_ORIGIN must begin with https:// in production.')
  return problems
}

/** Whether this server serves real customers. */
export function isProduction(): boolean {
  return process.env.CHALKFOLD_ENV === 'production'
}

/** @throws Error naming every setting that is missing or unsafe, in production only */
export function assertSettings(): void {
  if (!isProduction()) return
  const problems = settingProblems(process.env)
  if (problems.length > 0)
    throw new Error(`Chalkfold does not start:\n${problems.join('\n')}\nSee .env.example.`)
}

/** The origin that links are built from and that requests must come from. Never the Host header. @throws Error */
export function appOrigin(): string {
  const origin = process.env.APP_ORIGIN
  if (!origin) throw new Error('APP_ORIGIN is not set: see .env.example.')
  return new URL(origin).origin
}
