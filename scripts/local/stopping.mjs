/**
 * What was started is stopped in the opposite order, once, whatever ends the script: its end, an error, Ctrl-C,
 * a closed terminal or a plain kill. A second Ctrl-C does not wait any longer.
 */
export function createStopping() {
  const steps = []
  let stopped

  /** @param {() => unknown} step called once; may return a promise */
  function onStop(step) {
    steps.push(step)
  }

  function stop() {
    stopped ??= (async () => {
      for (const step of steps.reverse()) {
        try {
          await step()
        } catch (error) {
          process.stderr.write(`while stopping: ${error?.message ?? error}\n`)
        }
      }
    })()
    return stopped
  }

  for (const [signal, code] of [
    ['SIGINT', 130],
    ['SIGTERM', 143],
    ['SIGHUP', 129],
  ]) {
    process.on(signal, () => {
      // npm and the terminal may both deliver the same Ctrl-C: only one well after the first is impatience.
      if (stopped && Date.now() - firstSignal > 1500) process.exit(code)
      firstSignal ||= Date.now()
      void stop().then(() => process.exit(signal === 'SIGINT' ? 0 : code))
    })
  }
  let firstSignal = 0

  return {
    onStop,
    stop,
    get stopping() {
      return stopped !== undefined
    },
  }
}
