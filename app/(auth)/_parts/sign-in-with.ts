'use client'

import { signIn } from 'next-auth/react'

const words: Readonly<Record<string, string>> = {
  'not-signed-in': 'The e-mail address or the password is not right.',
  limited: 'Too many tries. Wait a quarter of an hour, or choose a new password.',
}

/** Signs in on this device. The page decides where to go afterwards. */
export async function signInWith(email: string, password: string) {
  const answer = await signIn('credentials', { email, password, redirect: false })
  if (answer?.ok) return { ok: true as const, value: null }
  const message =
    words[answer?.error ?? ''] ?? 'Signing in does not work at the moment. Try again in a minute.'
  return { ok: false as const, problems: [{ field: '', message }] }
}
