import type { Invitation } from '@/db/access/invitations'
import { roleWords } from './role-words'
import { WithdrawButton } from './withdraw-button'

/** Invitations that nobody has accepted yet. */
export function InvitationList({
  invitations,
  timeZone,
}: {
  readonly invitations: readonly Invitation[]
  readonly timeZone: string
}) {
  const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone })
  return (
    <ul className="border-t hairline">
      {invitations.map(({ id, email, roles, expiresAt }) => (
        <li
          key={id}
          className="flex flex-wrap items-center justify-between gap-x-6 gap-y-1 border-b hairline py-3"
        >
          <div className="min-w-0">
            <p className="font-semibold break-all">{email}</p>
            <p className="text-sm text-walnut">
              {roles.map((role) => roleWords[role].name).join(', ')}; the link works until{' '}
              {day.format(new Date(expiresAt))}
            </p>
          </div>
          <WithdrawButton id={id} email={email} />
        </li>
      ))}
    </ul>
  )
}
