import type { ReactNode } from 'react'
import { ToastReady } from '@/components/ui/toast'
import { Queries } from './_data/queries'

/** The studio fills the screen: no bar but its own. */
export default function StudioLayout({ children }: { children: ReactNode }) {
  return (
    <Queries>
      {children}
      <ToastReady />
    </Queries>
  )
}
