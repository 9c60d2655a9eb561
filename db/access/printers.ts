import 'server-only'
import { UniqueConstraintError } from 'sequelize'
import { invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Printer } from '../models/printer'
import type { Actor } from '../permissions'
import { type PrinterInput, printerShape } from '../shapes/printer'
import { knownId } from './known-id'

/** A printer as its user measured it: what it makes of 100 mm, across the paper's short side and along its long side. */
export interface PrinterDetails {
  readonly id: string
  readonly name: string
  readonly measured: { readonly short: number; readonly long: number }
}

/** A person has a few printers; a list that grows beyond this was filled by something else. */
const most = 30

const plain = ({ id, name, short, long }: Printer): PrinterDetails => ({
  id,
  name,
  measured: { short, long },
})

/** The printers that the person has measured, in whatever workroom, by name. */
export async function listPrinters(actor: Actor): Promise<readonly PrinterDetails[]> {
  const printers = await Printer.findAll({
    where: { userId: actor.userId },
    order: ['name', 'id'],
    limit: most,
  })
  return printers.map(plain)
}

/** Remembers a printer of the person's own. A name that is known is measured anew; the same id again is a retry. */
export async function keepPrinter(actor: Actor, input: PrinterInput): Promise<PrinterDetails> {
  const { id, name, short, long } = checkInput(printerShape, input)
  const own = { userId: actor.userId }
  const measuredAt = new Date()
  const known = await Printer.findOne({ where: { ...own, name } })
  if (known) return plain(await known.update({ short, long, measuredAt }))
  if ((await Printer.count({ where: own })) >= most)
    throw invalid('name', `You remember ${most} printers already. Forget one of them first.`)
  try {
    return plain(await Printer.create({ ...own, id, name, short, long, measuredAt }))
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    const made = await Printer.findOne({ where: { ...own, name } })
    if (!made) throw notFound('printer')
    return plain(await made.update({ short, long, measuredAt }))
  }
}

/** Forgets a printer of the person's own. @throws AccessError not-found, also for another person's */
export async function forgetPrinter(actor: Actor, id: string): Promise<void> {
  const gone = await Printer.destroy({ where: { userId: actor.userId, id: knownId(id, 'printer') } })
  if (gone === 0) throw notFound('printer')
}
