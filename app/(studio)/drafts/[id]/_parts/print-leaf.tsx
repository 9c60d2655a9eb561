'use client'

import { PrintDialog } from '@/components/print/print-dialog'
import type { StudioStore } from '@/components/studio/store'
import { Dialog } from '@/components/ui/dialog'
import { usePrinters } from '../../../_data/printers'

/** The paper pattern of what is on the table, once it is saved: what is printed can always be printed again. */
export function PrintLeaf({
  onClose,
  store,
  draftId,
  revisionId,
}: {
  readonly onClose: () => void
  readonly store: StudioStore
  readonly draftId: string
  readonly revisionId: string | undefined
}) {
  const { draft } = store.get()
  const printers = usePrinters()
  if (draft && revisionId) {
    const base = `/api/revisions/${revisionId}`
    return (
      <PrintDialog
        open
        onClose={onClose}
        draft={draft}
        base={base}
        printers={printers}
        chalk={`/drafts/${draftId}/chalk`}
      />
    )
  }
  return (
    <Dialog open onClose={onClose} title="Print the pattern">
      <p>
        {draft
          ? 'What is on the table could not be saved yet, and only a saved version is printed. Try again when the bar says “Saved”.'
          : 'Nothing is drawn yet: put in the measurements first.'}
      </p>
    </Dialog>
  )
}
