'use client'

import { ChevronLeft, History, Printer, Redo2, Share2, Undo2 } from 'lucide-react'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { classes } from '@/components/ui/classes'
import type { Command } from './commands'
import { needsLook, saveWords, type SaveState } from './save-state'
import { useStudio, useStudioState } from './use-store'

const control =
  'flex min-h-8 items-center gap-1.5 rounded px-2.5 text-sm font-semibold hover:bg-panel hover:text-indigo ' +
  'disabled:opacity-45 disabled:hover:bg-transparent pointer-coarse:min-h-11'

/** Undo or redo, and what it would take back. */
function StepButton({
  command,
  what,
  children,
}: {
  command: Command | undefined
  what?: string
  children: ReactNode
}) {
  if (!command) return null
  return (
    <button
      type="button"
      disabled={!what}
      onClick={command.perform}
      title={what ? `${command.label}: ${what} (${command.shortcut?.replace('Mod', 'Ctrl')})` : command.label}
      className={control}
    >
      {children}
      <span className="max-xl:sr-only">{command.label}</span>
    </button>
  )
}

/** The bar over the table: what is being drafted, how far it is saved, and what leaves the table. */
export function StudioBar({
  name,
  back,
  saving,
  commands,
  onVersions,
  onShare,
  onPrint,
  compact,
}: {
  readonly name: ReactNode
  readonly back: { readonly href: string; readonly label: string }
  readonly saving: SaveState
  readonly commands: readonly Command[]
  readonly onVersions: () => void
  readonly onShare?: () => void
  readonly onPrint: () => void
  readonly compact: boolean
}) {
  const undoes = useStudioState((state) => (state.gesture ? undefined : state.undoes))
  const redoes = useStudioState((state) => (state.gesture ? undefined : state.redoes))
  const find = (id: string) => commands.find((command) => command.id === id)
  return (
    <header className="flex h-12 shrink-0 items-center gap-1 border-b border-rule bg-ground px-2">
      <Link
        href={back.href}
        className={classes(control, 'shrink-0 text-walnut')}
        aria-label={`Back to ${back.label}`}
      >
        <ChevronLeft size={18} aria-hidden />
        <span className="max-w-40 truncate max-md:sr-only">{back.label}</span>
      </Link>
      <h1 className="min-w-0 truncate font-semibold">{name}</h1>
      <p
        role="status"
        className={classes(
          'shrink-0 pl-2 text-sm whitespace-nowrap max-sm:max-w-32 max-sm:whitespace-normal max-sm:leading-4',
          saving.kind === 'saved' ? 'text-walnut' : needsLook(saving) ? 'text-weld' : 'text-walnut',
        )}
      >
        {saveWords(saving)}
      </p>
      <div className="ml-auto flex shrink-0 items-center gap-0.5">
        <StepButton command={find('undo')} what={undoes}>
          <Undo2 size={18} aria-hidden />
        </StepButton>
        <StepButton command={find('redo')} what={redoes}>
          <Redo2 size={18} aria-hidden />
        </StepButton>
        {!compact && (
          <>
            <UnitSwitch />
            <button type="button" onClick={onVersions} className={control}>
              <History size={18} aria-hidden />
              Versions
            </button>
            {onShare && (
              <button type="button" onClick={onShare} className={control}>
                <Share2 size={18} aria-hidden />
                Share
              </button>
            )}
            <button
              type="button"
              onClick={onPrint}
              className={classes(control, 'bg-indigo text-ground hover:bg-ink hover:text-ground')}
            >
              <Printer size={18} aria-hidden />
              Print
            </button>
          </>
        )}
      </div>
    </header>
  )
}

/** Inches or centimetres: words only, no length moves. */
export function UnitSwitch() {
  const { store } = useStudio()
  const unit = useStudioState((state) => state.unit)
  return (
    <div role="group" aria-label="Unit" className="mx-1 flex rounded border border-rule">
      {(['in', 'cm'] as const).map((each) => (
        <button
          key={each}
          type="button"
          aria-pressed={unit === each}
          onClick={() => store.setUnit(each)}
          className={classes(
            'min-h-7 min-w-9 rounded px-2 text-sm font-semibold pointer-coarse:min-h-11 pointer-coarse:min-w-11',
            unit === each ? 'bg-panel text-ink' : 'text-walnut',
          )}
        >
          {each}
        </button>
      ))}
    </div>
  )
}
