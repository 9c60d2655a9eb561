import { join } from 'node:path'
import { takeLock } from '../local/lock.mjs'
import { dataFolder } from '../local/paths.mjs'

/**
 * A data folder for this run alone: `.data/test`, or when another run is using that, `.data/test-2` and so on. Its
 * database server is made once and used again by later runs; the database inside is thrown away.
 * @returns {{ folder: string, release: () => void }}
 */
export function takeSlot() {
  for (let number = 1; ; number++) {
    const folder = join(dataFolder, number === 1 ? 'test' : `test-${number}`)
    const lock = takeLock(join(folder, 'run.lock'))
    if (lock.release) return { folder, release: lock.release }
  }
}
