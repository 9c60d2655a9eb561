'use client'

import { Button } from '@/components/ui/button'
import { Note } from '@/components/ui/error-note'
import type { Version } from '../../../_data/api'

/** Two versions came from the same one: both are kept, and the person says which to go on with. */
export function ConflictNotice({
  theirs,
  onMine,
  onTheirs,
}: {
  readonly theirs: Version
  readonly onMine: () => void
  readonly onTheirs: () => void
}) {
  const at = new Intl.DateTimeFormat(undefined, { timeStyle: 'short' }).format(new Date(theirs.savedAt))
  return (
    <Note kind="caution" className="items-center border-b hairline">
      <div role="alert" className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <p className="min-w-0 flex-1 basis-64">
          This draft was also changed elsewhere, at {at}. Both versions are kept. Which one goes on?
        </p>
        <Button onClick={onTheirs}>The other one</Button>
        <Button look="primary" onClick={onMine}>
          The one on this table
        </Button>
      </div>
    </Note>
  )
}
