import { cpSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { breaches, type MeasuringEngine } from './judges'
import { mutants, type Mutant } from './mutants'

export interface Verdict {
  readonly mutant: Mutant
  /** What the law said of it; undefined when it went unnoticed. */
  readonly caught?: string
}

async function load(folder: string): Promise<MeasuringEngine> {
  return (await import(pathToFileURL(join(folder, 'index.ts')).href)) as MeasuringEngine
}

/** Mutants whose place in the engine is not there any more, or there more than once. */
export function outOfDate(root: string): string[] {
  return mutants.flatMap(({ file, find, name }) => {
    const places = readFileSync(join(root, 'drafting', file), 'utf8').split(find).length - 1
    return places === 1 ? [] : [`“${name}”: its place stands ${places} times in drafting/${file}`]
  })
}

/** A copy of the engine with one fault in it. */
function broken(root: string, folder: string, { file, find, put }: Mutant): void {
  cpSync(join(root, 'drafting'), folder, { recursive: true })
  const path = join(folder, file)
  writeFileSync(
    path,
    readFileSync(path, 'utf8').replace(find, () => put),
  )
}

/** What the law that a mutant names has to say of it. */
function noticed(law: number, engine: MeasuringEngine): string | undefined {
  try {
    const [first] = breaches(law, engine)
    return first && `${first.where}: ${first.message}`
  } catch (error) {
    // A broken engine may throw what no engine should: that is noticed too.
    return `it throws ${String(error)}`
  }
}

/**
 * Breaks the engine in every way listed, one at a time, in copies below `scratch`, and asks the law concerned.
 * @param share this process's part of the work: which of how many
 * @throws when the engine as it is breaks a law already, or a mutant is out of date
 */
export async function mutate(
  root: string,
  scratch: string,
  share: { which: number; of: number },
): Promise<Verdict[]> {
  const stale = outOfDate(root)
  if (stale.length > 0) throw new Error(`Out of date: ${stale.join('; ')}.`)
  const mine = mutants.filter((_, index) => index % share.of === share.which)
  const sound = await load(join(root, 'drafting'))
  for (const law of new Set(mine.map((mutant) => mutant.law))) {
    const [first] = breaches(law, sound)
    if (first) throw new Error(`The engine breaks law ${law} as it is. ${first.where}: ${first.message}`)
  }
  rmSync(scratch, { recursive: true, force: true })
  mkdirSync(scratch, { recursive: true })
  const verdicts: Verdict[] = []
  for (const [index, mutant] of mine.entries()) {
    const folder = join(scratch, String(index), 'drafting')
    broken(root, folder, mutant)
    const caught = noticed(mutant.law, await load(folder))
    verdicts.push({ mutant, ...(caught === undefined ? {} : { caught }) })
  }
  rmSync(scratch, { recursive: true, force: true })
  return verdicts
}
