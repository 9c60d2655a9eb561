'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import type { ReactNode } from 'react'
import { classes } from '@/components/ui/classes'
import { Wordmark } from '@/components/ui/mark'

/** The bar over the workroom's pages. Its lower edge is the tape that everything is measured by. */
export function WorkroomBar({
  places,
  menu,
}: {
  readonly places: readonly { readonly href: string; readonly label: string }[]
  readonly menu: ReactNode
}) {
  const path = usePathname()
  return (
    <header className="tape-edge border-b border-rule">
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:bg-ground focus:px-4 focus:py-2"
      >
        Skip to the page
      </a>
      <div className="mx-auto flex max-w-280 flex-wrap items-center gap-x-6 gap-y-1 px-4 pt-2.5 pb-3.5 sm:px-8">
        <Link href="/home" aria-label="Chalkfold, start" className="rounded">
          <Wordmark />
        </Link>
        <nav
          aria-label="Workroom"
          className="order-last -mx-2 flex w-full gap-1 overflow-x-auto sm:order-none sm:w-auto"
        >
          {places.map(({ href, label }) => {
            const here = path === href || path.startsWith(`${href}/`)
            return (
              <Link
                key={href}
                href={href}
                aria-current={here ? 'page' : undefined}
                className={classes(
                  'flex min-h-9 items-center rounded px-3 whitespace-nowrap',
                  here ? 'bg-panel font-semibold text-ink' : 'text-walnut hover:text-indigo',
                )}
              >
                {label}
              </Link>
            )
          })}
        </nav>
        <div className="ml-auto">{menu}</div>
      </div>
    </header>
  )
}
