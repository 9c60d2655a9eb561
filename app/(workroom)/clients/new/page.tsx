import type { Metadata } from 'next'
import { requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { ClientForm } from '../_parts/client-form'

export const metadata: Metadata = { title: 'New client' }

export default async function NewClientPage() {
  await requireActor('/clients/new')
  return (
    <Page title="New client" trail={[{ href: '/clients', label: 'Clients' }]} narrow>
      <ClientForm />
    </Page>
  )
}
