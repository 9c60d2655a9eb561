import type { Metadata } from 'next'
import { headers } from 'next/headers'
import { notFound } from 'next/navigation'
import { openShare } from '@/db/access/shares'
import { takeTry } from '@/db/access/limits'
import { requestAddress } from '@/app/_server/address'
import { sharedView } from '@/app/_server/share/shared-view'
import { SharedDraft } from './_parts/shared-draft'

/** No search engine keeps what was shown to few, and no title names it to one. */
export const metadata: Metadata = {
  title: 'Shared draft',
  robots: { index: false, follow: false },
  referrer: 'no-referrer',
}

/** A draft opened by link: drawn here, so that it stands in the first answer. */
export default async function SharedPage({ params }: { readonly params: Promise<{ token: string }> }) {
  const { token } = await params
  const share = await openShare(token)
  if (!share) {
    // Guessing is slowed down; whoever is refused sees the same page.
    await takeTry('token address', requestAddress(await headers())).catch(() => undefined)
    notFound()
  }
  return <SharedDraft token={token} opened={await sharedView(share)} />
}
