import { typesetFractions } from '@/drafting/drawing/typeset'

/** Lengths that a scale bar may show. */
const rounds = {
  cm: [1, 2, 5, 10, 20, 50, 100].map((length) => ({ mm: length * 10, words: `${length} cm` })),
  in: [0.5, 1, 2, 5, 10, 20, 40].map((length) => ({
    mm: length * 25.4,
    words: length < 1 ? '1/2 in' : `${length} in`,
  })),
} as const

/** How long a piece of the drawing is: a bar of a round length, and the way the grain runs. */
export function ScaleBar({ scale, unit }: { readonly scale: number; readonly unit: 'in' | 'cm' }) {
  const bar = rounds[unit].find((round) => round.mm * scale >= 48) ?? rounds[unit][6]
  const width = Math.round((bar?.mm ?? 0) * scale)
  return (
    <div
      className="pointer-events-none absolute bottom-3 left-3 flex items-end gap-4 text-tag text-walnut"
      aria-hidden
    >
      <div>
        <span className="measure">{typesetFractions(bar?.words ?? '')}</span>
        <svg width={width + 2} height="8" fill="none" stroke="currentColor" className="block">
          <path d={`M1 1v6h${width}v-6`} />
        </svg>
      </div>
      <div className="flex items-center gap-1.5">
        <svg width="9" height="26" viewBox="0 0 9 26" fill="none" stroke="currentColor">
          <path d="M4.5 1v24M1 5l3.5-4L8 5M1 21l3.5 4L8 21" />
        </svg>
        grain
      </div>
    </div>
  )
}
