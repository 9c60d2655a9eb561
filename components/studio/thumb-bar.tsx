'use client'

import { Layers, ListChecks, Menu, Ruler, SlidersHorizontal, Spline } from 'lucide-react'
import { X } from 'lucide-react'
import type { ReactNode } from 'react'
import { classes } from '@/components/ui/classes'

const entries = [
  { id: 'tape', label: 'Tape', Icon: Ruler },
  { id: 'steps', label: 'Steps', Icon: Spline },
  { id: 'choices', label: 'Choices', Icon: SlidersHorizontal },
  { id: 'checks', label: 'Checks', Icon: ListChecks },
  { id: 'pieces', label: 'Pieces', Icon: Layers },
  { id: 'more', label: 'More', Icon: Menu },
] as const

export type ThumbLeaf = (typeof entries)[number]['id']

/** On a phone everything lies under one thumb; a leaf comes up from below, half as high as the screen. */
export function ThumbBar({
  leaf,
  onLeaf,
  children,
}: {
  readonly leaf: ThumbLeaf | undefined
  readonly onLeaf: (leaf: ThumbLeaf | undefined) => void
  readonly children: ReactNode
}) {
  const label = entries.find((entry) => entry.id === leaf)?.label
  return (
    <>
      {leaf && leaf !== 'steps' && (
        <section
          aria-label={label}
          className="fixed inset-x-0 bottom-[calc(3.5rem+env(safe-area-inset-bottom))] z-30 flex h-[50dvh] flex-col border-t border-rule bg-panel shadow-float"
        >
          <div className="flex min-h-11 shrink-0 items-center justify-between border-b hairline pl-4">
            <h2 className="font-semibold">{label}</h2>
            <button
              type="button"
              onClick={() => onLeaf(undefined)}
              className="flex min-h-11 items-center gap-1 px-4 text-sm text-walnut"
            >
              <X size={16} aria-hidden />
              Close
            </button>
          </div>
          <div className="min-h-0 flex-1 overflow-y-auto">{children}</div>
        </section>
      )}
      {leaf === 'steps' && children}
      <nav
        aria-label="Studio"
        className="relative z-30 grid shrink-0 grid-cols-6 border-t border-rule bg-ground pb-[env(safe-area-inset-bottom)]"
      >
        {entries.map(({ id, label: word, Icon }) => (
          <button
            key={id}
            type="button"
            aria-pressed={leaf === id}
            onClick={() => onLeaf(leaf === id ? undefined : id)}
            className={classes(
              'flex min-h-14 flex-col items-center justify-center gap-0.5 text-[12px] leading-4',
              leaf === id ? 'bg-panel font-semibold text-indigo' : 'text-walnut',
            )}
          >
            <Icon size={20} aria-hidden />
            {word}
          </button>
        ))}
      </nav>
    </>
  )
}
