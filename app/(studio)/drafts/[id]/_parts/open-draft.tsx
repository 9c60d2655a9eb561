'use client'

import dynamic from 'next/dynamic'
import { useCallback, useEffect, useMemo, useState } from 'react'
import { Studio } from '@/components/studio/studio'
import { createStudioStore } from '@/components/studio/store'
import { ErrorNote, Note } from '@/components/ui/error-note'
import { DraftingError, draftGarment, garments, handles, measurements } from '@/drafting'
import type { Draft, DraftOrder } from '@/drafting/contract'
import type { Version } from '../../../_data/api'
import { localName } from '../../../_data/local-copy'
import { rememberOpened } from '../../../_data/opened-drafts'
import { ConflictNotice } from './conflict-notice'
import { DraftName } from './draft-name'
import { KeptNotice, type KeptOtherwise } from './kept-notice'
import { SignedOutNotice } from './signed-out-notice'
import { contentOf, useAutosave } from './use-autosave'

const engine = { draftGarment, handles }

/** A version as it is drawn today; nothing when it cannot be. */
function drawn(order: DraftOrder): Draft | undefined {
  try {
    return draftGarment(order)
  } catch (error) {
    if (error instanceof DraftingError) return undefined
    throw error
  }
}

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
  /** When the version on the table was printed or shared, and is drawn otherwise today. */
  readonly otherwise: KeptOtherwise | null
  readonly userId: string
  readonly workroomId: string
  /** It comes from this device, because the server could not be reached. */
  readonly fromDevice?: boolean
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
  otherwise,
  userId,
  workroomId,
  fromDevice = false,
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
  const [printed, setPrinted] = useState<{
    readonly revisionId: string | undefined
    readonly draft: Draft | undefined
  }>()
  const [told, setTold] = useState(false)
  const place = { draftId: draft.id, head: draft.head, writable: draft.writable, userId, workroomId }
  const { state, theirs, settle, autosave } = useAutosave(store, place)

  useEffect(() => {
    if (fromDevice) return
    const opened = { draftId: draft.id, draft, back, openedAt: new Date().toISOString() }
    // Without room on the device it only opens with the network.
    void rememberOpened(localName(userId, workroomId), opened).catch(() => undefined)
    // What it was opened with; every later version is remembered when it is saved.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [draft.id])

  const close = () => setOpen(undefined)
  const onVersions = useCallback(() => setOpen('versions'), [])
  const onShare = useCallback(() => setOpen('share'), [])
  const onPrint = useCallback(() => {
    store.commit('Change')
    void autosave.flush().then((revisionId) => {
      setPrinted({ revisionId, draft: store.get().draft })
      setOpen('print')
    })
  }, [autosave, store])
  const onPrintVersion = (version: Version) => {
    setPrinted({ revisionId: version.id, draft: drawn(version.order) })
    setOpen('print')
  }

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
    if (state.kind === 'refused') return <ErrorNote>{state.message}</ErrorNote>
    if (otherwise && !told)
      return <KeptNotice otherwise={otherwise} onPrint={onPrint} onClose={() => setTold(true)} />
    if (!fromDevice) return undefined
    return (
      <Note kind="info" className="border-b hairline">
        <p role="status">
          Opened from this device, without the network. What you change is kept here, and saved as soon as the
          network is back.
        </p>
      </Note>
    )
  }, [autosave, fromDevice, onPrint, otherwise, settle, state, store, theirs, told])

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
          onPrint={onPrintVersion}
        />
      )}
      {open === 'share' && (
        <ShareLeaf onClose={close} draftId={draft.id} draftName={name} beforeMaking={autosave.flush} />
      )}
      {open === 'print' && printed && <PrintLeaf onClose={close} draftId={draft.id} {...printed} />}
    </>
  )
}
