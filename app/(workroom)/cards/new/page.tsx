import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { getWorkroom } from '@/db/access/workrooms'
import { newId } from '@/db/new-id'
import { may } from '@/db/permissions'
import { today } from '../../_data/dates'
import { usualMeasurements } from '../../_data/usual-measurements'
import { CardForm } from '../_parts/card-form'

export const metadata: Metadata = { title: 'New measure card' }

export default async function NewOwnCardPage() {
  const actor = await requireActor('/cards/new')
  const { unit } = await forPage(getWorkroom(actor))
  const card = {
    id: newId(),
    clientId: null,
    name: 'My measurements',
    takenOn: today(),
    unit,
    note: '',
    values: {},
  }
  return (
    <Page title="New measure card" trail={[{ href: '/cards', label: 'My measurements' }]}>
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
