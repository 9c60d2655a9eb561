import 'server-only'
import { Worker } from 'node:worker_threads'
import type { PatternRequest } from './pattern-pdf'
import type { PatternMessage, PatternResult } from './pattern-worker'

interface Waiting {
  readonly resolve: (bytes: Uint8Array) => void
  readonly reject: (error: Error) => void
}

const waiting = new Map<number, Waiting>()
let thread: Worker | null = null
let count = 0

/**
 * Makes a paper pattern in a thread of its own; see patternPdf. One thread serves the whole process and is started with the first
 * pattern; when it dies, whoever waits is told and the next pattern starts another.
 *
 * @param signal stops the work between two pages; the promise is then rejected with its reason
 */
export function patternInThread(request: PatternRequest, signal?: AbortSignal): Promise<Uint8Array> {
  signal?.throwIfAborted()
  const worker = (thread ??= start())
  const id = (count += 1)
  return new Promise((resolve, reject) => {
    const stop = () => {
      waiting.delete(id)
      send(worker, { stop: id })
      reject(signal?.reason instanceof Error ? signal.reason : new Error('Nobody waits for the pattern.'))
    }
    const ended =
      <T>(then: (value: T) => void) =>
      (value: T) => {
        signal?.removeEventListener('abort', stop)
        then(value)
      }
    waiting.set(id, { resolve: ended(resolve), reject: ended(reject) })
    signal?.addEventListener('abort', stop, { once: true })
    send(worker, { id, request })
  })
}

function send(worker: Worker, message: PatternMessage): void {
  worker.postMessage(message)
}

function start(): Worker {
  const worker = new Worker(new URL('./pattern-worker.ts', import.meta.url))
  // It must not keep a process alive that has nothing else to do.
  worker.unref()
  worker.on('message', (result: PatternResult) => {
    const task = waiting.get(result.id)
    waiting.delete(result.id)
    if ('bytes' in result) task?.resolve(result.bytes)
    else task?.reject(new Error(result.problem))
  })
  worker.on('error', (error) => fail(worker, error instanceof Error ? error : new Error(String(error))))
  worker.on('exit', () => fail(worker, new Error('The thread that makes paper patterns ended.')))
  return worker
}

function fail(worker: Worker, error: Error): void {
  if (thread !== worker) return
  thread = null
  for (const task of waiting.values()) task.reject(error)
  waiting.clear()
}
