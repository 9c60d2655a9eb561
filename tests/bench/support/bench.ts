import { performance } from 'node:perf_hooks'

/** What a measurement is held against. */
export interface BenchOptions {
  /** Median that we aim for, in milliseconds. */
  readonly aim?: number
  /** 95th percentile that we aim for, in milliseconds. */
  readonly aim95?: number
  /** Name of an earlier measurement in the same file; the table shows how many times as fast this one is. */
  readonly against?: string
  /** A few words for the table: how large the error was, how many points came out. */
  readonly note?: string
  /** How long to measure, in seconds; default 1. */
  readonly seconds?: number
}

/** Durations of one call, in milliseconds. */
export interface Timing {
  readonly median: number
  readonly p95: number
}

/** A clock tick must not be a large part of a sample: quick work is repeated until a sample takes this long (ms). */
const shortestSample = 0.2
const warmUp = 300
const fewestSamples = 30

/** Results land here, so that the compiler cannot leave out work whose result nobody reads. */
let sink: unknown

/**
 * Times a piece of work and hands the result to `npm run bench`.
 * @param name what is done, and on what: "offset, sleeve outline"
 * @param work one call; may be asynchronous
 */
export async function bench(name: string, work: () => unknown, options: BenchOptions = {}): Promise<Timing> {
  const asynchronous = (sink = work()) instanceof Promise
  if (asynchronous) await sink
  const run = asynchronous ? sampleAsync(work) : sampleSync(work, await repeats(work))
  const samples: number[] = []
  const end = performance.now() + (options.seconds ?? 1) * 1000
  while (performance.now() < end || samples.length < fewestSamples) samples.push(await run())
  const timing = timingOf(samples)
  report(name, timing, options)
  return timing
}

/**
 * Hands on durations that were measured elsewhere, such as answers of a server under load.
 * @param name what was done
 * @param durations of single calls, in milliseconds; at least one
 */
export function report(
  name: string,
  durations: Timing | readonly number[],
  options: BenchOptions = {},
): void {
  const timing = 'median' in durations ? durations : timingOf(durations)
  process.stdout.write(`BENCH ${JSON.stringify({ name, ...timing, ...options })}\n`)
}

/** Median and 95th percentile of durations in milliseconds. */
export function timingOf(durations: readonly number[]): Timing {
  const sorted = [...durations].sort((a, b) => a - b)
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN
  return { median: at(0.5), p95: at(0.95) }
}

/** How many calls make one sample, found while the compiler warms up. */
async function repeats(work: () => unknown): Promise<number> {
  let count = 1
  const end = performance.now() + warmUp
  while (performance.now() < end) {
    const each = await sampleSync(work, count)()
    if (each * count < shortestSample)
      count = Math.max(count + 1, Math.ceil(shortestSample / Math.max(each, 1e-6)))
  }
  return count
}

function sampleSync(work: () => unknown, count: number): () => Promise<number> {
  return async () => {
    const start = performance.now()
    for (let call = 0; call < count; call++) sink = work()
    return (performance.now() - start) / count
  }
}

function sampleAsync(work: () => unknown): () => Promise<number> {
  return async () => {
    const start = performance.now()
    sink = await work()
    return performance.now() - start
  }
}
