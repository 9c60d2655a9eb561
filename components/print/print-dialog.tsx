'use client'

import { useMemo, useState } from 'react'
import type { Draft } from '@/drafting/contract'
import { layOut, paperOf } from '@/drafting/drawing'
import type { Tiling } from '@/drafting/drawing'
import { Dialog } from '@/components/ui/dialog'
import { firstChoices } from './print-choices'
import { PrintForm } from './print-form'
import { PrintPreview } from './print-preview'

/** How a draft goes onto paper: choices on one side, the taped sheets on the other, drawn in the page as the choices change. */
export function PrintDialog({
  open,
  onClose,
  draft,
  base,
}: {
  readonly open: boolean
  readonly onClose: () => void
  readonly draft: Draft
  /** Where the files of the saved version are: '/api/revisions/<id>'. */
  readonly base: string
}) {
  return (
    <Dialog open={open} onClose={onClose} title="Print the pattern" wide>
      <PrintChoice draft={draft} base={base} />
    </Dialog>
  )
}

function PrintChoice({ draft, base }: { readonly draft: Draft; readonly base: string }) {
  const [choices, setChoices] = useState(firstChoices)
  const laidOut = useMemo(
    () => layOut({ draft, ...choices, paper: paperOf(choices.paper) }),
    [draft, choices],
  )
  return (
    <div className="grid gap-6 md:grid-cols-[17rem_1fr]">
      <PrintForm
        base={base}
        choices={choices}
        onChange={setChoices}
        facts={factsOf(laidOut.tiling, choices.paper)}
      />
      <div className="grid place-items-center bg-panel p-4">
        <PrintPreview laidOut={laidOut} />
      </div>
    </div>
  )
}

function factsOf(tiling: Tiling, paper: Parameters<typeof paperOf>[0]): string {
  const sheets = tiling.pages.filter((page) => !page.blank).length
  const way = tiling.orientation === 'portrait' ? 'upright' : 'on its side'
  const left = tiling.pages.length - sheets
  const skipped = left > 0 ? ` ${left} empty ${left === 1 ? 'sheet is' : 'sheets are'} left out.` : ''
  return `${sheets} ${sheets === 1 ? 'sheet' : 'sheets'} of ${paperOf(paper).name} ${way}, and a first one with the test squares.${skipped}`
}
