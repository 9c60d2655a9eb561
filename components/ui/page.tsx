import Link from 'next/link'
import type { ReactNode } from 'react'
import { classes } from './classes'

export interface Crumb {
  readonly href: string
  readonly label: string
}

/** A page of the workroom: its way back, its title set large, what can be done here, then the work. */
export function Page({
  title,
  trail = [],
  lead,
  actions,
  children,
  narrow = false,
}: {
  readonly title: ReactNode
  readonly trail?: readonly Crumb[]
  readonly lead?: ReactNode
  readonly actions?: ReactNode
  readonly children: ReactNode
  readonly narrow?: boolean
}) {
  return (
    <div
      className={classes(
        'mx-auto w-full px-4 pt-6 pb-20 sm:px-8 sm:pt-10',
        narrow ? 'max-w-180' : 'max-w-280',
      )}
    >
      {trail.length > 0 && (
        <nav aria-label="Where you are" className="mb-2 flex flex-wrap gap-x-2 text-sm text-walnut">
          {trail.map((crumb) => (
            <span key={crumb.href} className="flex gap-2">
              <Link href={crumb.href} className="underline decoration-rule underline-offset-4 hover:text-ink">
                {crumb.label}
              </Link>
              <span aria-hidden>/</span>
            </span>
          ))}
        </nav>
      )}
      <header className="mb-8 flex flex-wrap items-end justify-between gap-x-6 gap-y-4">
        <div className="min-w-0">
          <h1 className="text-xl leading-tight font-semibold tracking-tight break-words sm:text-2xl">
            {title}
          </h1>
          {lead && <p className="mt-1.5 max-w-150 text-walnut">{lead}</p>}
        </div>
        {actions && <div className="flex flex-wrap gap-3">{actions}</div>}
      </header>
      {children}
    </div>
  )
}
