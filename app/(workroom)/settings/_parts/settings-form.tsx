'use client'

import { useRouter } from 'next/navigation'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { ErrorNote } from '@/components/ui/error-note'
import { Field, TextField } from '@/components/ui/field'
import { type Choice, Select } from '@/components/ui/select'
import { useToast } from '@/components/ui/toast'
import type { AllowanceId, WorkroomSettings } from '@/db/shapes/workroom'
import { saveSettings } from '../actions'
import { allowanceText } from './allowance-text'

const units = [
  { value: 'in', label: 'Inches with fractions' },
  { value: 'cm', label: 'Centimetres' },
]

export interface SettingsFormProps {
  readonly settings: WorkroomSettings
  readonly currencies: readonly Choice[]
  readonly timeZones: readonly Choice[]
  readonly allowances: readonly { readonly id: AllowanceId; readonly name: string }[]
}

export function SettingsForm({ settings, currencies, timeZones, allowances }: SettingsFormProps) {
  const router = useRouter()
  const say = useToast()
  const form = useActionForm(saveSettings, () => {
    say('The settings are saved.')
    router.refresh()
  })
  const fields = [
    'name',
    'note',
    'unit',
    'currency',
    'timeZone',
    ...allowances.map(({ id }) => `allowances.${id}`),
  ]
  const field = (name: 'name' | 'note' | 'unit' | 'currency' | 'timeZone') => ({
    name,
    defaultValue: settings[name],
    error: form.errorOf(name),
  })
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-6" noValidate>
      <Card title="The workroom">
        <div className="grid gap-5 sm:grid-cols-2">
          <Field label="Name" {...field('name')} />
          <Select
            label="Unit"
            hint="Each card and draft can use the other one."
            choices={units}
            {...field('unit')}
          />
          <Select label="Currency" hint="Of quotes and orders." choices={currencies} {...field('currency')} />
          <Select
            label="Time zone"
            hint="Says when a day ends: for collection dates and links."
            choices={timeZones}
            {...field('timeZone')}
          />
          <TextField label="Note" className="sm:col-span-2" hint="For the members only." {...field('note')} />
        </div>
      </Card>
      <Card title="Default allowances">
        <p className="mb-5 text-walnut">
          New drafts start from these. Write them as you say them, such as 1/2, 3/4 in or 1.5 cm.
        </p>
        <input type="hidden" name="typedIn" value={settings.unit} />
        <div className="grid grid-cols-2 gap-5 sm:grid-cols-3">
          {allowances.map(({ id, name }) => (
            <Field
              key={id}
              label={name}
              name={`allowances.${id}`}
              defaultValue={allowanceText(settings.allowances[id])}
              error={form.errorOf(`allowances.${id}`)}
              autoComplete="off"
            />
          ))}
        </div>
      </Card>
      <ErrorNote>{form.errorBeside(...fields)}</ErrorNote>
      <Button type="submit" look="primary" busy={form.busy} className="justify-self-start">
        Save the settings
      </Button>
    </form>
  )
}
