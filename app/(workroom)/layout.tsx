import type { ReactNode } from 'react'
import { buildId } from '@/app/_server/build'
import { requireSignedIn } from '@/app/_server/session'
import { ToastReady } from '@/components/ui/toast'
import { may } from '@/db/permissions'
import { OnThisDevice } from './_parts/on-this-device'
import { WorkroomBar } from './_parts/workroom-bar'
import { WorkroomMenu } from './_parts/workroom-menu'

/** Everything signed in: the bar with the mark, the workroom's places, and who is here. */
export default async function WorkroomLayout({ children }: { children: ReactNode }) {
  const { actor, userName } = await requireSignedIn()
  const places = actor
    ? [
        { href: '/clients', label: 'Clients', open: may(actor, 'clients', 'read') },
        { href: '/drafts', label: 'Drafts', open: may(actor, 'drafts', 'read') },
        { href: '/cards', label: 'My measurements', open: actor.roles.includes('student') },
        { href: '/members', label: 'Members', open: may(actor, 'members', 'read') },
        { href: '/settings', label: 'Settings', open: may(actor, 'workroom', 'write') },
      ].filter((place) => place.open)
    : []
  return (
    <>
      <WorkroomBar places={places} menu={<WorkroomMenu name={userName} />} />
      <main id="main">{children}</main>
      <ToastReady />
      {actor && <OnThisDevice build={buildId} userId={actor.userId} workroomId={actor.workroomId} />}
    </>
  )
}
