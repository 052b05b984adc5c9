import { createServer } from 'node:net'
import { Trouble } from './say.mjs'

/** @returns {Promise<number>} a port that nobody listens on */
export function findFreePort(host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const server = createServer()
    server.once('error', reject)
    server.listen(0, host, () => {
      const address = server.address()
      server.close(() => resolve(typeof address === 'object' && address ? address.port : 0))
    })
  })
}

/** Says early, and in one line, why the server could not listen. */
export function requirePort(/** @type {number} */ port, /** @type {string} */ host) {
  return /** @type {Promise<void>} */ (
    new Promise((resolve, reject) => {
      const server = createServer()
      server.once('error', (/** @type {NodeJS.ErrnoException} */ error) =>
        reject(new Trouble(explain(error, port, host))),
      )
      server.listen(port, host, () => server.close(() => resolve()))
    })
  )
}

function explain(/** @type {NodeJS.ErrnoException} */ error, /** @type {number} */ port, /** @type {string} */ host) {
  if (error.code === 'EADDRINUSE') {
    return `Port ${port} on ${host} is taken by another program. Stop it, or choose another port: PORT=4100 npm start`
  }
  if (error.code === 'EACCES') return `Port ${port} needs more rights than this user has. Choose one above 1023.`
  return `Stillfits cannot listen on ${host}, port ${port}: ${error.message}`
}

/** PORT and HOST as the person gave them, checked before any long work. */
export async function readAddress(env = process.env) {
  const host = env.HOST || '127.0.0.1'
  const text = env.PORT || '4000'
  const port = /^\d{1,5}$/.test(text) ? Number(text) : NaN
  if (!(port <= 65535)) throw new Trouble(`PORT must be a number from 0 to 65535, not "${text}".`)
  return { host, port: port === 0 ? await findFreePort(host) : port }
}

/** Where a browser on this machine finds a server that listens on `host`. */
export function formatOrigin(/** @type {string} */ host, /** @type {number} */ port) {
  const reachable = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '::1' : host
  return `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${port}`
}
