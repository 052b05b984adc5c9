import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { checkout } from '../lib/checkout.mjs'
import { findFreePort } from '../lib/ports.mjs'
import { delay, hasEnded, startChild, stopChild } from '../lib/processes.mjs'
import { Trouble } from '../lib/say.mjs'

/** @typedef {{ origin: string, pid: number, stop: () => Promise<void> }} Server */

async function isUp(/** @type {string} */ url) {
  try {
    return (await fetch(url, { signal: AbortSignal.timeout(10_000) })).ok
  } catch {
    return false
  }
}

/**
 * @param {string} file
 * @param {Record<string, string>} env
 * @param {string} readyPath
 * @param {(stop: () => Promise<void>) => void} defer
 * @returns {Promise<Server>}
 */
async function startServer(file, env, readyPath, defer) {
  const port = await findFreePort()
  const origin = `http://127.0.0.1:${port}`
  const child = startChild(process.execPath, [file], {
    cwd: checkout,
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { NODE_ENV: 'production', LOG_LEVEL: 'warn', HOST: '127.0.0.1', PORT: String(port), ...env },
  })
  const stop = () => stopChild(child, 10_000)
  defer(stop)
  const deadline = Date.now() + 60_000
  while (!(await isUp(`${origin}${readyPath}`))) {
    if (hasEnded(child) || Date.now() > deadline) throw new Trouble(`${file} did not become ready.`)
    await delay(100)
  }
  return { origin, pid: child.pid ?? 0, stop }
}

/** The built server in production mode. It believes one proxy, so that each request can come from an address of its own. */
export const startBuiltServer = (
  /** @type {string} */ databaseUrl,
  /** @type {(stop: () => Promise<void>) => void} */ defer,
) =>
  startServer(join(checkout, 'dist/server/index.js'), { DATABASE_URL: databaseUrl, TRUST_PROXY: '1' }, '/ready', defer)

/** Express with one route, which answers every request with the bytes of a file. */
export const startBareServer = (
  /** @type {string} */ bodyFile,
  /** @type {(stop: () => Promise<void>) => void} */ defer,
) => startServer(join(checkout, 'scripts/bench/bare-server.mjs'), { BODY_FILE: bodyFile }, '/ready', defer)

/** Memory of a process that is not swapped out, MB, now and at its highest. */
export function readMemoryMb(/** @type {number} */ pid) {
  const status = readFileSync(`/proc/${pid}/status`, 'utf8')
  const read = (/** @type {string} */ key) => Number(new RegExp(`^${key}:\\s+(\\d+) kB`, 'm').exec(status)?.[1]) / 1024
  return { now: read('VmRSS'), highest: read('VmHWM') }
}
