'use client'

import { Dialog } from '@/components/ui/dialog'
import { ShareForm } from './share-form'
import type { NewShare } from './share-form'
import { ShareList } from './share-list'
import type { MadeShare } from './share-words'

/** Links to a draft: make one, see which there are, take them back. */
export function ShareDialog({
  open,
  onClose,
  draftName,
  shares,
  onCreate,
  onRevoke,
}: {
  readonly open: boolean
  readonly onClose: () => void
  readonly draftName: string
  /** Newest first; absent while they are being fetched. */
  readonly shares: readonly MadeShare[] | undefined
  /** Gives back the whole address of the new link. It throws an Error whose message is shown as it stands. */
  readonly onCreate: (share: NewShare) => Promise<string>
  readonly onRevoke: (id: string) => Promise<void>
}) {
  return (
    <Dialog open={open} onClose={onClose} title="Share by link">
      <div className="grid gap-7">
        <p className="text-walnut">
          Whoever has the link sees the newest saved version and can print it, without signing in. It is shown
          as “{draftName}”: rename the draft first if that names the client.
        </p>
        <ShareForm onCreate={onCreate} />
        <ShareList shares={shares} onRevoke={onRevoke} />
      </div>
    </Dialog>
  )
}
