import { Note } from '@/components/ui/error-note'

/** Where mail goes when no mail server is set up: only on a computer that keeps it on a page of its own. */
export function MailboxNote() {
  const page = process.env.MAIL_PAGE_URL
  if (!page) return null
  return (
    <Note kind="info" className="mt-8 text-sm">
      This is a demo: no mail leaves this computer. It is kept on{' '}
      <a href={page} target="_blank" rel="noreferrer" className="font-semibold text-indigo underline">
        the mailbox page
      </a>
      .
    </Note>
  )
}
