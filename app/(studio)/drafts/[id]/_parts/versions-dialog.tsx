'use client'

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState, type FormEvent } from 'react'
import type { StudioStore } from '@/components/studio/store'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { ask, type Version, type VersionSummary } from '../../../_data/api'
import type { Autosave } from '../../../_data/autosave'
import { Queries } from '../../../_data/queries'
import { contentOf } from './use-autosave'

interface Props {
  readonly onClose: () => void
  readonly draftId: string
  readonly store: StudioStore
  readonly autosave: Autosave
  readonly writable: boolean
  /** Prints a version that was printed or shared before. */
  readonly onPrint: (version: Version) => void
}

/** Every saved version: give the present one a name, or put an old one back on the table. */
export function VersionsDialog(props: Props) {
  return (
    <Dialog open onClose={props.onClose} title="Versions">
      <Queries>
        <Versions {...props} />
      </Queries>
    </Dialog>
  )
}

function Versions({ onClose, draftId, store, autosave, writable, onPrint }: Props) {
  const queries = useQueryClient()
  const key = ['versions', draftId]
  const list = useQuery({
    queryKey: key,
    queryFn: () => ask<VersionSummary[]>(`/api/drafts/${draftId}/revisions`),
  })
  const again = () => queries.invalidateQueries({ queryKey: key })

  const fetched = (id: string) => ask<Version>(`/api/drafts/${draftId}/revisions/${id}`)
  const print = useMutation({ mutationFn: fetched, onSuccess: onPrint })
  const restore = useMutation({
    mutationFn: fetched,
    onSuccess: (version) => {
      const { unit: _unit, ...order } = version.order
      store.replace({ order, typed: version.typed }, `Back to ${version.name ?? momentText(version.savedAt)}`)
      onClose()
    },
  })

  return (
    <div className="grid gap-5">
      {writable && <NameForm store={store} autosave={autosave} onNamed={again} />}
      {list.isPending && <p role="status">Looking for the versions…</p>}
      {list.error && <ErrorNote>{list.error.message}</ErrorNote>}
      {(restore.error ?? print.error) && <ErrorNote>{(restore.error ?? print.error)?.message}</ErrorNote>}
      <ol className="border-t hairline">
        {list.data?.map((version) => (
          <li key={version.id} className="flex items-center justify-between gap-4 border-b hairline py-2.5">
            <div className="min-w-0">
              <p className={version.name ? 'font-semibold' : undefined}>
                {version.name ?? momentText(version.savedAt)}
              </p>
              <p className="text-sm text-walnut">{notes(version).join(' · ')}</p>
            </div>
            <div className="flex shrink-0 items-center gap-2">
              {(version.printed || version.shared) && (
                <Button look="quiet" busy={print.isPending} onClick={() => print.mutate(version.id)}>
                  Print again
                </Button>
              )}
              {version.id === autosave.base() ? (
                <span className="text-sm text-walnut">On the table</span>
              ) : (
                writable && (
                  <Button busy={restore.isPending} onClick={() => restore.mutate(version.id)}>
                    Put back
                  </Button>
                )
              )}
            </div>
          </li>
        ))}
      </ol>
      <p className="text-sm text-walnut">
        Versions saved while you work are thinned to one an hour after a day. Named, printed and shared ones
        stay.
      </p>
    </div>
  )
}

function NameForm({
  store,
  autosave,
  onNamed,
}: {
  readonly store: StudioStore
  readonly autosave: Autosave
  readonly onNamed: () => void
}) {
  const [name, setName] = useState('')
  const save = useMutation({
    mutationFn: async () => {
      if (!(await autosave.saveNamed(name.trim(), contentOf(store))))
        throw new Error('It could not be saved yet. Try again.')
    },
    onSuccess: () => {
      setName('')
      onNamed()
    },
  })
  function submit(event: FormEvent) {
    event.preventDefault()
    if (name.trim()) save.mutate()
  }
  return (
    <form onSubmit={submit} className="flex items-end gap-3">
      <Field
        label="Name this version"
        placeholder="First fitting"
        className="flex-1"
        value={name}
        maxLength={120}
        onChange={(event) => setName(event.target.value)}
        error={save.error?.message}
      />
      <Button type="submit" look="primary" busy={save.isPending} disabled={!name.trim()}>
        Save it
      </Button>
    </form>
  )
}

function momentText(iso: string): string {
  return new Intl.DateTimeFormat(undefined, { dateStyle: 'medium', timeStyle: 'short' }).format(new Date(iso))
}

function notes(version: VersionSummary): readonly string[] {
  return [
    version.name ? momentText(version.savedAt) : 'Saved while working',
    ...(version.conflict ? ['Kept beside another version'] : []),
    ...(version.printed ? ['Printed'] : []),
    ...(version.shared ? ['Shared'] : []),
  ]
}
