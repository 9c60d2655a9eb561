import 'server-only'
import type { OpenedShare } from '@/db/access/shares'
import type { Printable } from '../print/pattern-of'

/** What a visitor's paper says: the draft, the workroom it comes from, and the time there. */
export function printableOf(share: OpenedShare): Printable {
  const { draftName, workroomName, timeZone, savedAt, order } = share
  return { name: draftName, maker: workroomName, savedAt, timeZone, zoneSaid: true, order }
}
