'use client'

import { X } from 'lucide-react'
import { useEffect, useId, useRef, type ReactNode } from 'react'
import { classes } from './classes'

/**
 * A window above the page. It is the browser's own dialog: the page behind is inert, Escape closes it, and the focus goes back to where
 * it came from. On a phone it comes up from below.
 */
export function Dialog({
  open,
  title,
  onClose,
  children,
  wide = false,
}: {
  readonly open: boolean
  readonly title: string
  readonly onClose: () => void
  readonly children: ReactNode
  readonly wide?: boolean
}) {
  const box = useRef<HTMLDialogElement>(null)
  const heading = useId()

  useEffect(() => {
    const dialog = box.current
    if (!dialog) return
    if (open && !dialog.open) dialog.showModal()
    if (!open && dialog.open) dialog.close()
  }, [open])

  return (
    <dialog
      ref={box}
      aria-labelledby={heading}
      onClose={onClose}
      onClick={(event) => {
        if (event.target === box.current) onClose()
      }}
      className={classes(
        'm-0 mt-auto w-full max-w-full rounded-t border hairline bg-ground p-0 text-base text-ink shadow-float',
        'max-h-[92dvh] overflow-y-auto sm:m-auto sm:rounded',
        wide ? 'sm:max-w-240' : 'sm:max-w-130',
      )}
    >
      {open && (
        <div className="p-5 sm:p-7">
          <div className="mb-4 flex items-start justify-between gap-4">
            <h2 id={heading} className="text-xl font-semibold">
              {title}
            </h2>
            <button
              type="button"
              onClick={onClose}
              className="-m-2 flex min-h-11 items-center gap-1 rounded px-2 text-sm text-walnut hover:text-ink"
            >
              <X size={18} aria-hidden />
              Close
            </button>
          </div>
          {children}
        </div>
      )}
    </dialog>
  )
}
