import type { Metadata } from 'next'
import { openJoin } from '@/db/access/joining'
import { FormSheet } from '../../_parts/form-sheet'
import { type Search, tokenOf } from '../../_parts/token-of'
import { UsedLink } from '../../_parts/used-link'
import { ConfirmForm } from './_parts/confirm-form'

export const metadata: Metadata = { title: 'Choose a password' }

export default async function ConfirmPage({ searchParams }: { searchParams: Search }) {
  const token = await tokenOf(searchParams)
  const opened = await openJoin(token)
  if (!opened) return <UsedLink again="/join" words="Join again" />
  return (
    <FormSheet
      title={`Welcome, ${opened.name}`}
      lead={`One step more and the workroom “${opened.workroomName}” is open.`}
    >
      <ConfirmForm token={token} email={opened.email} />
    </FormSheet>
  )
}
