import { askHolder, takeLock } from './lock.mjs'
import { Trouble } from './say.mjs'

/** Only one process of a checkout may run its database; a second one is told where the first one is. */
export async function takeRunLock() {
  const lock = await takeLock('run')
  if (lock) return lock
  const origin = await askHolder('run')
  throw new Trouble(
    origin
      ? `Stillfits is already running in this folder, at ${origin}`
      : 'Stillfits is already starting or stopping in this folder. Wait for it, or stop it first.',
  )
}
