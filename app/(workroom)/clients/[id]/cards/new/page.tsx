import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { getClient } from '@/db/access/clients'
import { getWorkroom } from '@/db/access/workrooms'
import { newId } from '@/db/new-id'
import { may } from '@/db/permissions'
import { usualMeasurements } from '../../../../_data/usual-measurements'
import { today } from '../../../../_data/dates'
import { CardForm } from '../../../../cards/_parts/card-form'

export const metadata: Metadata = { title: 'New measure card' }

export default async function NewCardPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const actor = await requireActor(`/clients/${id}/cards/new`)
  const [client, workroom] = await forPage(Promise.all([getClient(actor, id), getWorkroom(actor)]))
  const card = {
    id: newId(),
    clientId: id,
    name: 'Measurements',
    takenOn: today(),
    unit: workroom.unit,
    note: '',
    values: {},
  }
  const trail = [
    { href: '/clients', label: 'Clients' },
    { href: `/clients/${id}`, label: client.name },
  ]
  return (
    <Page
      title="New measure card"
      trail={trail}
      lead="From the head down to the floor. Write lengths as you say them: 36 1/2, 36½, 92.7 cm."
    >
      <CardForm
        card={card}
        isNew
        readOnly={false}
        usual={usualMeasurements()}
        draftable={may(actor, 'drafts', 'write')}
      />
    </Page>
  )
}
