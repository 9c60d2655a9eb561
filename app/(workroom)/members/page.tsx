import type { Metadata } from 'next'
import { forPage, requireActor } from '@/app/_server/session'
import { Page } from '@/components/ui/page'
import { listInvitations } from '@/db/access/invitations'
import { listMembers } from '@/db/access/members'
import { getWorkroom } from '@/db/access/workrooms'
import { InvitationList } from './_parts/invitation-list'
import { InviteDialog } from './_parts/invite-dialog'
import { MemberTable } from './_parts/member-table'

export const metadata: Metadata = { title: 'Members' }

export default async function MembersPage() {
  const actor = await requireActor('/members')
  const [members, invitations, { name, timeZone }] = await forPage(
    Promise.all([listMembers(actor), listInvitations(actor), getWorkroom(actor)]),
  )
  return (
    <Page
      title="Members"
      lead={`Who works and learns in ${name}, and what each may do.`}
      actions={<InviteDialog />}
    >
      <MemberTable members={members} />
      {invitations.length > 0 && (
        <section className="mt-12">
          <h2 className="mb-4 text-lg font-semibold">Invited, not here yet</h2>
          <InvitationList invitations={invitations} timeZone={timeZone} />
        </section>
      )}
    </Page>
  )
}
