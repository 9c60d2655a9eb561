import type { Metadata } from 'next'
import { requireSignedIn } from '@/app/_server/session'
import { Card } from '@/components/ui/card'
import { Page } from '@/components/ui/page'
import { listOwnSessions } from '@/db/access/own-sessions'
import { PasswordForm } from './_parts/password-form'
import { SessionList } from './_parts/session-list'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const signedIn = await requireSignedIn('/account')
  const { userName, email } = signedIn
  return (
    <Page title="Your account" lead={`${userName}, ${email}`} narrow>
      <div className="grid gap-6">
        <Card title="Where you are signed in">
          <p className="mb-4 text-walnut">One you do not know? Sign it out here, then change the password.</p>
          <SessionList sessions={await listOwnSessions(signedIn)} />
        </Card>
        <Card title="Change the password">
          <p className="mb-5 text-walnut">Every other device is signed out then.</p>
          <PasswordForm email={email} />
        </Card>
      </div>
    </Page>
  )
}
