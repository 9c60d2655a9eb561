'use client'

import { Keyboard, Maximize, ZoomIn, ZoomOut } from 'lucide-react'
import type { ReactNode } from 'react'
import type { Command } from './commands'

const icons: Readonly<Record<string, ReactNode>> = {
  further: <ZoomOut size={18} aria-hidden />,
  closer: <ZoomIn size={18} aria-hidden />,
  fit: <Maximize size={18} aria-hidden />,
}
const shortNames: Readonly<Record<string, string>> = { fit: 'All', actual: '100 %' }

/** The view's own buttons, at the corner of the sheet. */
export function ViewButtons({
  commands,
  onHelp,
}: {
  readonly commands: readonly Command[]
  readonly onHelp: () => void
}) {
  return (
    <div className="absolute right-3 bottom-3 z-20 flex rounded border hairline bg-ground text-sm">
      {['further', 'closer', 'fit', 'actual'].map((id) => {
        const command = commands.find((each) => each.id === id)
        if (!command) return null
        return (
          <button
            key={id}
            type="button"
            onClick={command.perform}
            title={`${command.label} (${command.shortcut})`}
            className="flex min-h-8 min-w-8 items-center justify-center gap-1 px-2 hover:text-indigo pointer-coarse:min-h-11 pointer-coarse:min-w-11"
          >
            {icons[id]}
            <span className={shortNames[id] ? undefined : 'sr-only'}>{shortNames[id] ?? command.label}</span>
          </button>
        )
      })}
      <button
        type="button"
        onClick={onHelp}
        className="flex min-h-8 items-center gap-1 border-l hairline px-2 hover:text-indigo max-md:hidden"
      >
        <Keyboard size={18} aria-hidden />
        Keys
      </button>
    </div>
  )
}
