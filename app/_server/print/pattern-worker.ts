import { parentPort } from 'node:worker_threads'
import { patternPdf } from './pattern-pdf'
import type { PatternRequest } from './pattern-pdf'

/** What is asked for, or that nobody waits for it any more. */
export type PatternMessage =
  { readonly id: number; readonly request: PatternRequest } | { readonly stop: number }
/** What comes back under the same number. */
export type PatternResult =
  { readonly id: number; readonly bytes: Uint8Array } | { readonly id: number; readonly problem: string }

const stops = new Map<number, AbortController>()

/** The thread that makes paper patterns, so that the requests of others go on meanwhile. */
parentPort?.on('message', (message: PatternMessage) => {
  if ('stop' in message) stops.get(message.stop)?.abort()
  else void answer(message.id, message.request)
})

async function answer(id: number, request: PatternRequest): Promise<void> {
  const stop = new AbortController()
  stops.set(id, stop)
  try {
    const bytes = await patternPdf(request, stop.signal)
    send({ id, bytes })
  } catch (error) {
    send({ id, problem: error instanceof Error ? (error.stack ?? error.message) : String(error) })
  } finally {
    stops.delete(id)
  }
}

function send(result: PatternResult): void {
  parentPort?.postMessage(result)
}
