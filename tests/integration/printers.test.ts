import { expect, it } from 'vitest'
import { forgetPrinter, keepPrinter, listPrinters } from '@/db/access/printers'
import { newId } from '@/db/new-id'
import { refusal } from '../support/refusal'
import { makeWorkroom } from '../support/workroom'

const upstairs = () => ({ id: newId(), name: 'Upstairs', short: 98.5, long: 99.2 })

it('remembers a printer for the person who measured it, whatever workroom they are in', async () => {
  const workroom = await makeWorkroom()
  const [owner, drafter] = [await workroom.person('owner'), await workroom.person('drafter')]
  const kept = await keepPrinter(owner.actor, upstairs())
  expect(await listPrinters(owner.actor)).toEqual([
    { id: kept.id, name: 'Upstairs', measured: { short: 98.5, long: 99.2 } },
  ])
  expect(await listPrinters(drafter.actor)).toEqual([])
  await refusal(forgetPrinter(drafter.actor, kept.id), 'not-found')
  await forgetPrinter(owner.actor, kept.id)
  expect(await listPrinters(owner.actor)).toEqual([])
})

it('measures a known printer anew instead of listing it twice, and a retry changes nothing', async () => {
  const { actor } = await (await makeWorkroom()).person('maker')
  const first = upstairs()
  await keepPrinter(actor, first)
  await keepPrinter(actor, first)
  await keepPrinter(actor, { ...upstairs(), short: 99 })
  expect(await listPrinters(actor)).toMatchObject([{ id: first.id, measured: { short: 99, long: 99.2 } }])
})

it.each([
  ['short', 94],
  ['long', 106],
  ['short', Number.NaN],
])('refuses a square whose %s side is %s mm', async (side, mm) => {
  const { actor } = await (await makeWorkroom()).person('drafter')
  const refused = await refusal(keepPrinter(actor, { ...upstairs(), [side]: mm }), 'invalid')
  expect(refused).toMatchObject({ problems: [{ field: side }] })
})
