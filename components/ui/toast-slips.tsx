'use client'

import { Toast as Primitive } from 'radix-ui'

export interface Slip {
  readonly id: number
  readonly words: string
}

/** Passing messages at the lower edge, six seconds each, read out politely. */
export function ToastSlips({
  slips,
  onGone,
}: {
  readonly slips: readonly Slip[]
  readonly onGone: (id: number) => void
}) {
  return (
    <Primitive.Provider duration={6000} swipeDirection="down" label="Message">
      {slips.map((slip) => (
        <Primitive.Root
          key={slip.id}
          onOpenChange={(open) => {
            if (!open) onGone(slip.id)
          }}
          className="flex items-center gap-4 rounded bg-ink px-4 py-2.5 text-ground shadow-float"
        >
          <Primitive.Description className="grow">{slip.words}</Primitive.Description>
          <Primitive.Close className="min-h-8 rounded px-2 text-sm font-semibold underline underline-offset-4">
            Close
          </Primitive.Close>
        </Primitive.Root>
      ))}
      <Primitive.Viewport className="fixed inset-x-4 bottom-4 z-50 m-0 grid list-none gap-2 p-0 sm:left-auto sm:w-96" />
    </Primitive.Provider>
  )
}
