import type { Metadata } from 'next'
import { requireSignedIn } from '@/app/_server/session'
import { Card } from '@/components/ui/card'
import { Page } from '@/components/ui/page'
import { PasswordForm } from './_parts/password-form'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const { userName, email } = await requireSignedIn('/account')
  return (
    <Page title="Your account" lead={`${userName}, ${email}`} narrow>
      <Card title="Change the password">
        <p className="mb-5 text-walnut">Every other device is signed out then.</p>
        <PasswordForm email={email} />
      </Card>
    </Page>
  )
}
