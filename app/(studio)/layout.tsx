import type { ReactNode } from 'react'
import { ToastReady } from '@/components/ui/toast'

/** The studio fills the screen: no bar but its own. */
export default function StudioLayout({ children }: { children: ReactNode }) {
  return (
    <>
      {children}
      <ToastReady />
    </>
  )
}
