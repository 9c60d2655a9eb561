import { randomBytes, randomInt } from 'node:crypto'

/** A secret of 256 bits, in letters that pass through URLs, shells and settings files unchanged. */
export function newSecret() {
  return randomBytes(32).toString('base64url')
}

/** What the key of a local payment service begins with: no real one does. */
export const localKeyPrefix = 'sk_test_local_'

const words = [
  'chalk',
  'linen',
  'indigo',
  'madder',
  'weld',
  'walnut',
  'fern',
  'thimble',
  'selvedge',
  'gusset',
]

/** A password for the demo sign-ins that a person can type: two words and six figures. */
export function newDemoPassword() {
  const word = () => words[randomInt(words.length)]
  return `${word()}-${word()}-${String(randomInt(1_000_000)).padStart(6, '0')}`
}
