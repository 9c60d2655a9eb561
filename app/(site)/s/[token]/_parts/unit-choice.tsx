'use client'

import type { Unit } from '@/drafting/contract'
import { classes } from '@/components/ui/classes'

const units = [
  { unit: 'in', word: 'inches' },
  { unit: 'cm', word: 'cm' },
] as const

/** Inches or centimetres, for every length on the page. */
export function UnitChoice({
  unit,
  onChange,
}: {
  readonly unit: Unit
  readonly onChange: (unit: Unit) => void
}) {
  return (
    <div role="group" aria-label="Unit" className="flex rounded border border-rule bg-sheet">
      {units.map((each) => (
        <button
          key={each.unit}
          type="button"
          aria-pressed={unit === each.unit}
          onClick={() => onChange(each.unit)}
          className={classes(
            'min-h-10 rounded px-4 font-semibold',
            unit === each.unit ? 'bg-indigo text-ground' : 'text-indigo hover:bg-panel',
          )}
        >
          {each.word}
        </button>
      ))}
    </div>
  )
}
