import { CircleAlert, CircleCheck, Info, TriangleAlert } from 'lucide-react'
import type { ReactNode } from 'react'
import { classes } from './classes'

const kinds = {
  error: { Icon: CircleAlert, colour: 'border-madder text-madder', role: 'alert' },
  caution: { Icon: TriangleAlert, colour: 'border-weld text-weld', role: undefined },
  good: { Icon: CircleCheck, colour: 'border-fern text-fern', role: 'status' },
  info: { Icon: Info, colour: 'border-indigo text-indigo', role: undefined },
} as const

/** A note beside what it is about: an icon, a line of the dye that means it, and the words. */
export function Note({
  kind,
  children,
  className,
}: {
  readonly kind: keyof typeof kinds
  readonly children: ReactNode
  readonly className?: string
}) {
  const { Icon, colour, role } = kinds[kind]
  return (
    <div role={role} className={classes('flex gap-2.5 border-l-3 bg-sheet px-3 py-2', colour, className)}>
      <Icon size={18} className="mt-0.75 shrink-0" aria-hidden />
      <div className="min-w-0 text-ink">{children}</div>
    </div>
  )
}

/** What went wrong, said at once to a screen reader. Draws nothing without words. */
export function ErrorNote({
  children,
  className,
}: {
  readonly children?: ReactNode
  readonly className?: string
}) {
  if (!children) return null
  return (
    <Note kind="error" className={className}>
      {children}
    </Note>
  )
}
