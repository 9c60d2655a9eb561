import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { getClient } from '@/db/access/clients'
import { ClientForm } from '../../_parts/client-form'

export const metadata: Metadata = { title: 'Client' }

export default async function EditClientPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/clients/${id}/edit`)
  const client = await forPage(getClient(actor, id))
  const trail = [
    { href: '/clients', label: 'Clients' },
    { href: `/clients/${id}`, label: client.name },
  ]
  return (
    <Page title="Name and contact" trail={trail} narrow>
      <ClientForm client={client} />
    </Page>
  )
}
