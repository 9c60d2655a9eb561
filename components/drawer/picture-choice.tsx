'use client'

import { useId } from 'react'
import type { Picture } from '@/drafting/sketch/picture'
import { GarmentPicture } from '@/components/forms/garment-picture'
import { classes } from '@/components/ui/classes'

/** One of a few, each shown as the garment would look with it. */
export function PictureChoice({
  label,
  value,
  choices,
  disabled,
  error,
  onChange,
}: {
  readonly label: string
  readonly value: string
  readonly choices: readonly {
    readonly value: string
    readonly label: string
    /** Missing when this body cannot have it. */
    readonly picture: Picture | undefined
  }[]
  readonly disabled: boolean
  readonly error: string | undefined
  readonly onChange: (value: string) => void
}) {
  const name = useId()
  return (
    <fieldset aria-describedby={error ? `${name}-error` : undefined} disabled={disabled}>
      <legend className="mb-1 text-sm font-semibold">{label}</legend>
      <div className="grid grid-cols-3 gap-2">
        {choices.map((choice) => (
          <label
            key={choice.value}
            className={classes(
              'grid cursor-pointer grid-rows-[3.5rem_auto] justify-items-center gap-1 border bg-sheet px-1 pt-2 pb-1 text-center text-sm leading-4',
              'hover:border-indigo has-focus-visible:outline-2 has-focus-visible:outline-indigo',
              choice.value === value
                ? 'border-indigo text-indigo shadow-[inset_0_0_0_1px_var(--indigo)]'
                : 'hairline',
            )}
          >
            <input
              type="radio"
              name={name}
              value={choice.value}
              checked={choice.value === value}
              onChange={() => onChange(choice.value)}
              className="sr-only"
            />
            {choice.picture ? <GarmentPicture picture={choice.picture} className="size-full" /> : <span />}
            <span className={classes('self-center', choice.value === value ? 'font-semibold' : 'text-ink')}>
              {choice.label}
            </span>
          </label>
        ))}
      </div>
      {error && (
        <p id={`${name}-error`} className="mt-1 text-sm text-madder">
          {error}
        </p>
      )}
    </fieldset>
  )
}
