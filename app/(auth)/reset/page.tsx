import type { Metadata } from 'next'
import { openReset } from '@/db/access/new-passwords'
import { FormSheet } from '../_parts/form-sheet'
import { type Search, tokenOf } from '../_parts/token-of'
import { UsedLink } from '../_parts/used-link'
import { ResetForm } from './_parts/reset-form'

export const metadata: Metadata = { title: 'Choose a new password' }

export default async function ResetPage({ searchParams }: { searchParams: Search }) {
  const token = await tokenOf(searchParams)
  const opened = await openReset(token)
  if (!opened) return <UsedLink again="/forgotten" words="Ask for a new link" />
  return (
    <FormSheet
      title="Choose a new password"
      lead="All your devices are signed out; then you sign in with this one."
    >
      <ResetForm token={token} email={opened.email} />
    </FormSheet>
  )
}
