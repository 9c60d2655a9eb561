import type { Metadata } from 'next'
import { MailboxNote } from '../_parts/mailbox-note'
import { JoinForm } from './_parts/join-form'

export const metadata: Metadata = { title: 'Join' }

export default function JoinPage() {
  return <JoinForm mailbox={<MailboxNote />} />
}
