import { Table } from '@/components/ui/table'
import type { Member } from '@/db/access/members'
import { MemberActions } from './member-actions'
import { roleWords } from './role-words'

const rolesOf = (member: Member) => member.roles.map((role) => roleWords[role].name).join(', ')

/** Everybody in the workroom. */
export function MemberTable({ members }: { readonly members: readonly Member[] }) {
  return (
    <Table
      caption="Members"
      rows={members}
      rowKey={(member) => member.membershipId}
      columns={[
        {
          id: 'name',
          head: 'Name',
          cell: (member) => (
            <>
              <span className="font-semibold">{member.name}</span>
              {member.self && <span className="ml-2 text-sm text-walnut">you</span>}
            </>
          ),
        },
        {
          id: 'email',
          head: 'E-mail address',
          cell: (member) => <span className="break-all">{member.email}</span>,
        },
        {
          id: 'roles',
          head: 'Roles',
          cell: (member) =>
            member.disabled ? <span className="text-madder">Shut out</span> : rolesOf(member),
        },
        {
          id: 'change',
          head: <span className="sr-only">Change</span>,
          end: true,
          cell: (member) => <MemberActions member={member} />,
        },
      ]}
    />
  )
}
