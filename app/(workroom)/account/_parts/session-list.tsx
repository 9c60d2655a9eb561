import { Monitor, Smartphone } from 'lucide-react'
import { Moment } from '@/components/ui/moment'
import type { OwnSession } from '@/db/access/own-sessions'
import { EndSessionButton } from './end-session-button'

const handheld = /iPhone|iPad|Android/

/** Every device the person is signed in on, in words. This one is marked; the others can be signed out. */
export function SessionList({ sessions }: { readonly sessions: readonly OwnSession[] }) {
  return (
    <ul className="border-t hairline">
      {sessions.map(({ id, device, lastSeenAt, startedAt, here }) => {
        const Icon = handheld.test(device) ? Smartphone : Monitor
        const name = device || 'A device we cannot name'
        return (
          <li key={id} className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b hairline py-3">
            <Icon size={20} aria-hidden className="shrink-0 text-walnut" />
            <div className="min-w-0 flex-1 basis-56">
              <p className="font-semibold">
                {name}
                {here && <span className="font-normal text-fern"> · this device</span>}
              </p>
              <p className="text-sm text-walnut">
                {here ? 'Signed in ' : 'Last seen '}
                <Moment at={here ? startedAt : lastSeenAt} />
              </p>
            </div>
            {!here && <EndSessionButton id={id} device={name} />}
          </li>
        )
      })}
    </ul>
  )
}
