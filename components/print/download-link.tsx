'use client'

import { FileDown } from 'lucide-react'
import { useEffect, useRef, useState, type ReactNode } from 'react'
import { Button, buttonClass } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'

/** Fetches a file and saves it. While the server makes it, it says so and can be called off. */
export function DownloadLink({
  href,
  look,
  making,
  children,
}: {
  readonly href: string
  readonly look: 'primary' | 'plain'
  /** What is being made, in words: 'Making 42 sheets' */
  readonly making: string
  readonly children: ReactNode
}) {
  const [busy, setBusy] = useState(false)
  const [problem, setProblem] = useState<string>()
  const stop = useRef<AbortController>(undefined)
  useEffect(() => () => stop.current?.abort(), [])

  async function fetchFile() {
    const own = (stop.current = new AbortController())
    setBusy(true)
    setProblem(undefined)
    try {
      await save(await fetch(href, { signal: own.signal }))
    } catch (error) {
      if (!own.signal.aborted) setProblem(wordsOf(error))
    }
    setBusy(false)
  }

  return (
    <div className="grid gap-2">
      {busy ? (
        <div className="flex items-center justify-between gap-3">
          <p role="status" className="text-sm">
            {making} …
          </p>
          <Button look="plain" onClick={() => stop.current?.abort()}>
            Cancel
          </Button>
        </div>
      ) : (
        <a
          className={buttonClass(look)}
          href={href}
          download
          onClick={(event) => {
            event.preventDefault()
            void fetchFile()
          }}
        >
          <FileDown size={18} aria-hidden />
          {children}
        </a>
      )}
      {problem && <ErrorNote>{problem}</ErrorNote>}
    </div>
  )
}

function wordsOf(error: unknown): string {
  return error instanceof Refusal
    ? error.message
    : 'The file could not be fetched. Look whether there is a network, and try again.'
}

class Refusal extends Error {}

/** Hands the answer to the browser as a file under the name the server gave it. @throws Refusal with the server's words */
async function save(response: Response): Promise<void> {
  if (!response.ok) {
    const answer = (await response.json().catch(() => ({}))) as { problems?: { message: string }[] }
    throw new Refusal(answer.problems?.[0]?.message ?? 'The server could not make the file. Try again.')
  }
  const url = URL.createObjectURL(await response.blob())
  const link = document.createElement('a')
  link.href = url
  link.download = nameIn(response.headers.get('content-disposition') ?? '')
  link.click()
  // The browser has taken the file by then.
  setTimeout(() => URL.revokeObjectURL(url), 60_000)
}

function nameIn(disposition: string): string {
  const own = /filename\*=UTF-8''([^;]+)/.exec(disposition)?.[1]
  return own ? decodeURIComponent(own) : 'pattern'
}
