'use client'

import { useState } from 'react'
import type { Unit } from '@/drafting/contract'
import type { SharedView } from '@/app/_server/share/shared-view'
import { useShared } from '@/app/(site)/_data/shared'
import { firstChoices } from '@/components/print/print-choices'
import { PrintForm } from '@/components/print/print-form'
import { Note } from '@/components/ui/error-note'
import { Moment } from '@/components/ui/moment'
import NoSuchLink from '../not-found'
import { Checks, Lengths, Pieces } from './lists'
import { Steps } from './steps'
import { Sheet } from './sheet'
import { UnitChoice } from './unit-choice'

/** A draft as a visitor sees it: to look at, in either unit, and to print. */
export function SharedDraft({ token, opened }: { readonly token: string; readonly opened: SharedView }) {
  const view = useShared(token, opened)
  const [unit, setUnit] = useState<Unit>(opened.unit)
  const [choices, setChoices] = useState(firstChoices)
  if (!view) return <NoSuchLink />
  return (
    <article className="mx-auto max-w-400 px-4 pb-16 sm:px-8">
      <header className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3 pt-3 pb-5">
        <div className="min-w-0">
          <h1 className="text-xl leading-tight font-semibold tracking-tight break-words sm:text-2xl">
            {view.name}
          </h1>
          <p className="mt-1 text-walnut">
            {view.garment}, drafted by {view.workroom}. Saved <Moment at={view.savedAt} />.
          </p>
        </div>
        <UnitChoice unit={unit} onChange={setUnit} />
      </header>
      {view.otherwise.length > 0 && (
        <Note kind="caution" className="mb-4">
          This is the drawing as it was shared. Today {view.otherwise.join(', ')} would be drawn a little
          otherwise: whoever has printed some of it already goes on with this one.
        </Note>
      )}
      <Sheet svg={view.svg} unit={unit} />
      <div className="mt-10 grid gap-x-12 gap-y-10 md:grid-cols-[1fr_1fr] xl:grid-cols-[1fr_1fr_18rem]">
        <Lengths tags={view.tags} unit={unit} />
        <div className="grid content-start gap-10">
          <Checks checks={view.checks} unit={unit} />
          <Pieces pieces={view.pieces} />
        </div>
        <section aria-labelledby="print" className="max-w-110">
          <h2 id="print" className="mb-3 text-lg font-semibold">
            Print it
          </h2>
          <PrintForm
            base={`/api/shared/${token}`}
            choices={choices}
            onChange={setChoices}
            facts={sheetWords(view)}
          />
        </section>
      </div>
      {view.steps && <Steps steps={view.steps} unit={unit} />}
    </article>
  )
}

function sheetWords({ sheets }: SharedView): string {
  return `With allowances it takes ${sheets.a4} sheets of A4 or ${sheets.letter} of US letter, after a first one with the test squares.`
}
