import type { Unit } from '@/drafting/contract'
import type { SharedStep } from '@/app/_server/share/shared-view'

/** Of a lesson: every mark and line in the order in which they are drawn, with the sums to follow on one's own measurements. */
export function Steps({ steps, unit }: { readonly steps: readonly SharedStep[]; readonly unit: Unit }) {
  return (
    <section aria-labelledby="steps" className="mt-12 max-w-180">
      <h2 id="steps" className="mb-3 text-lg font-semibold">
        Step by step
      </h2>
      <ol>
        {steps.map((step, index) => (
          <li key={index} className="grid grid-cols-[2.5rem_1fr] border-b hairline py-2">
            <span className="text-walnut tabular-nums">{index + 1}</span>
            <span>
              <span className="text-walnut">{step.piece}: </span>
              {step.text}
              {step.sum && <span className="block font-semibold tabular-nums">{step.sum[unit]}</span>}
            </span>
          </li>
        ))}
      </ol>
    </section>
  )
}
