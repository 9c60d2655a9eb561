'use client'

import { isOffered } from '@/drafting'
import { problemsAt } from '@/components/studio/store'
import { useStudio, useStudioList } from '@/components/studio/use-store'
import { currentValue } from '@/components/studio/values'
import { ChoiceGroup } from './choice-group'

/** The style: what was chosen about the garment, by its parts. What a choice rules out is not shown. */
export function Choices() {
  const { garment } = useStudio()
  const offered = useStudioList((state) =>
    garment.design.filter(
      (value) =>
        isOffered(value, (id) => currentValue(garment, state.order, `design.${id}`), garment) ||
        // What another choice ruled out stays in sight until it is changed.
        problemsAt(state, `design.${value.id}`).length > 0,
    ),
  )
  const parts = [...new Set(offered.map((value) => value.part))]
  return (
    <div>
      {parts.map((part, index) => (
        <ChoiceGroup
          key={part}
          part={part}
          values={offered.filter((value) => value.part === part)}
          opened={index === 0}
        />
      ))}
    </div>
  )
}
