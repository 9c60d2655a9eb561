import Link from 'next/link'
import { Table } from '@/components/ui/table'
import type { Maker } from '@/db/access/assigning'
import type { DraftSummary } from '@/db/access/drafts'
import { garments } from '@/drafting'
import { dayText } from '../../_data/dates'
import { MakerChoice } from './maker-choice'

const garmentName = (id: string) => garments.find((garment) => garment.id === id)?.name ?? id

/** Drafts, last changed first. */
export function DraftRows({
  drafts,
  withClient = true,
  makers = [],
}: {
  readonly drafts: readonly DraftSummary[]
  readonly withClient?: boolean
  /** Whom the drafts can be given to, where the person may give them out. */
  readonly makers?: readonly Maker[]
}) {
  return (
    <Table
      caption="Drafts"
      rows={drafts}
      rowKey={(draft) => draft.id}
      columns={[
        {
          id: 'name',
          head: 'Name',
          cell: (draft: DraftSummary) => (
            <Link
              href={`/drafts/${draft.id}`}
              className="font-semibold decoration-rule underline-offset-4 hover:text-indigo hover:underline"
            >
              {draft.name}
            </Link>
          ),
        },
        ...(withClient
          ? [
              {
                id: 'client',
                head: 'For',
                cell: (draft: DraftSummary) => draft.clientName ?? 'Nobody in particular',
              },
            ]
          : []),
        { id: 'garment', head: 'Garment', cell: (draft) => garmentName(draft.garment) },
        ...(makers.length > 0
          ? [
              {
                id: 'maker',
                head: 'Made up by',
                cell: (draft: DraftSummary) =>
                  draft.purpose === 'work' && <MakerChoice draft={draft} makers={makers} />,
              },
            ]
          : []),
        { id: 'changed', head: 'Last change', end: true, cell: (draft) => dayText(draft.updatedAt) },
      ]}
    />
  )
}
