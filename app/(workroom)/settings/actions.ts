'use server'

import * as z from 'zod'
import { log } from '@/app/_server/log'
import { workroomAction } from '@/app/_server/session'
import { updateWorkroom } from '@/db/access/workrooms'
import { unitShape } from '@/db/shapes/length'
import { type AllowanceId, allowanceNames, type WorkroomSettings } from '@/db/shapes/workroom'
import { parseLength } from '@/drafting/lengths'

const text = z.string().max(1000)
const ids = Object.keys(allowanceNames) as AllowanceId[]
type AllowanceField = `allowances.${AllowanceId}`

const settingsForm = z.strictObject({
  name: text,
  note: text,
  unit: unitShape,
  currency: text,
  timeZone: text,
  /** The unit that bare numbers were typed in: choosing another one for the workroom does not change them. */
  typedIn: unitShape,
  ...(Object.fromEntries(ids.map((id) => [`allowances.${id}`, text])) as Record<AllowanceField, typeof text>),
})

/** Changes the workroom's settings. */
export const saveSettings = workroomAction(settingsForm, async (actor, form) => {
  const { name, note, unit, currency, timeZone, typedIn } = form
  const allowances = Object.fromEntries(
    ids.map((id) => {
      const field: AllowanceField = `allowances.${id}`
      return [id, { mm: parseLength(form[field], typedIn, field), typed: form[field].trim(), unit: typedIn }]
    }),
  ) as WorkroomSettings['allowances']
  await updateWorkroom(actor, { name, note, unit, currency, timeZone, allowances })
  log.info({ by: actor.userId, workroomId: actor.workroomId }, 'settings changed')
})
