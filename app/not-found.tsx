import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'

export default function NotFound() {
  return (
    <main className="grid min-h-[70dvh] place-items-center">
      <EmptyState
        level={1}
        title="There is nothing on this page"
        action={<ButtonLink href="/">Go to the start</ButtonLink>}
      >
        <p>
          The address may be mistyped, the link may have been taken back, or it belongs to another workroom.
        </p>
      </EmptyState>
    </main>
  )
}
