import * as z from 'zod'

/** Words that most lists of leaked passwords begin with; what is left of a password after its digits and marks. */
const commonWords = new Set(
  `password passwort passwd pass qwerty qwertyuiop qwertz azerty asdfgh asdfghjkl zxcvbn zxcvbnm letmein welcome admin
  administrator login iloveyou ilove love loveyou lovely princess sunshine monkey dragon football baseball basketball
  soccer hockey superman batman spiderman starwars pokemon michael jennifer jessica ashley daniel charlie jordan thomas
  andrew joshua matthew anthony robert george nicole hannah amanda samantha summer winter spring autumn january february
  march april june july august september october november december monday tuesday wednesday thursday friday saturday
  sunday chocolate cookie flower butterfly angel angels babygirl blessed blessing jesus christ jesuschrist godisgood
  secret mysecret master shadow trustno computer internet changeme default guest test testing tester example hello
  helloworld whatever nothing freedom forever family mother father mylove mypassword yourpassword thepassword newpassword
  qazwsx qazwsxedc abcdef abcdefg abcdefgh abcdefghij abcd abc google facebook instagram liverpool chelsea arsenal
  manchester barcelona realmadrid nigeria lagos london america canada germany australia chalkfold dressmaker dressmaking
  sewing fashion tailor`.split(/\s+/),
)

const runs = [
  '01234567890',
  '09876543210',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiopasdfghjklzxcvbnm',
  'azertyuiop',
]
const leet: Readonly<Record<string, string>> = {
  '@': 'a',
  '0': 'o',
  '1': 'i',
  '3': 'e',
  $: 's',
  '5': 's',
  '7': 't',
}

/** The letters that signs and digits stand for. */
const unmasked = (text: string) => text.replace(/[@01357$]/g, (sign) => leet[sign] ?? sign)
const wordOf = (text: string) => text.replace(/^\P{L}+|\P{L}+$/gu, '')

/** One of the guesses that are tried first: a common word with digits around it, a run of keys, a repetition. */
export function isCommonPassword(password: string): boolean {
  const text = password.toLowerCase()
  const inside = wordOf(text)
  const words = [inside, unmasked(inside), unmasked(text)].flatMap((word) => [
    wordOf(word),
    word.replace(/\P{L}+/gu, ''),
  ])
  if (words.some((word) => commonWords.has(word)) || (inside === '' && text.length < 16)) return true
  if (/^(.{1,5})\1+.{0,4}$/.test(text)) return true
  return runs.some((run) => run.includes(text) || [...run].reverse().join('').includes(text))
}

/** A new password: long enough and not one of the first guesses; anything else goes, pasted or typed. */
export const newPasswordShape = z
  .string('Choose a password.')
  .min(10, 'At least 10 characters: three or four words are easy to remember.')
  .max(200, 'At most 200 characters.')
  .refine(
    (password) => !isCommonPassword(password),
    'This password is one of the first that are guessed. Choose another.',
  )
