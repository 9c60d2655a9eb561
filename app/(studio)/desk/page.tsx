import type { Metadata } from 'next'
import { Desk } from './_parts/desk'

export const metadata: Metadata = { title: 'Offline', robots: { index: false } }

/** The page that a device keeps for times without network. It holds nothing of anybody: what it shows stands on the device. */
export default function DeskPage() {
  return <Desk />
}
