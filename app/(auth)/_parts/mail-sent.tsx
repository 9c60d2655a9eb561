import type { ReactNode } from 'react'
import { FormSheet } from './form-sheet'
import { TextLink } from './text-link'

/** After a mail was asked for. It says the same whoever asked. */
export function MailSent({
  to,
  children,
  mailbox,
}: {
  readonly to: string
  readonly children: ReactNode
  readonly mailbox: ReactNode
}) {
  return (
    <FormSheet
      title="Look into your mailbox"
      lead={
        <>
          <p role="status">
            We have sent a mail to <strong className="break-all text-ink">{to}</strong>.
          </p>
          <p className="mt-2">{children}</p>
          {mailbox}
        </>
      }
      foot={
        <p>
          Nothing there after some minutes? Look in the junk folder, then check the address and ask again.{' '}
          <TextLink href="/sign-in">Back to sign-in</TextLink>
        </p>
      }
    />
  )
}
