import { parentPort } from 'node:worker_threads'
import { patternPdf } from './pattern-pdf'
import type { PatternRequest } from './pattern-pdf'

/** What the pool sends, and what comes back under the same number. */
export interface PatternTask {
  readonly id: number
  readonly request: PatternRequest
}
export type PatternResult =
  { readonly id: number; readonly bytes: Uint8Array } | { readonly id: number; readonly problem: string }

/** The thread that makes paper patterns, one after the other, so that the requests of others go on meanwhile. */
parentPort?.on('message', (task: PatternTask) => {
  void answer(task)
})

async function answer({ id, request }: PatternTask): Promise<void> {
  try {
    const bytes = await patternPdf(request)
    send({ id, bytes })
  } catch (error) {
    send({ id, problem: error instanceof Error ? (error.stack ?? error.message) : String(error) })
  }
}

function send(result: PatternResult): void {
  parentPort?.postMessage(result)
}
