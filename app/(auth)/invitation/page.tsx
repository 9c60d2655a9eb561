import type { Metadata } from 'next'
import { currentSession } from '@/app/_server/session'
import { ButtonLink } from '@/components/ui/button'
import { openInvitation } from '@/db/access/invitations'
import { FormSheet } from '../_parts/form-sheet'
import { SignOutButton } from '../_parts/sign-out-button'
import { type Search, tokenOf } from '../_parts/token-of'
import { UsedLink } from '../_parts/used-link'
import { AcceptButton } from './_parts/accept-button'
import { AcceptForm } from './_parts/accept-form'

export const metadata: Metadata = { title: 'Invitation' }

export default async function InvitationPage({ searchParams }: { searchParams: Search }) {
  const token = await tokenOf(searchParams)
  const [invitation, signedIn] = await Promise.all([openInvitation(token), currentSession()])
  if (!invitation) return <UsedLink again="/sign-in" words="Go to sign-in" />
  const { email, invitedBy, roles, workroomName, known } = invitation
  const here = `/invitation?token=${encodeURIComponent(token)}`
  const other = signedIn !== null && signedIn.email !== email
  return (
    <FormSheet
      title={`Come into ${workroomName}`}
      lead={
        <p>
          {invitedBy} invites <strong className="break-all text-ink">{email}</strong> as{' '}
          <strong className="text-ink">{roles.join(' and ')}</strong>.
        </p>
      }
    >
      {other ? (
        <div className="grid gap-4">
          <p>
            You are signed in as <strong className="break-all">{signedIn.email}</strong>. Sign out, then open
            the link again.
          </p>
          <SignOutButton to={here} />
        </div>
      ) : signedIn ? (
        <AcceptButton token={token} />
      ) : known ? (
        <ButtonLink look="primary" href={`/sign-in?callbackUrl=${encodeURIComponent(here)}`}>
          Sign in to accept
        </ButtonLink>
      ) : (
        <AcceptForm token={token} email={email} />
      )}
    </FormSheet>
  )
}
