import type { ReactNode } from 'react'
import { Queries } from './_data/queries'

/** The studio fills the screen: no bar but its own. */
export default function StudioLayout({ children }: { children: ReactNode }) {
  return <Queries>{children}</Queries>
}
