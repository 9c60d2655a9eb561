import { join } from 'node:path'
import { mutate } from './run'

/** One process's part of the mutants: `part.ts <root> <which> <of>`; prints the verdicts as JSON. */
const [root = '.', which = '0', of = '1'] = process.argv.slice(2)
const scratch = join(root, '.data', 'mutation', which)
const verdicts = await mutate(root, scratch, { which: Number(which), of: Number(of) })
process.stdout.write(JSON.stringify(verdicts))
