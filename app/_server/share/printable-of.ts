import 'server-only'
import type { OpenedShare } from '@/db/access/shares'
import type { Printable } from '../print/pattern-of'

/** What a visitor's paper says: the draft and the workroom it comes from. */
export function printableOf(share: OpenedShare): Printable {
  const { draftName, workroomName, savedAt, order } = share
  return { name: draftName, maker: workroomName, savedAt, order }
}
