import Link from 'next/link'
import type { ReactNode } from 'react'
import { Wordmark } from '@/components/ui/mark'
import { ThemeSwitch } from '@/components/ui/theme-switch'

/** The public pages: our name at the top, daylight or lamp and the small print at the foot. */
export default function SiteLayout({ children }: { readonly children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="flex items-center justify-between gap-4 px-4 py-3 sm:px-8">
        <Link href="/" className="rounded no-underline" aria-label="Chalkfold, to the start">
          <Wordmark />
        </Link>
        <Link
          href="/sign-in"
          className="flex min-h-11 items-center px-2 font-semibold text-indigo underline-offset-4 hover:underline"
        >
          Sign in
        </Link>
      </header>
      <main className="grow">{children}</main>
      <footer className="flex flex-wrap items-center justify-between gap-4 border-t hairline px-4 py-5 text-sm text-walnut sm:px-8">
        <Link href="/legal" className="flex min-h-8 items-center underline underline-offset-4 hover:text-ink">
          What is stored, and cautions
        </Link>
        <ThemeSwitch />
      </footer>
    </div>
  )
}
