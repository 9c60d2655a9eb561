import { ChevronDown } from 'lucide-react'
import Link from 'next/link'
import { SignOutButton } from '@/app/(auth)/_parts/sign-out-button'
import { ThemeSwitch } from '@/components/ui/theme-switch'
import { WorkroomSwitcher } from './workroom-switcher'

/** Who is here and where: the workroom, the way to another, the light, and the way out. On a phone all of it is folded in. */
export function WorkroomMenu({ name }: { readonly name: string }) {
  return (
    <div className="flex items-center gap-x-3">
      <div className="max-w-72 min-w-0 max-sm:hidden">
        <WorkroomSwitcher />
      </div>
      <details className="group relative">
        <summary className="flex min-h-9 list-none items-center gap-1.5 rounded px-2 text-sm font-semibold hover:text-indigo">
          {name}
          <ChevronDown size={16} aria-hidden className="text-walnut group-open:rotate-180" />
        </summary>
        <div className="absolute top-full right-0 z-40 mt-2 grid w-72 gap-3 border hairline bg-ground p-4 shadow-float">
          <div className="sm:hidden">
            <WorkroomSwitcher />
          </div>
          <Link href="/account" className="flex min-h-9 items-center font-semibold hover:text-indigo">
            My account
          </Link>
          <ThemeSwitch />
          <SignOutButton look="plain" />
        </div>
      </details>
    </div>
  )
}
