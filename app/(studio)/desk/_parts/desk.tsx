'use client'

import dynamic from 'next/dynamic'
import { useEffect, useState } from 'react'
import { homePath } from '@/app/_server/session/safe-path'
import { themeCookie, themeFrom, wearTheme } from '@/components/ui/theme'
import { whoIsHere } from '../../_data/here'
import { localName } from '../../_data/local-copy'
import { openedDrafts, type OpenedDraft } from '../../_data/opened-drafts'
import { Away } from './away'

const OpenDraft = dynamic(
  () => import('../../drafts/[id]/_parts/open-draft').then((part) => part.OpenDraft),
  {
    ssr: false,
  },
)

interface Found {
  readonly drafts: readonly OpenedDraft[]
  readonly asked?: OpenedDraft
  readonly here?: ReturnType<typeof whoIsHere>
}

/** What this device has for the address in its bar: a draft, or the list of those that open. */
async function look(): Promise<Found> {
  const here = whoIsHere()
  if (!here) return { drafts: [] }
  const drafts = await openedDrafts(localName(here.userId, here.workroomId))
  const asked = drafts.find(({ draftId }) => window.location.pathname === `/drafts/${draftId}`)
  return { drafts, asked, here }
}

/** The page was kept without anybody's cookies; the light that was chosen is put on here. */
function wearChosenTheme(): void {
  const cookie = document.cookie.split('; ').find((pair) => pair.startsWith(`${themeCookie}=`))
  const theme = themeFrom(cookie?.split('=')[1])
  if (theme) wearTheme(theme)
}

/** The desk without the network: opens the draft that was asked for, or says what there is. */
export function Desk() {
  const [found, setFound] = useState<Found>()

  useEffect(() => {
    wearChosenTheme()
    // Nobody means this page by its own address: with the network there is a better one.
    if (window.location.pathname === '/desk' && navigator.onLine) window.location.replace(homePath)
    else void look().then(setFound, () => setFound({ drafts: [] }))
  }, [])

  if (!found) return <p className="sr-only">Looking for what is on this device …</p>
  const { asked, drafts, here } = found
  if (!asked || !here) return <Away drafts={drafts} />
  return <OpenDraft {...here} draft={asked.draft} back={asked.back} otherwise={null} fromDevice />
}
