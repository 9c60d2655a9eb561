import { ChevronsUpDown } from 'lucide-react'
import Link from 'next/link'
import { requireSignedIn } from '@/app/_server/session'
import { listOwnWorkrooms } from '@/db/access/workrooms'

/** The name of the workroom one is in; a way to the others when there are any. */
export async function WorkroomSwitcher() {
  const signedIn = await requireSignedIn()
  const workrooms = await listOwnWorkrooms(signedIn)
  const name = <span className="truncate">{signedIn.workroom?.name}</span>
  if (workrooms.length < 2) return <span className="flex min-w-0 font-semibold">{name}</span>
  return (
    <Link
      href="/workrooms"
      prefetch={false}
      className="flex min-h-10 min-w-0 items-center gap-1.5 rounded font-semibold text-ink no-underline hover:text-indigo"
    >
      {name}
      <ChevronsUpDown size={16} className="shrink-0 text-walnut" aria-hidden />
      <span className="sr-only">, switch workroom</span>
    </Link>
  )
}
