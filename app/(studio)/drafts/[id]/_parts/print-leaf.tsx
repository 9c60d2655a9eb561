'use client'

import { useQuery } from '@tanstack/react-query'
import type { Draft } from '@/drafting/contract'
import type { Otherwise } from '@/components/print/kept-choice'
import { PrintDialog } from '@/components/print/print-dialog'
import { Dialog } from '@/components/ui/dialog'
import { ErrorNote } from '@/components/ui/error-note'
import { ask } from '../../../_data/api'
import { usePrinters } from '../../../_data/printers'
import { Queries } from '../../../_data/queries'

interface PrintLeafProps {
  readonly onClose: () => void
  /** As it is drawn today; missing when it cannot be. */
  readonly draft: Draft | undefined
  readonly draftId: string
  /** Missing when what is on the table could not be saved. */
  readonly revisionId: string | undefined
}

/** The paper pattern of a saved version: what is printed can always be printed again, as it was. */
export function PrintLeaf(props: PrintLeafProps) {
  return (
    <Queries>
      <Print {...props} />
    </Queries>
  )
}

function Print({ onClose, draft, draftId, revisionId }: PrintLeafProps) {
  const printers = usePrinters()
  const kept = useQuery({
    queryKey: ['kept', revisionId],
    queryFn: () => ask<Otherwise | null>(`/api/revisions/${revisionId}/kept`),
    enabled: revisionId !== undefined,
  })
  const shown = kept.data?.kept ?? draft
  if (shown && revisionId && kept.isSuccess) {
    const base = `/api/revisions/${revisionId}`
    return (
      <PrintDialog
        open
        onClose={onClose}
        draft={draft ?? shown}
        base={base}
        printers={printers}
        otherwise={kept.data}
        chalk={`/drafts/${draftId}/chalk`}
      />
    )
  }
  return (
    <Dialog open onClose={onClose} title="Print the pattern">
      {kept.error && <ErrorNote>{kept.error.message}</ErrorNote>}
      {kept.isLoading && <p role="status">Laying out the pieces…</p>}
      {!kept.isLoading && !kept.error && (
        <p>
          {draft
            ? 'What is on the table could not be saved yet, and only a saved version is printed. Try again when the bar says “Saved”.'
            : 'Nothing is drawn yet: put in the measurements first.'}
        </p>
      )}
    </Dialog>
  )
}
