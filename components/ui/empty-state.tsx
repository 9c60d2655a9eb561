import type { ReactNode } from 'react'
import { ChalkLine } from './chalk-line'

/** What stands where nothing stands yet: it says what to do next, with the button that does it. */
export function EmptyState({
  title,
  level = 2,
  children,
  action,
}: {
  readonly title: string
  /** 1 when nothing else stands on the page. */
  readonly level?: 1 | 2
  readonly children?: ReactNode
  readonly action?: ReactNode
}) {
  const Heading = `h${level}` as const
  return (
    <div className="grid justify-items-center gap-3 px-4 py-14 text-center">
      <ChalkLine className="w-40 text-rule" />
      <Heading className="text-lg font-semibold">{title}</Heading>
      {children && <div className="max-w-110 text-walnut">{children}</div>}
      {action && <div className="mt-2">{action}</div>}
    </div>
  )
}
