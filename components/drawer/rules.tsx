'use client'

import { useState } from 'react'
import { rulesInForce } from '@/drafting'
import type { RuleInForce } from '@/drafting/contract'
import { formatLength } from '@/drafting/lengths'
import { FieldFrame, controlClass } from '@/components/ui/field'
import { typesetFractions } from '@/drafting/drawing/typeset'
import type { FieldRef } from '@/components/studio/field-ref'
import { problemsAt } from '@/components/studio/store'
import { useStudio, useStudioState } from '@/components/studio/use-store'

/** The formulas the draft works by: change one, see its sum and the pattern follow, or put the garment's own back. */
export function Rules() {
  const { garment } = useStudio()
  const method = useStudioState((state) => state.order.method)
  return (
    <div className="grid gap-6 p-4">
      <p className="text-sm text-walnut">
        Write with the names of measurements, choices and other rules, numbers with or without a unit, + − × ÷
        and brackets.
      </p>
      {rulesInForce({ garment: garment.id, ...(method ? { method } : {}) }).map((rule) => (
        <Rule key={rule.id} rule={rule} />
      ))}
    </div>
  )
}

function Rule({ rule }: { readonly rule: RuleInForce }) {
  const { store, writable } = useStudio()
  const ref: FieldRef = `rules.${rule.id}`
  const [editing, setEditing] = useState<string>()
  const own = useStudioState((state) => state.attempts[ref]?.text ?? state.order.rules?.[rule.id])
  const problem = useStudioState((state) => problemsAt(state, ref)[0]?.message)
  const sum = useStudioState((state) => {
    const step = state.draft?.steps.find((each) => each.rule === rule.id && each.arithmetic)
    if (!step?.arithmetic) return ''
    const length = step.length === undefined ? '' : ` (${formatLength(step.length, state.unit)})`
    return step.arithmetic.includes('≈') || step.arithmetic.includes('=')
      ? step.arithmetic
      : step.arithmetic + length
  })

  function type(text: string) {
    setEditing(text)
    const same = text.trim() === rule.formula
    store.put(ref, same ? undefined : text)
  }

  function keep() {
    store.commit(rule.name)
    setEditing(undefined)
  }

  return (
    <FieldFrame label={rule.name} error={problem} hint={sum ? typesetFractions(sum) : undefined}>
      {(control) => (
        <>
          <input
            {...control}
            value={editing ?? own ?? rule.formula}
            readOnly={!writable}
            spellCheck={false}
            autoComplete="off"
            onFocus={() => store.begin()}
            onBlur={keep}
            onChange={(event) => type(event.target.value)}
            onKeyDown={(event) => {
              if (event.key === 'Enter') {
                keep()
                store.begin()
              }
              if (event.key === 'Escape') {
                store.cancel()
                store.putBack(ref)
                setEditing(undefined)
                store.begin()
              }
            }}
            className={controlClass}
          />
          <p className="flex min-h-6 flex-wrap items-center justify-between gap-x-3 text-sm text-walnut">
            <span>{own === undefined ? rule.source : `Instead of ${rule.formula}`}</span>
            {own !== undefined && writable && (
              <button
                type="button"
                onClick={() => store.change(ref, undefined, rule.name)}
                className="min-h-6 font-semibold text-indigo underline underline-offset-2"
              >
                {rule.from === 'method' ? 'Put the method’s own back' : 'Put the garment’s own back'}
              </button>
            )}
          </p>
        </>
      )}
    </FieldFrame>
  )
}
