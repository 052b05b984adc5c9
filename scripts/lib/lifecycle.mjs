import { stopSteps } from './processes.mjs'
import { complain, describeError } from './say.mjs'

/**
 * Runs `main`, and undoes what it deferred, last first, when it ends, fails or is told to stop.
 * `main` gives the exit code, or null to stay until a signal comes.
 * @typedef {object} Life
 * @property {(undo: () => unknown) => void} defer
 * @property {(code: number) => Promise<void>} end
 * @property {() => boolean} isEnding
 * @param {(life: Life) => Promise<number | null>} main
 * @param {{ onSignal?: () => number, onStopping?: () => void }} [options] `onSignal` gives the exit code; 0 by default
 */
export async function live(main, options = {}) {
  /** @type {(() => unknown)[]} */
  const undos = []
  let isEnding = false

  const end = async (/** @type {number} */ code) => {
    if (isEnding) return
    isEnding = true
    let exitCode = code
    await stopSteps()
    for (const undo of undos.reverse()) {
      try {
        await undo()
      } catch (error) {
        complain(describeError(error))
        exitCode ||= 1
      }
    }
    process.exit(exitCode)
  }

  // npm passes on a signal that the terminal has already sent to all: the second one must not cut the first one short.
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      if (isEnding) return
      options.onStopping?.()
      void end(options.onSignal?.() ?? 0)
    })
  }
  watchNpm(() => void end(0))

  try {
    const code = await main({ defer: (undo) => undos.push(undo), end, isEnding: () => isEnding })
    if (code !== null) await end(code)
  } catch (error) {
    if (isEnding) return
    complain(describeError(error))
    await end(1)
  }
}

/** npm killed outright passes nothing on: its child is then given to another parent. */
function watchNpm(/** @type {() => void} */ onGone) {
  if (process.env.npm_lifecycle_event === undefined) return
  const parent = process.ppid
  setInterval(() => {
    if (process.ppid !== parent) onGone()
  }, 500).unref()
}
