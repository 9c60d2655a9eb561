'use client'

import { PanelRightClose, PanelRightOpen } from 'lucide-react'
import type { ReactNode } from 'react'
import { Tabs, type Leaf } from '@/components/ui/tabs'

/** The drawer at the right: one leaf at a time, and it can be shut. */
export function Drawer({
  leaves,
  leaf,
  onLeaf,
  open,
  onOpen,
}: {
  readonly leaves: readonly Leaf[]
  readonly leaf: string
  readonly onLeaf: (id: string) => void
  readonly open: boolean
  readonly onOpen: (open: boolean) => void
}) {
  if (!open) {
    return (
      <div className="border-l border-rule bg-panel">
        <button
          type="button"
          onClick={() => onOpen(true)}
          className="flex h-full w-11 flex-col items-center gap-2 py-3 text-sm font-semibold hover:text-indigo"
        >
          <PanelRightOpen size={18} aria-hidden />
          <span className="[writing-mode:vertical-rl]">Choices, rules, checks</span>
        </button>
      </div>
    )
  }
  return (
    <aside aria-label="Drawer" className="relative flex w-80 shrink-0 flex-col border-l border-rule bg-panel">
      <Tabs label="Drawer" leaves={leaves} value={leaf} onChange={onLeaf} />
      <ShutButton onShut={() => onOpen(false)}>Shut the drawer</ShutButton>
    </aside>
  )
}

function ShutButton({ onShut, children }: { readonly onShut: () => void; readonly children: ReactNode }) {
  return (
    <button
      type="button"
      onClick={onShut}
      className="mt-auto flex min-h-10 items-center gap-1.5 border-t hairline px-4 text-sm text-walnut hover:text-ink"
    >
      <PanelRightClose size={16} aria-hidden />
      {children}
    </button>
  )
}
