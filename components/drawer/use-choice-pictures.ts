'use client'

import { useDeferredValue, useMemo, useState } from 'react'
import type { DesignValue, DraftOrder } from '@/drafting'
import { DraftingError } from '@/drafting/drafting-error'
import { closeUp } from '@/drafting/sketch/close-up'
import { sketch } from '@/drafting/sketch'
import { pictureOf, type Picture } from '@/drafting/sketch/picture'
import type { Engine } from '@/components/studio/engine'
import { useStudio, useStudioState } from '@/components/studio/use-store'

/**
 * How the garment on the table would look with each choice of a style value, drawn by the engine when the table rests.
 * @returns nothing when the choices cannot be told apart by a picture
 */
export function useChoicePictures(value: DesignValue): ReadonlyMap<string, Picture> | undefined {
  const { engine } = useStudio()
  const settled = useStudioState((state) => (state.gesture ? undefined : state.order))
  const [order, setOrder] = useState(settled)
  if (settled && settled !== order) setOrder(settled)
  // The drawing on the table comes first.
  const later = useDeferredValue(order)
  return useMemo(() => later && choicePictures(value, later, engine), [engine, later, value])
}

function choicePictures(
  { id, part, choices = [] }: DesignValue,
  order: DraftOrder,
  { draftGarment }: Engine,
): ReadonlyMap<string, Picture> | undefined {
  const drawn = choices.flatMap((choice) => {
    try {
      const draft = draftGarment({ ...order, design: { ...order.design, [id]: choice }, explain: false })
      return [[choice, pictureOf(closeUp(sketch(draft), draft, part))] as const]
    } catch (error) {
      if (error instanceof DraftingError) return []
      throw error
    }
  })
  const different = new Set(drawn.map(([, { lines }]) => lines.map(({ d }) => d).join()))
  return different.size > 1 && different.size === drawn.length ? new Map(drawn) : undefined
}
