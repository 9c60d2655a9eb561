'use client'

import { placeWords } from '@/components/print/kept-choice'
import { Button } from '@/components/ui/button'
import { Note } from '@/components/ui/error-note'
import { Moment } from '@/components/ui/moment'
import type { Difference } from '@/drafting/compare/differences'

/** A version that was printed or shared, which Chalkfold draws otherwise today. */
export interface KeptOtherwise {
  readonly keptAt: string
  readonly differences: readonly Difference[]
  readonly drawable: boolean
}

/** Says that what is on the table is no longer what was printed, where, and leads to the drawing that was kept. */
export function KeptNotice({
  otherwise: { keptAt, differences, drawable },
  onPrint,
  onClose,
}: {
  readonly otherwise: KeptOtherwise
  readonly onPrint: () => void
  readonly onClose: () => void
}) {
  const [worst] = differences
  return (
    <Note kind="caution" className="border-b hairline">
      <div role="status" className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <p className="min-w-0 flex-1 basis-64">
          This version was printed or shared on <Moment at={keptAt} />.{' '}
          {drawable && worst
            ? `Chalkfold draws it a little otherwise today, most of all ${placeWords(worst)}.`
            : 'Chalkfold would refuse to draw it today.'}{' '}
          What was kept is printed again as it was.
        </p>
        <Button onClick={onPrint}>See where, and print</Button>
        <Button look="quiet" onClick={onClose}>
          Close
        </Button>
      </div>
    </Note>
  )
}
