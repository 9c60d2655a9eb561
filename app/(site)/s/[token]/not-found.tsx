import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'

/** The one page for links that are unknown, have run out or were taken back. */
export default function NoSuchLink() {
  return (
    <EmptyState
      level={1}
      title="This link shows nothing now"
      action={<ButtonLink href="/">See what Chalkfold is</ButtonLink>}
    >
      <p>
        It has run out, it was taken back, or part of the address is missing. Ask the person who sent it for a
        new one.
      </p>
    </EmptyState>
  )
}
