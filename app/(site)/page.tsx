import type { Metadata } from 'next'
import { PrintPreview } from '@/components/print/print-preview'
import { ButtonLink } from '@/components/ui/button'
import { layOut, paperOf } from '@/drafting/drawing'
import { LessonExcerpt } from './_parts/lesson-excerpt'
import { LivingDrawing } from './_parts/living-drawing'
import { WhatItDoes } from './_parts/what-it-does'
import { exampleDraft, heroDraft } from './_parts/hero-draft'

export const metadata: Metadata = {
  title: { absolute: 'Chalkfold: made-to-measure patterns, drafted in the browser' },
  description:
    'Type a client’s measurements and the flat pattern is drafted: every point with the sum behind it, seams checked, printed true to scale.',
}

const typed = '36 1/2'
const example = exampleDraft(36.5)
const first = heroDraft(36.5 * 25.4)
const sheets = layOut({ draft: example, paper: paperOf('a4'), orientation: 'fewest', allowances: true })
/** Those that come out in eighths by themselves; the rest carry decimals that say little at a glance. */
const sums = example.steps
  .filter((step) => step.piece === 'front' && step.length && !/\d\.\d/.test(step.arithmetic ?? ''))
  .slice(0, 7)

/** The door: a dress that redraws, what the work is, and the way in. Everything drawn here comes from the engine. */
export default function Landing() {
  return (
    <>
      <section className="mx-auto max-w-360 px-4 pt-4 sm:px-8 lg:grid lg:grid-cols-[minmax(20rem,26rem)_1fr] lg:items-center lg:gap-10">
        <div className="pb-8">
          <h1 className="text-2xl leading-[1.15] font-semibold tracking-tight sm:text-[2.75rem]">
            Change one number. The whole pattern follows.
          </h1>
          <p className="mt-4 max-w-110 text-lg leading-relaxed text-walnut">
            Chalkfold drafts made-to-measure dresses and skirts from a client’s measurements, keeps the sum
            behind every point, checks that the seams meet, and prints them true to scale.
          </p>
          <div className="mt-6 flex flex-wrap gap-3">
            <ButtonLink look="primary" href="/join">
              Open a workroom
            </ButtonLink>
            <ButtonLink href="/sign-in">Sign in</ButtonLink>
          </div>
        </div>
        <LivingDrawing first={first} typed={typed} />
      </section>

      <section className="mx-auto max-w-280 px-4 pt-20 sm:px-8" aria-labelledby="work">
        <h2 id="work" className="mb-8 text-xl font-semibold tracking-tight sm:text-2xl">
          The work, from tape to table
        </h2>
        <WhatItDoes />
      </section>

      <section
        className="mx-auto grid max-w-280 gap-x-14 gap-y-10 px-4 pt-20 sm:px-8 lg:grid-cols-2"
        aria-labelledby="sums"
      >
        <div>
          <h2 id="sums" className="text-xl font-semibold tracking-tight sm:text-2xl">
            Nothing is drawn that cannot be worked by hand
          </h2>
          <p className="mt-2 mb-5 text-walnut">
            These are the first sums of the dress above, at 36½ inches. The rules behind them are yours to
            change.
          </p>
          <LessonExcerpt steps={sums} />
        </div>
        <figure>
          <div className="bg-panel p-5">
            <PrintPreview laidOut={sheets} />
          </div>
          <figcaption className="mt-2 text-sm text-walnut">
            The same dress with sleeves, facings and pockets on{' '}
            {sheets.tiling.pages.filter((page) => !page.blank).length} sheets of A4. Empty sheets are left
            out.
          </figcaption>
        </figure>
      </section>

      <section className="mx-auto max-w-280 px-4 py-20 sm:px-8">
        <p className="mb-4 max-w-140 text-lg">
          A workroom holds your clients, cards and drafts, and whoever works with you. The measurements on
          this page are invented.
        </p>
        <ButtonLink look="primary" href="/join">
          Open a workroom
        </ButtonLink>
      </section>
    </>
  )
}
