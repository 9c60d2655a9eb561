'use client'

import { useMemo, useState } from 'react'
import type { Draft } from '@/drafting/contract'
import { layOut, paperOf } from '@/drafting/drawing'
import type { LaidOut } from '@/drafting/drawing'
import { ButtonLink } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { DownloadLink } from './download-link'
import { KeptChoice, type Otherwise } from './kept-choice'
import { firstChoices } from './print-choices'
import { PrintForm } from './print-form'
import { PrintPreview } from './print-preview'
import type { Printers } from './printer-correction'

/** How a draft goes onto paper: choices on one side, the taped sheets on the other, drawn in the page as the choices change. */
export function PrintDialog({
  open,
  onClose,
  ...rest
}: {
  readonly open: boolean
  readonly onClose: () => void
  readonly draft: Draft
  /** Where the files of the saved version are: '/api/revisions/<id>'. */
  readonly base: string
  readonly printers?: Printers
  /** Where the chalk guide is shown as cards. */
  readonly chalk: string
  /** When the version was printed or shared before and is drawn otherwise today. */
  readonly otherwise?: Otherwise | null
}) {
  return (
    <Dialog open={open} onClose={onClose} title="Print the pattern" wide>
      <PrintChoice {...rest} />
    </Dialog>
  )
}

function PrintChoice({
  draft,
  base,
  printers,
  chalk,
  otherwise,
}: {
  readonly draft: Draft
  readonly base: string
  readonly printers?: Printers
  readonly chalk: string
  readonly otherwise?: Otherwise | null
}) {
  const [choices, setChoices] = useState(firstChoices)
  const shown = otherwise && choices.drawing === 'kept' ? otherwise.kept : draft
  const laidOut = useMemo(
    () => layOut({ ...choices, draft: shown, paper: paperOf(choices.paper, choices.roll) }),
    [shown, choices],
  )
  return (
    <>
      {otherwise && (
        <KeptChoice
          otherwise={otherwise}
          drawing={choices.drawing}
          onChange={(drawing) => setChoices({ ...choices, drawing })}
        />
      )}
      <div className="grid gap-6 md:grid-cols-[19rem_1fr]">
        <div className="grid content-start gap-6">
          <PrintForm
            base={base}
            choices={choices}
            onChange={setChoices}
            facts={factsOf(laidOut, paperOf(choices.paper, choices.roll).name)}
            pieces={shown.pieces}
            printers={printers}
          />
          <WithoutPaper base={base} chalk={chalk} />
        </div>
        <div className="grid place-items-center self-start bg-panel p-4 md:sticky md:top-0">
          <PrintPreview laidOut={laidOut} />
        </div>
      </div>
    </>
  )
}

/** For those who chalk straight on the folded cloth. */
function WithoutPaper({ base, chalk }: { readonly base: string; readonly chalk: string }) {
  return (
    <section className="grid gap-2 border-t hairline pt-4">
      <h3 className="font-semibold">Cut without paper</h3>
      <p className="text-sm text-walnut">
        The chalk guide tells each mark in order, in lengths of the tape, and how the cloth is folded.
      </p>
      <DownloadLink look="plain" href={`${base}/chalk.pdf`} making="Writing the guide">
        Download the chalk guide (PDF)
      </DownloadLink>
      <ButtonLink look="quiet" href={chalk}>
        Tick it off at the table
      </ButtonLink>
    </section>
  )
}

function factsOf({ tiling, unpacked }: LaidOut, paper: string): string {
  const sheets = tiling.pages.filter((page) => !page.blank).length
  const way = tiling.orientation === 'portrait' ? 'upright' : 'on its side'
  const left = tiling.pages.length - sheets
  const skipped = left > 0 ? ` ${left} empty ${left === 1 ? 'sheet is' : 'sheets are'} left out.` : ''
  const saved =
    unpacked > sheets ? ` Laid as on the table it would take ${unpacked}: the pieces are packed closer.` : ''
  return `${sheets} ${sheets === 1 ? 'sheet' : 'sheets'} of ${paper} ${way}, and a first one with the test squares.${skipped}${saved}`
}
