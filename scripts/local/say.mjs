/** One line of progress for the person at the terminal. */
export function say(text) {
  process.stdout.write(`${text}\n`)
}

/** An error whose message is for the person at the terminal, printed without a stack. */
export class SetUpError extends Error {
  name = 'SetUpError'
}

/**
 * Runs a script's main function; a SetUpError ends it with its message, anything else with the stack.
 * @param {() => Promise<number | void>} main resolves to the exit code (0 when nothing is returned)
 */
export async function runMain(main) {
  try {
    process.exitCode = (await main()) ?? 0
  } catch (error) {
    process.stderr.write(`\n${error instanceof SetUpError ? error.message : (error?.stack ?? error)}\n`)
    process.exitCode = 1
  }
}
