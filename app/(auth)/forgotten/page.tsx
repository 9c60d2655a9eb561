import type { Metadata } from 'next'
import { MailboxNote } from '../_parts/mailbox-note'
import { ForgottenForm } from './_parts/forgotten-form'

export const metadata: Metadata = { title: 'Forgotten password' }

export default function ForgottenPage() {
  return <ForgottenForm mailbox={<MailboxNote />} />
}
