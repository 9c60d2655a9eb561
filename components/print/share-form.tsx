'use client'

import { Copy } from 'lucide-react'
import { useId, useState } from 'react'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { ErrorNote, Note } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { dayAhead, dayInWords, scopeNames, scopeWords } from './share-words'
import type { ShareScope } from './share-words'

export interface NewShare {
  readonly scope: ShareScope
  /** YYYY-MM-DD */
  readonly expiresOn: string
}

const spans = [
  { value: '7', label: 'A week' },
  { value: '30', label: 'A month' },
  { value: '91', label: 'Three months' },
  { value: '364', label: 'A year' },
]

/** Makes a link: what it shows, how long it works, and for a lesson the word that sums may be shown. */
export function ShareForm({ onCreate }: { readonly onCreate: (share: NewShare) => Promise<string> }) {
  const [scope, setScope] = useState<ShareScope>('drawing')
  const [agreed, setAgreed] = useState(false)
  const [days, setDays] = useState('30')
  const [busy, setBusy] = useState(false)
  const [problem, setProblem] = useState<string>()
  const [made, setMade] = useState<{ url: string; until: string }>()
  const lacking = scope === 'lesson' && !agreed

  async function make() {
    setBusy(true)
    setProblem(undefined)
    const expiresOn = dayAhead(Number(days))
    try {
      setMade({ url: await onCreate({ scope, expiresOn }), until: expiresOn })
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The link could not be made. Try again.')
    }
    setBusy(false)
  }

  return (
    <section className="grid gap-4">
      <fieldset className="grid gap-2">
        <legend className="mb-1 text-sm font-semibold">What the link shows</legend>
        <ScopeChoice scope="drawing" chosen={scope} onChoose={setScope} />
        <ScopeChoice scope="lesson" chosen={scope} onChoose={setScope} />
      </fieldset>
      {scope === 'lesson' && (
        <Note kind="caution">
          <p className="mb-1">Sums show the body: from them anyone can work out the measurements.</p>
          <Checkbox
            label="The person measured agrees, or the measurements are nobody’s."
            checked={agreed}
            onChange={({ target }) => setAgreed(target.checked)}
          />
        </Note>
      )}
      <Select
        label="It works for"
        choices={spans}
        value={days}
        onChange={({ target }) => setDays(target.value)}
        hint={`Until the end of ${dayInWords(dayAhead(Number(days)))}.`}
      />
      {problem && <ErrorNote>{problem}</ErrorNote>}
      <Button
        look="primary"
        busy={busy}
        disabled={lacking}
        onClick={() => void make()}
        className="justify-self-start"
      >
        Make the link
      </Button>
      {made && <NewLink key={made.url} {...made} />}
    </section>
  )
}

function ScopeChoice({
  scope,
  chosen,
  onChoose,
}: {
  readonly scope: ShareScope
  readonly chosen: ShareScope
  readonly onChoose: (scope: ShareScope) => void
}) {
  const words = useId()
  return (
    <label className="flex items-start gap-3 border hairline bg-sheet p-3 has-checked:border-indigo">
      <input
        type="radio"
        name="scope"
        value={scope}
        checked={scope === chosen}
        onChange={() => onChoose(scope)}
        aria-describedby={words}
        className="mt-0.5 size-5 shrink-0 accent-indigo"
      />
      <span>
        <span className="block font-semibold">{scopeNames[scope]}</span>
        <span id={words} className="block text-sm text-walnut">
          {scopeWords[scope]}
        </span>
      </span>
    </label>
  )
}

function NewLink({ url, until }: { readonly url: string; readonly until: string }) {
  const [copied, setCopied] = useState(false)

  async function copy() {
    await navigator.clipboard.writeText(url)
    setCopied(true)
  }

  return (
    <div className="grid gap-2 border border-fern bg-sheet p-4">
      <Field
        label="The link"
        readOnly
        value={url}
        onFocus={({ target }) => target.select()}
        hint={`Copy it now: it is shown here once. It works until the end of ${dayInWords(until)}.`}
      />
      <div className="flex items-center gap-3">
        <Button onClick={() => void copy()}>
          <Copy size={18} aria-hidden />
          Copy the link
        </Button>
        <span role="status" className="text-sm text-fern">
          {copied ? 'Copied.' : ''}
        </span>
      </div>
    </div>
  )
}
