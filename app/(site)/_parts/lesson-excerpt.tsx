import { typesetFractions } from '@/drafting/drawing'
import { formatLength } from '@/drafting/lengths'
import type { Step } from '@/drafting/contract'

/** The first sums of a real draft, as a student reads them. */
export function LessonExcerpt({ steps }: { readonly steps: readonly Step[] }) {
  return (
    <ol className="border-t hairline">
      {steps.map((step) => (
        <li key={step.id} className="grid gap-x-6 border-b hairline py-2.5 sm:grid-cols-[1fr_auto]">
          <span>{step.text}</span>
          <span className="measure font-semibold">
            {typesetFractions(step.arithmetic ?? formatLength(step.length ?? 0, 'in'))}
          </span>
        </li>
      ))}
    </ol>
  )
}
