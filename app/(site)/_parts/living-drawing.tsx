'use client'

import { useRef, useState } from 'react'
import { Field } from '@/components/ui/field'
import type { HeroDraft } from './hero-draft'

/** The engine comes when it is first needed: the first drawing was made on the server. */
const engine = () => import('./hero-draft')

/** A dress that redraws as one number changes, with the sums that changed with it. */
export function LivingDrawing({
  first,
  typed: firstTyped,
}: {
  readonly first: HeroDraft
  readonly typed: string
}) {
  const [typed, setTyped] = useState(firstTyped)
  const [shown, setShown] = useState(first)
  const [problem, setProblem] = useState<string>()
  const latest = useRef(firstTyped)

  async function change(text: string) {
    setTyped(text)
    latest.current = text
    const { heroFor } = await engine()
    if (latest.current !== text) return
    const drafted = heroFor(text)
    if ('problem' in drafted) return setProblem(drafted.problem)
    setProblem(undefined)
    setShown(drafted)
  }

  const eighths = eighthsIn(typed)
  return (
    <div className="grid gap-6 lg:grid-cols-[1fr_17rem] lg:items-center">
      <div
        className={`order-2 lg:order-1 [&>svg]:mx-auto [&>svg]:block [&>svg]:max-h-[74dvh] [&>svg]:w-full ${problem ? 'opacity-45' : ''}`}
        // Drawn by our own engine from a number; nothing in it was typed.
        dangerouslySetInnerHTML={{ __html: shown.svg }}
      />
      <div className="order-1 grid gap-4 lg:order-2">
        <Field
          label="Bust, in inches"
          inputMode="text"
          autoComplete="off"
          value={typed}
          error={problem}
          hint="Type 38 3/4, or pull the tape."
          onFocus={() => void engine()}
          onChange={({ target }) => void change(target.value)}
        />
        <input
          type="range"
          aria-label="Bust, in eighths of an inch"
          aria-valuetext={`${typed} inches`}
          min={32 * 8}
          max={50 * 8}
          value={eighths ?? 36.5 * 8}
          onPointerDown={() => void engine()}
          onChange={({ target }) => void change(inchesOf(Number(target.value)))}
          className="h-11 w-full accent-indigo"
        />
        <dl className="grid gap-3" aria-live="polite">
          {shown.sums.map(({ text, sum }) => (
            <div key={text} className="border-l-3 border-indigo pl-3">
              <dt className="text-sm text-walnut">{text}</dt>
              <dd className="measure text-lg font-semibold">{sum}</dd>
            </div>
          ))}
        </dl>
      </div>
    </div>
  )
}

/** 291 → '36 3/8' */
function inchesOf(eighths: number): string {
  const whole = Math.floor(eighths / 8)
  const part = eighths % 8
  if (part === 0) return String(whole)
  const shared = part % 4 === 0 ? 4 : part % 2 === 0 ? 2 : 1
  return `${whole} ${part / shared}/${8 / shared}`
}

/** Where the slider stands for what is typed, when that is whole inches and a fraction. */
function eighthsIn(typed: string): number | null {
  const found = /^\s*(\d+)(?:\s+(\d)\/(2|4|8))?\s*$/.exec(typed)
  return found ? Number(found[1]) * 8 + (found[2] ? (Number(found[2]) * 8) / Number(found[3]) : 0) : null
}
