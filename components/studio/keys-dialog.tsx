'use client'

import { Dialog } from '@/components/ui/dialog'
import { shortcutText, type Command } from './commands'

const onTheSheet = [
  ['Tab', 'Next measurement on the drawing, in drafting order'],
  ['↑ ↓', 'A measurement up or down by ⅛ in or 1 mm; with Shift by 1 in or 10 mm'],
  ['Enter', 'Keep what is typed'],
  ['Esc', 'Put back what was there'],
  ['Alt + drag', 'Move a point freely, between the marks of the tape'],
  ['Space + drag', 'Move the sheet; two fingers or the wheel do too'],
  ['Ctrl + wheel', 'Closer and further away'],
] as const

/** Every key of the studio, read from the commands themselves. */
export function KeysDialog({
  open,
  onClose,
  commands,
}: {
  readonly open: boolean
  readonly onClose: () => void
  readonly commands: readonly Command[]
}) {
  const mac = typeof navigator !== 'undefined' && navigator.userAgent.includes('Mac')
  const rows = [
    ...onTheSheet,
    ...commands.flatMap((command) =>
      command.shortcut ? [[shortcutText(command.shortcut, mac), command.label] as const] : [],
    ),
  ]
  return (
    <Dialog open={open} onClose={onClose} title="Keys">
      <dl className="grid grid-cols-[auto_1fr] gap-x-5 gap-y-2">
        {rows.map(([keys, what]) => (
          <div key={keys} className="contents">
            <dt className="font-semibold whitespace-nowrap">{keys}</dt>
            <dd className="text-walnut">{what}</dd>
          </div>
        ))}
      </dl>
    </Dialog>
  )
}
