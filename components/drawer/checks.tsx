'use client'

import { CircleCheck, TriangleAlert } from 'lucide-react'
import { formatLength } from '@/drafting/lengths'
import type { Fit, SeamCheck } from '@/drafting/contract'
import { classes } from '@/components/ui/classes'
import { Note } from '@/components/ui/error-note'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { useStudioState } from '@/components/studio/use-store'
import { piecesById, runsLength } from '@/drafting/pieces/runs'
import { seamAgrees } from '@/drafting/pieces/seam-agrees'
import { wordsOf } from './words-of'

/** What a look over the pattern would find: seams walked, the body it closes on, and what is odd. */
export function Checks({
  chosen,
  onChoose,
}: {
  /** 'seam:<id>' or 'fit:<id>'. */
  readonly chosen: string | undefined
  readonly onChoose: (id: string | undefined) => void
}) {
  const draft = useStudioState((state) => state.draft)
  const unit = useStudioState((state) => state.unit)
  if (!draft) return <p className="p-4 text-walnut">Nothing is drawn yet, so there is nothing to check.</p>
  const byId = piecesById(draft.pieces)
  const length = (mm: number) => typesetFractions(formatLength(mm, unit))

  function seamWords(seam: SeamCheck): string {
    const sides = `${length(runsLength(seam.a, byId))} on ${length(runsLength(seam.b, byId))}`
    const ease = seam.ease
      ? `, ${length(seam.ease)} ${seam.join === 'gathered' ? 'gathered' : 'eased'} in`
      : ''
    return seamAgrees(seam) ? sides + ease : `${sides}${ease}: ${length(seam.difference)} apart`
  }

  function fitWords(fit: Fit): string {
    if (fit.body === undefined) return length(fit.length)
    return `${length(fit.length)} on a body of ${length(fit.body)}: ${length(fit.length - fit.body)} to move in`
  }

  return (
    <div className="grid gap-6 p-4">
      {draft.cautions.length > 0 && (
        <section className="grid gap-2">
          <h2 className="font-semibold">Worth a look</h2>
          {draft.cautions.map((caution, index) => (
            <Note key={`${caution.code}:${index}`} kind="caution" className="text-sm">
              {typesetFractions(caution.message)}
            </Note>
          ))}
        </section>
      )}
      <section>
        <h2 className="mb-1 font-semibold">Seams</h2>
        <ul>
          {draft.seams.map((seam) => (
            <Row
              key={seam.id}
              name={seam.name}
              words={seamWords(seam)}
              good={seamAgrees(seam)}
              chosen={chosen === `seam:${seam.id}`}
              onChoose={() => onChoose(chosen === `seam:${seam.id}` ? undefined : `seam:${seam.id}`)}
            />
          ))}
        </ul>
      </section>
      <section>
        <h2 className="mb-1 font-semibold">On the body</h2>
        <ul>
          {draft.fits.map((fit) => (
            <Row
              key={fit.id}
              name={wordsOf(fit.id)}
              words={fitWords(fit)}
              good={fit.relation !== 'at-least' || fit.length >= (fit.body ?? 0) + fit.ease - 0.5}
              chosen={chosen === `fit:${fit.id}`}
              onChoose={() => onChoose(chosen === `fit:${fit.id}` ? undefined : `fit:${fit.id}`)}
            />
          ))}
        </ul>
      </section>
    </div>
  )
}

function Row({
  name,
  words,
  good,
  chosen,
  onChoose,
}: {
  readonly name: string
  readonly words: string
  readonly good: boolean
  readonly chosen: boolean
  readonly onChoose: () => void
}) {
  const Icon = good ? CircleCheck : TriangleAlert
  return (
    <li className="border-b hairline">
      <button
        type="button"
        aria-pressed={chosen}
        onClick={onChoose}
        className={classes(
          'flex min-h-11 w-full items-start gap-2.5 px-1 py-2 text-left hover:bg-sheet',
          chosen && 'bg-sheet shadow-[inset_3px_0_0_var(--indigo)]',
        )}
      >
        <Icon
          size={18}
          aria-hidden
          className={classes('mt-0.75 shrink-0', good ? 'text-fern' : 'text-weld')}
        />
        <span>
          <span className="font-semibold">{name}</span>
          <span className="sr-only">{good ? ', checks out' : ', needs a look'}</span>
          <span className="block text-sm text-walnut">{words}</span>
        </span>
      </button>
    </li>
  )
}
