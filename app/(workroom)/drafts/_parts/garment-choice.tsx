'use client'

import { GarmentPicture } from '@/components/forms/garment-picture'
import { classes } from '@/components/ui/classes'
import type { PicturedGarment } from './garment-pictures'

/** The garments that can be drafted, each with its own picture. */
export function GarmentChoice({
  garments,
  chosen,
  onChoose,
}: {
  readonly garments: readonly PicturedGarment[]
  readonly chosen: string
  readonly onChoose: (id: string) => void
}) {
  return (
    <fieldset>
      <legend className="mb-2 text-sm font-semibold">Garment</legend>
      <div className="grid grid-cols-2 gap-3 sm:grid-cols-3">
        {garments.map(({ id, name, picture }) => (
          <label
            key={id}
            className={classes(
              'grid cursor-pointer grid-rows-[1fr_auto] justify-items-center gap-3 border bg-sheet p-4 hover:border-indigo',
              'has-focus-visible:outline-2 has-focus-visible:outline-indigo',
              chosen === id ? 'border-indigo text-indigo shadow-[inset_0_0_0_1px_var(--indigo)]' : 'hairline',
            )}
          >
            <input
              type="radio"
              name="garment"
              value={id}
              checked={chosen === id}
              onChange={() => onChoose(id)}
              className="sr-only"
            />
            {picture ? <GarmentPicture picture={picture} className="h-28 w-full" /> : <span />}
            <span className={chosen === id ? 'font-semibold' : 'text-ink'}>{name}</span>
          </label>
        ))}
      </div>
    </fieldset>
  )
}
