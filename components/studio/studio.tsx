'use client'

import { History, Printer, Share2 } from 'lucide-react'
import { useCallback, useRef, useState, type ReactNode } from 'react'
import type { Draft, MeasurementDefinition } from '@/drafting/contract'
import type { Layer } from '@/drafting/drawing'
import { Checks } from '@/components/drawer/checks'
import { Choices } from '@/components/drawer/choices'
import { openingLayers, Pieces } from '@/components/drawer/pieces'
import { Rules } from '@/components/drawer/rules'
import { Ribbon } from '@/components/ribbon/ribbon'
import { Sheet, type SheetControl } from '@/components/sheet/sheet'
import { TagDock } from '@/components/sheet/tag-dock'
import { StudioTape, TapePanel } from '@/components/tape/studio-tape'
import { buttonClass } from '@/components/ui/button'
import { StudioBar, UnitSwitch } from './bar'
import { Drawer } from './drawer'
import { chosenEmphasis, stepEmphasis } from './emphasis'
import { KeysDialog } from './keys-dialog'
import { OpeningProblems } from './opening-problems'
import type { SaveState } from './save-state'
import { ThumbBar, type ThumbLeaf } from './thumb-bar'
import { useCommands } from './use-commands'
import { useNarrow } from './use-narrow'
import { StudioContext, useStudio, useStudioState, type Studio as StudioParts } from './use-store'
import { ViewButtons } from './view-buttons'

export interface StudioProps {
  readonly definitions: readonly MeasurementDefinition[]
  readonly name: ReactNode
  readonly back: { readonly href: string; readonly label: string }
  readonly saving: SaveState
  /** Something that wants a decision, over the sheet: two versions, a session that ended. */
  readonly notice?: ReactNode
  readonly onVersions: () => void
  readonly onShare?: () => void
  readonly onPrint: () => void
}

/** The studio: a table, a tape, a ribbon, a drawer. */
export function Studio({ studio, ...rest }: StudioProps & { readonly studio: StudioParts }) {
  return (
    <StudioContext value={studio}>
      <Table {...rest} />
    </StudioContext>
  )
}

function Table({ definitions, name, back, saving, notice, onVersions, onShare, onPrint }: StudioProps) {
  const { store, writable } = useStudio()
  const narrow = useNarrow()
  const sheet = useRef<SheetControl>(null)
  const draft = useStudioState((state) => state.resting)
  const said = useStudioState((state) => state.said)
  const [leaf, setLeaf] = useState('choices')
  const [drawerOpen, setDrawerOpen] = useState(true)
  const [thumb, setThumb] = useState<ThumbLeaf>()
  const [hidden, setHidden] = useState<ReadonlySet<string>>(new Set())
  const [shown, setShown] = useState<readonly Layer[]>(openingLayers)
  const [tags, setTags] = useState(true)
  const [chosen, setChosen] = useState<string>()
  const [at, setAt] = useState<number>()
  const [docked, setDocked] = useState<string>()
  const [keys, setKeys] = useState(false)
  const commands = useCommands({ store, sheet, writable, onPrint, onVersions })

  const step = at !== undefined && draft && at < draft.steps.length ? at : undefined
  const emphasise = useCallback(
    (now: Draft) => (step === undefined ? chosenEmphasis(now, chosen) : stepEmphasis(now, step)),
    [chosen, step],
  )
  const hide = useCallback((piece: string, away: boolean) => {
    setHidden((before) => {
      const next = new Set(before)
      if (away) next.add(piece)
      else next.delete(piece)
      return next
    })
  }, [])

  const checks = <Checks chosen={chosen} onChoose={setChosen} />
  const pieces = (
    <Pieces hidden={hidden} onHide={hide} shown={shown} onShow={setShown} tags={tags} onTags={setTags} />
  )
  const ribbon = <Ribbon steps={draft?.steps ?? []} at={step} onMove={setAt} />

  const values = (draft?.dimensions ?? []).filter((each) => each.shows === 'value' && each.value)
  const dock = values.findIndex((each) => each.id === docked)
  const dimension = values[dock]
  const moveDock = (by: 1 | -1) => setDocked(values[(dock + by + values.length) % values.length]?.id)

  return (
    <div className="flex h-dvh flex-col overflow-hidden">
      <StudioBar {...{ name, back, saving, commands, onVersions, onShare, onPrint }} compact={narrow} />
      {notice}
      <div className="flex min-h-0 flex-1">
        {!narrow && <StudioTape definitions={definitions} />}
        <main className="relative min-w-0 flex-1">
          <Sheet
            control={sheet}
            layers={shown}
            hidden={hidden}
            emphasise={emphasise}
            replaying={step !== undefined}
            showTags={tags}
            definitions={definitions}
            onOpenTag={narrow ? setDocked : undefined}
          />
          <OpeningProblems definitions={definitions} />
          <ViewButtons commands={commands} onHelp={() => setKeys(true)} />
        </main>
        {!narrow && (
          <Drawer
            leaves={[
              { id: 'choices', label: 'Choices', content: <Choices /> },
              { id: 'rules', label: 'Rules', content: <Rules /> },
              { id: 'checks', label: 'Checks', content: checks },
              { id: 'pieces', label: 'Pieces', content: pieces },
            ]}
            leaf={leaf}
            onLeaf={setLeaf}
            open={drawerOpen}
            onOpen={setDrawerOpen}
          />
        )}
      </div>
      {!narrow && ribbon}
      {narrow && (
        <ThumbBar leaf={thumb} onLeaf={setThumb}>
          {thumb === 'tape' && <TapePanel definitions={definitions} focused={undefined} />}
          {thumb === 'steps' && ribbon}
          {thumb === 'choices' && <Choices />}
          {thumb === 'checks' && checks}
          {thumb === 'pieces' && pieces}
          {thumb === 'more' && (
            <div className="grid gap-3 p-4">
              <div className="justify-self-start">
                <UnitSwitch />
              </div>
              <button type="button" className={buttonClass('primary', 'min-h-11')} onClick={onPrint}>
                <Printer size={18} aria-hidden />
                Print
              </button>
              {onShare && (
                <button type="button" className={buttonClass('plain', 'min-h-11')} onClick={onShare}>
                  <Share2 size={18} aria-hidden />
                  Share
                </button>
              )}
              <button type="button" className={buttonClass('plain', 'min-h-11')} onClick={onVersions}>
                <History size={18} aria-hidden />
                Versions
              </button>
              <Rules />
            </div>
          )}
        </ThumbBar>
      )}
      {narrow && dimension && (
        <TagDock dimension={dimension} onNext={moveDock} onDone={() => setDocked(undefined)} />
      )}
      <p aria-live="polite" className="sr-only">
        {said}
      </p>
      <KeysDialog open={keys} onClose={() => setKeys(false)} commands={commands} />
    </div>
  )
}
