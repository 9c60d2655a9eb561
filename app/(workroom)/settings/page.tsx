import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { getWorkroom } from '@/db/access/workrooms'
import { may } from '@/db/permissions'
import { type AllowanceId, allowanceNames } from '@/db/shapes/workroom'
import { SettingsForm } from './_parts/settings-form'

export const metadata: Metadata = { title: 'Settings' }

const allowances = (Object.keys(allowanceNames) as AllowanceId[]).map((id) => ({
  id,
  name: allowanceNames[id],
}))

function currencyChoices() {
  const names = new Intl.DisplayNames('en-GB', { type: 'currency' })
  return Intl.supportedValuesOf('currency').map((code) => ({
    value: code,
    label: `${code}, ${names.of(code)}`,
  }))
}

const timeZoneChoices = () =>
  [...new Set([...Intl.supportedValuesOf('timeZone'), 'UTC'])].map((zone) => ({
    value: zone,
    label: zone.replaceAll('_', ' '),
  }))

export default async function SettingsPage() {
  const actor = await requireActor('/settings')
  if (!may(actor, 'workroom', 'write')) notFound()
  return (
    <Page title="Settings" lead="They hold for everybody in the workroom.">
      <SettingsForm
        settings={await getWorkroom(actor)}
        currencies={currencyChoices()}
        timeZones={timeZoneChoices()}
        allowances={allowances}
      />
    </Page>
  )
}
