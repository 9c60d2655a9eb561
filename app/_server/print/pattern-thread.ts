import 'server-only'
import { Worker } from 'node:worker_threads'
import type { PatternRequest } from './pattern-pdf'
import type { PatternResult, PatternTask } from './pattern-worker'

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
 */
export function patternInThread(request: PatternRequest): Promise<Uint8Array> {
  const worker = (thread ??= start())
  const task: PatternTask = { id: (count += 1), request }
  return new Promise((resolve, reject) => {
    waiting.set(task.id, { resolve, reject })
    worker.postMessage(task)
  })
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
