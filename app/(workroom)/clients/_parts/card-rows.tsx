import Link from 'next/link'
import { typesetFractions } from '@/drafting/drawing/typeset'
import type { Card } from '@/db/access/cards'
import { formatLength } from '@/drafting/lengths'
import { dayText } from '../../_data/dates'

/** What tells one card from another at a glance. */
const shown = [
  ['bust', 'bust'],
  ['waist', 'waist'],
  ['hip', 'hip'],
] as const

/** Measure cards, newest first. */
export function CardRows({ cards }: { readonly cards: readonly Card[] }) {
  return (
    <ul>
      {cards.map((card) => {
        const figures = shown.flatMap(([id, word]) => {
          const value = card.values[id]
          return value ? [`${word} ${typesetFractions(formatLength(value.mm, card.unit))}`] : []
        })
        return (
          <li key={card.id} className="border-t hairline first:border-t-0">
            <Link
              href={`/cards/${card.id}`}
              className="flex flex-wrap items-baseline justify-between gap-x-4 py-3 hover:text-indigo"
            >
              <span className="font-semibold">{card.name}</span>
              <span className="measure text-sm text-walnut">{figures.join(' · ')}</span>
              <span className="w-full text-sm text-walnut sm:w-auto">{dayText(card.takenOn)}</span>
            </Link>
          </li>
        )
      })}
    </ul>
  )
}
