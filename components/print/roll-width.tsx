'use client'

import { useState } from 'react'
import { Field } from '@/components/ui/field'
import { rollWidths } from '@/drafting/drawing/papers'
import { formatLength } from '@/drafting/lengths'
import { lengthBetween } from './length-between'

/** How wide a roll is, as typed: centimetres, or any length with its unit. */
export function RollWidth({
  width,
  onChange,
}: {
  /** mm */
  readonly width: number
  readonly onChange: (width: number) => void
}) {
  const [typed, setTyped] = useState(() => formatLength(width, 'cm'))
  const read = lengthBetween(typed, rollWidths.least, rollWidths.most)
  return (
    <Field
      label="Width of the roll"
      hint="The pieces are laid along it, and only what they take is cut off."
      value={typed}
      error={read.problem}
      onChange={({ target }) => {
        setTyped(target.value)
        const { mm } = lengthBetween(target.value, rollWidths.least, rollWidths.most)
        if (mm !== undefined) onChange(mm)
      }}
    />
  )
}
