import Link from 'next/link'
import type { ReactNode } from 'react'
import { Wordmark } from '@/components/ui/mark'
import { ThemeSwitch } from '@/components/ui/theme-switch'
import { CuttingTable } from './_parts/cutting-table'

/** Pages for people who are not in a workroom yet: the form on the table, and beside it what the work looks like. */
export default function AuthLayout({ children }: { children: ReactNode }) {
  return (
    <div className="grid min-h-dvh lg:grid-cols-[minmax(0,5fr)_minmax(0,4fr)]">
      <div className="flex flex-col px-5 py-5 sm:px-10 sm:py-7">
        <header className="tape-edge flex flex-wrap items-center justify-between gap-3 pb-5">
          <Link href="/" className="rounded text-ink no-underline">
            <Wordmark />
          </Link>
          <ThemeSwitch />
        </header>
        <main className="mx-auto flex w-full max-w-105 grow flex-col justify-center py-10">{children}</main>
      </div>
      <div className="hidden border-l hairline bg-sheet lg:grid lg:place-items-center lg:p-10">
        <CuttingTable />
      </div>
    </div>
  )
}
