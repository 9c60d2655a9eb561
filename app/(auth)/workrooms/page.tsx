import type { Metadata } from 'next'
import { requireSignedIn } from '@/app/_server/session'
import { listOwnWorkrooms } from '@/db/access/workrooms'
import { FormSheet } from '../_parts/form-sheet'
import { SignOutButton } from '../_parts/sign-out-button'
import { WorkroomChoice } from './_parts/workroom-choice'

export const metadata: Metadata = { title: 'Workrooms' }

export default async function WorkroomsPage() {
  const signedIn = await requireSignedIn('/workrooms')
  const workrooms = await listOwnWorkrooms(signedIn)
  return (
    <FormSheet
      title={workrooms.length > 0 ? 'Choose a workroom' : 'You are in no workroom'}
      lead={
        workrooms.length > 0
          ? `You are signed in as ${signedIn.email}.`
          : `You are signed in as ${signedIn.email}, but no workroom lets you in at the moment. Ask its owner to invite you again.`
      }
      foot={
        <div>
          <SignOutButton />
        </div>
      }
    >
      {workrooms.length > 0 && <WorkroomChoice workrooms={workrooms} present={signedIn.workroom?.id} />}
    </FormSheet>
  )
}
