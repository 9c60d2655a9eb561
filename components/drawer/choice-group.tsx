'use client'

import { ChevronDown } from 'lucide-react'
import { useId, useState } from 'react'
import { isOffered, type DesignValue } from '@/drafting'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { classes } from '@/components/ui/classes'
import { useStudio, useStudioState } from '@/components/studio/use-store'
import { problemsAt } from '@/components/studio/store'
import { currentValue, formatValue, kindOf, unitWord } from '@/components/studio/values'
import { Choice } from './choice'
import { wordsOf } from './words-of'

/** The choices about one part of the garment, folded away under its name until they are wanted. */
export function ChoiceGroup({
  part,
  values,
  opened,
}: {
  readonly part: string
  /** All that are offered now. */
  readonly values: readonly DesignValue[]
  /** Whether it stands open at first. */
  readonly opened: boolean
}) {
  const id = useId()
  const [open, setOpen] = useState(opened)
  const wrong = useStudioState((state) =>
    values.some((value) => problemsAt(state, `design.${value.id}`).length > 0),
  )
  const shown = open || wrong
  return (
    <section className="border-b hairline last:border-b-0">
      <h2>
        <button
          type="button"
          aria-expanded={shown}
          aria-controls={id}
          onClick={() => setOpen(!shown)}
          className="flex min-h-11 w-full items-center gap-2 px-4 py-2 text-left hover:text-indigo"
        >
          <span className="font-semibold">{wordsOf(part)}</span>
          {!shown && <Summary values={values} />}
          <ChevronDown
            size={16}
            aria-hidden
            className={classes('ml-auto shrink-0 text-walnut', shown && 'rotate-180')}
          />
        </button>
      </h2>
      <div id={id} hidden={!shown} className="grid gap-4 px-4 pt-1 pb-5">
        {shown && values.map((value) => <Choice key={value.id} value={value} />)}
      </div>
    </section>
  )
}

/** What is chosen in a folded group, in a few words: what was chosen by name, or what was changed. */
function Summary({ values }: { readonly values: readonly DesignValue[] }) {
  const { garment } = useStudio()
  const words = useStudioState((state) => {
    const offered = values.filter((value) =>
      isOffered(value, (id) => currentValue(garment, state.order, `design.${id}`), garment),
    )
    const said = offered.flatMap((value) => {
      const now = currentValue(garment, state.order, `design.${value.id}`) ?? value.default
      if (value.kind === 'choice') return [wordsOf(String(now))]
      if (now === value.default) return []
      if (value.kind === 'yes-no') return [now ? value.name : `no ${value.name.toLowerCase()}`]
      const kind = kindOf(garment, `design.${value.id}`)
      return [`${formatValue(kind, now, state.unit)} ${unitWord(kind, state.unit)}`.trim()]
    })
    return said.slice(0, 3).join(' · ')
  })
  return <span className="min-w-0 truncate text-sm text-walnut">{typesetFractions(words)}</span>
}
