'use client'

import { Tabs as Primitive } from 'radix-ui'
import type { ReactNode } from 'react'

export interface Leaf {
  readonly id: string
  readonly label: string
  readonly content: ReactNode
}

/** Leaves of one drawer, one shown at a time; arrow keys move between the tabs. */
export function Tabs({
  label,
  leaves,
  value,
  onChange,
}: {
  readonly label: string
  readonly leaves: readonly Leaf[]
  readonly value?: string
  readonly onChange?: (id: string) => void
}) {
  return (
    <Primitive.Root
      value={value}
      defaultValue={value === undefined ? leaves[0]?.id : undefined}
      onValueChange={onChange}
      className="flex min-h-0 flex-col"
    >
      <Primitive.List aria-label={label} className="flex shrink-0 gap-1 border-b hairline px-2">
        {leaves.map((leaf) => (
          <Primitive.Trigger
            key={leaf.id}
            value={leaf.id}
            className={
              '-mb-px min-h-11 flex-1 border-b-2 border-transparent px-2 text-sm font-semibold text-walnut hover:text-ink ' +
              'data-[state=active]:border-indigo data-[state=active]:text-ink'
            }
          >
            {leaf.label}
          </Primitive.Trigger>
        ))}
      </Primitive.List>
      {leaves.map((leaf) => (
        <Primitive.Content key={leaf.id} value={leaf.id} className="min-h-0 flex-1 overflow-y-auto">
          {leaf.content}
        </Primitive.Content>
      ))}
    </Primitive.Root>
  )
}
