import * as z from 'zod'
import { workroomRoute } from '@/app/_server/session'
import { keepPrinter, listPrinters } from '@/db/access/printers'
import { printerShape } from '@/db/shapes/printer'

/** The printers that the person has measured. */
export const GET = workroomRoute(z.strictObject({}), (actor) => listPrinters(actor))

/** Remembers what a printer makes of 100 mm. */
export const POST = workroomRoute(printerShape, keepPrinter)
