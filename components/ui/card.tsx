import type { ReactNode } from 'react'
import { classes } from './classes'

/** A sheet of paper on the table. Square corners, a hairline, no shadow: nothing floats here. */
export function Card({
  title,
  actions,
  children,
  className,
}: {
  readonly title?: ReactNode
  readonly actions?: ReactNode
  readonly children: ReactNode
  readonly className?: string
}) {
  return (
    <section className={classes('border hairline bg-sheet p-5', className)}>
      {(title || actions) && (
        <div className="mb-4 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-2">
          {title && <h2 className="text-lg font-semibold">{title}</h2>}
          {actions}
        </div>
      )}
      {children}
    </section>
  )
}
