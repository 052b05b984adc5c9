import { connect, createServer } from 'node:net'
import { checkoutKey } from './checkout.mjs'
import { delay } from './processes.mjs'
import { Trouble } from './say.mjs'

// Linux's abstract sockets: taking one is atomic, and the kernel frees it with its holder, however that ends.
const address = (/** @type {string} */ name) => `\0stillfits-${checkoutKey}-${name}`

/**
 * Takes a lock of this checkout, or gives null when another process holds it.
 * @param {string} name
 * @returns {Promise<{ tell: (text: string) => void, release: () => Promise<void> } | null>}
 */
export function takeLock(name) {
  let told = ''
  const server = createServer((socket) => {
    socket.on('error', () => undefined)
    socket.end(told)
  })
  return new Promise((resolve, reject) => {
    server.once('error', (error) => {
      if (/** @type {NodeJS.ErrnoException} */ (error).code === 'EADDRINUSE') resolve(null)
      else reject(error)
    })
    server.listen(address(name), () => {
      server.unref()
      resolve({
        tell: (text) => (told = text),
        release: () => new Promise((done) => server.close(() => done(undefined))),
      })
    })
  })
}

/** What the holder of a lock tells of itself; empty when it tells nothing. */
export function askHolder(/** @type {string} */ name) {
  return /** @type {Promise<string>} */ (
    new Promise((resolve) => {
      let text = ''
      const socket = connect(address(name))
      socket.setTimeout(2_000, () => socket.destroy())
      socket.on('data', (chunk) => (text += String(chunk)))
      socket.on('error', () => undefined)
      socket.on('close', () => resolve(text))
    })
  )
}

/**
 * Does `work` while holding a lock, after waiting for whoever holds it.
 * @template T
 * @param {string} name
 * @param {() => Promise<T>} work
 * @param {{ onWait?: () => void, waitMs?: number }} [options]
 */
export async function withLock(name, work, { onWait, waitMs = 600_000 } = {}) {
  const deadline = Date.now() + waitMs
  let lock = await takeLock(name)
  if (!lock) onWait?.()
  while (!lock) {
    if (Date.now() > deadline) throw new Trouble(`Waited too long for another Stillfits process (${name}).`)
    await delay(200)
    lock = await takeLock(name)
  }
  try {
    return await work()
  } finally {
    await lock.release()
  }
}
