'use client'

import type { FieldRef } from '@/components/studio/field-ref'
import { byPiece } from './by-piece'
import { ResultTag, ValueTag } from './tag'
import { usePieceNames } from './use-piece-names'

/** A dimension of the draft as a tag: with a field it can be typed in. */
export interface TagEntry {
  readonly id: string
  readonly piece: string
  readonly label: string
  readonly field: FieldRef | undefined
}

/** Every tag, piece by piece and in the drafting order: what the eye sees on the drawing, the ear hears as a list. */
export function Tags({
  tags,
  onOpen,
}: {
  readonly tags: readonly TagEntry[]
  readonly onOpen: ((dimension: string) => void) | undefined
}) {
  const names = usePieceNames()
  return (
    <ol aria-label="Measurements on the drawing" className="pointer-events-none absolute inset-0">
      {byPiece(tags).map(({ piece, items }) => (
        <li key={`${piece}/${items[0]?.id}`}>
          <ol aria-label={names.get(piece)}>
            {items.map((tag) =>
              tag.field ? (
                <ValueTag
                  key={tag.id}
                  dimension={tag.id}
                  label={tag.label}
                  field={tag.field}
                  onOpen={onOpen}
                />
              ) : (
                <ResultTag key={tag.id} id={tag.id} label={tag.label} />
              ),
            )}
          </ol>
        </li>
      ))}
    </ol>
  )
}
