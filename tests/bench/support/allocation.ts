import { Session } from 'node:inspector/promises'

interface Sampled {
  readonly selfSize: number
  readonly children: readonly Sampled[]
}

const sizeOf = ({ selfSize, children }: Sampled): number =>
  children.reduce((sum, child) => sum + sizeOf(child), selfSize)

/** Every so many bytes one is looked at. */
const samplingInterval = 4096

/**
 * What one call of a piece of work allocates, what is thrown away at once included: sampled by the heap profiler over many
 * calls, right to a few parts in a hundred.
 * @returns bytes
 */
export async function allocationOf(work: () => unknown, calls = 200): Promise<number> {
  for (let call = 0; call < 30; call += 1) work()
  const session = new Session()
  session.connect()
  try {
    await session.post('HeapProfiler.startSampling', {
      samplingInterval,
      includeObjectsCollectedByMajorGC: true,
      includeObjectsCollectedByMinorGC: true,
    })
    for (let call = 0; call < calls; call += 1) work()
    const { profile } = await session.post('HeapProfiler.stopSampling')
    return sizeOf(profile.head) / calls
  } finally {
    session.disconnect()
  }
}

/** '412 kB allocated' */
export async function allocationNote(work: () => unknown): Promise<string> {
  return `${Math.round((await allocationOf(work)) / 1000)} kB allocated`
}
