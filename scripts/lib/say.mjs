/** A person reads these lines: what is being done now, or what went wrong and what to do about it. */
export function say(/** @type {string} */ text) {
  process.stdout.write(`${text}\n`)
}

export function complain(/** @type {string} */ text) {
  process.stderr.write(`${text}\n`)
}

/** An error whose message says all there is to say: it is shown without a stack. */
export class Trouble extends Error {
  /** @override */
  name = 'Trouble'
}

export function describeError(/** @type {unknown} */ error) {
  if (error instanceof Trouble) return error.message
  return error instanceof Error ? (error.stack ?? error.message) : String(error)
}

export function formatSeconds(/** @type {number} */ startedMs) {
  return `${((Date.now() - startedMs) / 1000).toFixed(1)} s`
}
