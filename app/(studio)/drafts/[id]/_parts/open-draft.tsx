'use client'

import dynamic from 'next/dynamic'
import { useCallback, useMemo, useState } from 'react'
import { Studio } from '@/components/studio/studio'
import { createStudioStore } from '@/components/studio/store'
import { ErrorNote } from '@/components/ui/error-note'
import { draftGarment, garments, handles, measurements } from '@/drafting'
import type { Version } from '../../../_data/api'
import { ConflictNotice } from './conflict-notice'
import { DraftName } from './draft-name'
import { SignedOutNotice } from './signed-out-notice'
import { contentOf, useAutosave } from './use-autosave'

const engine = { draftGarment, handles }

// What opens over the table is fetched when it is first asked for: the table itself comes sooner.
const PrintLeaf = dynamic(() => import('./print-leaf').then((part) => part.PrintLeaf), { ssr: false })
const ShareLeaf = dynamic(() => import('./share-leaf').then((part) => part.ShareLeaf), { ssr: false })
const VersionsDialog = dynamic(() => import('./versions-dialog').then((part) => part.VersionsDialog), {
  ssr: false,
})

export interface OpenDraftProps {
  readonly draft: {
    readonly id: string
    readonly name: string
    readonly head: Version
    readonly writable: boolean
    readonly shareable: boolean
  }
  readonly back: { readonly href: string; readonly label: string }
  readonly userId: string
  readonly workroomId: string
}

/** A draft on the table: the store, what keeps it, and the dialogs around it. */
export function OpenDraft(props: OpenDraftProps) {
  const garment = garments.find((each) => each.id === props.draft.head.order.garment)
  if (!garment)
    return <ErrorNote>This draft is of a garment that this version of Chalkfold does not know.</ErrorNote>
  return <Opened {...props} garment={garment} />
}

function Opened({
  draft,
  back,
  userId,
  workroomId,
  garment,
}: OpenDraftProps & { readonly garment: (typeof garments)[number] }) {
  const [studio] = useState(() => {
    const { unit = 'cm', ...order } = draft.head.order
    const store = createStudioStore({ engine, order, typed: draft.head.typed, unit })
    return { store, garment, engine, writable: draft.writable }
  })
  const { store } = studio
  const [name, setName] = useState(draft.name)
  const [open, setOpen] = useState<'versions' | 'share' | 'print'>()
  const [printed, setPrinted] = useState<string>()
  const place = { draftId: draft.id, head: draft.head, writable: draft.writable, userId, workroomId }
  const { state, theirs, settle, autosave } = useAutosave(store, place)

  const close = () => setOpen(undefined)
  const onVersions = useCallback(() => setOpen('versions'), [])
  const onShare = useCallback(() => setOpen('share'), [])
  const onPrint = useCallback(() => {
    store.commit('Change')
    void autosave.flush().then((revision) => {
      setPrinted(revision)
      setOpen('print')
    })
  }, [autosave, store])

  const notice = useMemo(() => {
    if (theirs) {
      return (
        <ConflictNotice
          theirs={theirs}
          onMine={() => {
            autosave.goOnFrom(theirs, contentOf(store))
            settle()
          }}
          onTheirs={() => {
            autosave.goOnFrom(theirs, undefined)
            const { unit: _unit, ...order } = theirs.order
            store.replace({ order, typed: theirs.typed }, 'The other version')
            settle()
          }}
        />
      )
    }
    if (state.kind === 'signed-out') return <SignedOutNotice onBack={() => void autosave.retry()} />
    return state.kind === 'refused' ? <ErrorNote>{state.message}</ErrorNote> : undefined
  }, [autosave, settle, state, store, theirs])

  return (
    <>
      <title>{`${name} · Chalkfold`}</title>
      <Studio
        studio={studio}
        definitions={measurements}
        name={<DraftName id={draft.id} name={name} onName={setName} writable={draft.writable} />}
        back={back}
        saving={state}
        notice={notice}
        onVersions={onVersions}
        onShare={draft.shareable ? onShare : undefined}
        onPrint={onPrint}
      />
      {open === 'versions' && (
        <VersionsDialog
          onClose={close}
          draftId={draft.id}
          store={store}
          autosave={autosave}
          writable={draft.writable}
        />
      )}
      {open === 'share' && (
        <ShareLeaf onClose={close} draftId={draft.id} draftName={name} beforeMaking={autosave.flush} />
      )}
      {open === 'print' && (
        <PrintLeaf onClose={close} store={store} draftId={draft.id} revisionId={printed} />
      )}
    </>
  )
}
