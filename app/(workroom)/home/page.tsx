import { redirect } from 'next/navigation'
import { requireActor } from '@/app/_server/session'
import { reachOf } from '@/db/permissions'

/** Where somebody's work begins: with the clients for whoever has all of them, otherwise with the drafts. */
export default async function HomePage() {
  const actor = await requireActor()
  redirect(reachOf(actor, 'clients', 'read').has('all') ? '/clients' : '/drafts')
}
