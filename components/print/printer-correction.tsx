'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { correctable, trueMeasure } from '@/drafting/drawing/print-scale'
import type { Measured } from '@/drafting/drawing'
import { lengthBetween } from './length-between'

/** A printer that somebody measured. */
export interface Printer {
  readonly id: string
  readonly name: string
  readonly measured: Measured
}

/** The printers a person has measured, and how another is kept or one forgotten. Both throw an Error with words to show. */
export interface Printers {
  readonly known: readonly Printer[]
  readonly keep: (name: string, measured: Measured) => Promise<Printer>
  readonly forget: (id: string) => Promise<void>
}

const truePrinter = ''
const unnamed = 'unnamed'

const inWords = (mm: number) => `${Math.round(mm * 10) / 100} cm`
const isTrue = ({ short, long }: Measured) => short === 100 && long === 100

/**
 * For a printer whose test square is off: what it measured both ways. The pattern is then drawn the inverse of that, and the next test
 * square must be right.
 */
export function PrinterCorrection({
  measured,
  onChange,
  printers,
}: {
  readonly measured: Measured
  readonly onChange: (measured: Measured) => void
  readonly printers?: Printers
}) {
  const [chosen, setChosen] = useState(isTrue(measured) ? truePrinter : unnamed)
  const known = printers?.known ?? []
  const printer = known.find(({ id }) => id === chosen)

  function choose(id: string) {
    setChosen(id)
    const own = known.find((each) => each.id === id)
    if (id === truePrinter) onChange(trueMeasure)
    if (own) onChange(own.measured)
  }

  return (
    <details className="border-t hairline pt-3">
      <summary className="min-h-6 cursor-pointer text-sm font-semibold">
        My printer is off
        {!isTrue(measured) && <span className="font-normal text-walnut"> · corrected</span>}
      </summary>
      <div className="grid gap-4 pt-3">
        <Select
          label="Printer"
          choices={[
            { value: truePrinter, label: 'A true printer: no correction' },
            ...known.map(({ id, name, measured: got }) => ({
              value: id,
              label: `${name} (${inWords(got.short)} × ${inWords(got.long)})`,
            })),
            { value: unnamed, label: known.length > 0 ? 'Another printer …' : 'Correct a printer …' },
          ]}
          value={printer || chosen !== unnamed ? (printer?.id ?? truePrinter) : unnamed}
          onChange={({ target }) => choose(target.value)}
        />
        {printer && printers && (
          <Forget printer={printer} printers={printers} onForgotten={() => choose(truePrinter)} />
        )}
        {chosen === unnamed && (
          <Measuring
            measured={measured}
            onChange={onChange}
            printers={printers}
            onKept={({ id }) => setChosen(id)}
          />
        )}
      </div>
    </details>
  )
}

function Measuring({
  measured,
  onChange,
  printers,
  onKept,
}: {
  readonly measured: Measured
  readonly onChange: (measured: Measured) => void
  readonly printers?: Printers
  readonly onKept: (printer: Printer) => void
}) {
  const [typed, setTyped] = useState({ short: inWords(measured.short), long: inWords(measured.long) })
  const [name, setName] = useState('')
  const [busy, setBusy] = useState(false)
  const [problem, setProblem] = useState<string>()
  const read = (text: string) => lengthBetween(text, correctable.least, correctable.most)
  const short = read(typed.short)
  const long = read(typed.long)

  function type(way: 'short' | 'long', text: string) {
    const next = { ...typed, [way]: text }
    setTyped(next)
    const [across, along] = [read(next.short).mm, read(next.long).mm]
    if (across !== undefined && along !== undefined) onChange({ short: across, long: along })
  }

  async function keep() {
    if (!printers) return
    setBusy(true)
    setProblem(undefined)
    try {
      onKept(await printers.keep(name, measured))
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The printer could not be kept. Try again.')
    }
    setBusy(false)
  }

  return (
    <>
      <p className="text-sm">
        Print the first sheet at 100 % and measure its 10 cm square along the middle of the lines, both ways.
      </p>
      <div className="grid grid-cols-2 gap-3">
        <Field
          label="Across"
          hint="the short way of the paper"
          value={typed.short}
          error={short.problem}
          onChange={({ target }) => type('short', target.value)}
        />
        <Field
          label="Down"
          hint="the long way of the paper"
          value={typed.long}
          error={long.problem}
          onChange={({ target }) => type('long', target.value)}
        />
      </div>
      <p className="text-sm text-walnut">
        Then print the first sheet again: now the square must be right. A square that is off by more than 5 mm
        was made to fit the page; look for “Actual size” first.
      </p>
      {printers && (
        <div className="grid gap-2">
          <Field
            label="Name of the printer"
            hint="To find it again next time."
            value={name}
            maxLength={60}
            onChange={({ target }) => setName(target.value)}
          />
          <Button
            busy={busy}
            disabled={name.trim() === '' || short.mm === undefined || long.mm === undefined}
            onClick={() => void keep()}
          >
            Remember this printer
          </Button>
          {problem && <ErrorNote>{problem}</ErrorNote>}
        </div>
      )}
    </>
  )
}

function Forget({
  printer,
  printers,
  onForgotten,
}: {
  readonly printer: Printer
  readonly printers: Printers
  readonly onForgotten: () => void
}) {
  const [problem, setProblem] = useState<string>()
  async function forget() {
    setProblem(undefined)
    try {
      await printers.forget(printer.id)
      onForgotten()
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The printer could not be forgotten. Try again.')
    }
  }
  return (
    <div className="grid gap-2">
      <Button look="quiet" className="justify-self-start" onClick={() => void forget()}>
        Forget this printer
      </Button>
      {problem && <ErrorNote>{problem}</ErrorNote>}
    </div>
  )
}
