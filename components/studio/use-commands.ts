'use client'

import { useEffect, useMemo, type RefObject } from 'react'
import type { SheetControl } from '@/components/sheet/sheet'
import { commandFor, type Command } from './commands'
import type { StudioStore } from './store'

interface Surroundings {
  readonly store: StudioStore
  readonly sheet: RefObject<SheetControl | null>
  readonly writable: boolean
  readonly onPrint: () => void
  readonly onVersions: () => void
}

/** Everything the studio can be told, in one list; its shortcuts are listened to while the studio is open. */
export function useCommands({
  store,
  sheet,
  writable,
  onPrint,
  onVersions,
}: Surroundings): readonly Command[] {
  const commands = useMemo<readonly Command[]>(() => {
    const view = (id: string, label: string, shortcut: string, perform: () => void): Command => ({
      id,
      label,
      shortcut,
      enabled: () => true,
      perform,
      undoable: false,
    })
    return [
      {
        id: 'undo',
        label: 'Undo',
        shortcut: 'Mod+Z',
        enabled: () => writable && store.get().undoes !== undefined,
        perform: store.undo,
        undoable: false,
      },
      {
        id: 'redo',
        label: 'Redo',
        shortcut: 'Mod+Shift+Z',
        enabled: () => writable && store.get().redoes !== undefined,
        perform: store.redo,
        undoable: false,
      },
      view('versions', 'Versions', 'Mod+S', onVersions),
      view('print', 'Print', 'Mod+P', onPrint),
      view('fit', 'Show everything', '0', () => sheet.current?.fit()),
      view('actual', 'True size, 100 %', '1', () => sheet.current?.actual()),
      view('closer', 'Closer', '+', () => sheet.current?.zoom(1.25)),
      view('further', 'Further away', '-', () => sheet.current?.zoom(0.8)),
      view('next-tag', 'Next measurement on the drawing', 'N', () => sheet.current?.focusTag(1)),
      view('previous-tag', 'Measurement before', 'Shift+N', () => sheet.current?.focusTag(-1)),
    ]
  }, [onPrint, onVersions, sheet, store, writable])

  useEffect(() => {
    function key(event: KeyboardEvent) {
      if (event.defaultPrevented || document.querySelector('dialog[open]')) return
      const typing = event.target instanceof HTMLInputElement || event.target instanceof HTMLTextAreaElement
      if (typing && !event.ctrlKey && !event.metaKey) return
      const command = commandFor(commands, event)
      if (!command) return
      event.preventDefault()
      command.perform()
    }
    window.addEventListener('keydown', key)
    return () => window.removeEventListener('keydown', key)
  }, [commands])

  return commands
}
