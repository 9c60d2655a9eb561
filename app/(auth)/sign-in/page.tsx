import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { currentSession } from '@/app/_server/session'
import { safePath } from '@/app/_server/session/safe-path'
import { FormSheet } from '../_parts/form-sheet'
import { TextLink } from '../_parts/text-link'
import { SignInForm } from './_parts/sign-in-form'

export const metadata: Metadata = { title: 'Sign in' }

type Search = Promise<Record<string, string | string[] | undefined>>

export default async function SignInPage({ searchParams }: { searchParams: Search }) {
  const { callbackUrl } = await searchParams
  const next = safePath(typeof callbackUrl === 'string' ? callbackUrl : null)
  if (await currentSession()) redirect(next)
  return (
    <FormSheet
      title="Sign in to your workroom"
      foot={
        <>
          <p>
            No workroom yet? <TextLink href="/join">Join with a new one</TextLink>
          </p>
          <p>
            Forgotten the password? <TextLink href="/forgotten">Choose a new one</TextLink>
          </p>
        </>
      }
    >
      <SignInForm next={next} />
    </FormSheet>
  )
}
