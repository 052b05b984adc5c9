import { spawn, spawnSync } from 'node:child_process'
import { Trouble } from './say.mjs'

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */
/**
 * @typedef {object} SpawnOptions
 * @property {Record<string, string | undefined>} [env] added to this process's own
 * @property {string} [cwd]
 * @property {import('node:child_process').StdioOptions} [stdio]
 * @property {'TERM' | 'INT'} [whenParentDies] the signal that the kernel sends when this process is gone
 * @property {{ uid: number, gid: number } | null} [as]
 */

/** @type {Set<ChildProcess>} */
const steps = new Set()
let isStopping = false

/**
 * Starts a child in a group of its own: a Ctrl-C in the terminal then reaches only the script, which stops things in
 * order. The kernel signals the child when the script is killed outright, so nothing outlives it.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {SpawnOptions} [options]
 */
export function startChild(command, args, options = {}) {
  if (isStopping) throw new Trouble('Stopped.')
  const { as } = options
  const identity = as ? [`--reuid=${as.uid}`, `--regid=${as.gid}`, '--clear-groups'] : []
  const guard = [...identity, `--pdeathsig=${options.whenParentDies ?? 'TERM'}`, '--', command, ...args]
  return spawn('setpriv', guard, {
    cwd: options.cwd,
    env: { ...process.env, ...options.env },
    stdio: options.stdio ?? 'inherit',
    detached: true,
  })
}

export function signalGroup(/** @type {ChildProcess} */ child, /** @type {NodeJS.Signals} */ signal) {
  if (child.pid === undefined || hasEnded(child)) return
  try {
    process.kill(-child.pid, signal)
  } catch {
    // It ended between the check and the signal.
  }
}

export function hasEnded(/** @type {ChildProcess} */ child) {
  return child.exitCode !== null || child.signalCode !== null
}

/** @returns {Promise<number>} the exit code; 128 and more when a signal ended it */
export function waitForExit(/** @type {ChildProcess} */ child) {
  return new Promise((resolve, reject) => {
    if (hasEnded(child)) return resolve(child.exitCode ?? 128)
    child.once('error', reject)
    child.once('exit', (code) => resolve(code ?? 128))
  })
}

/** Asks a child to end, and ends it when it has not done so in time. */
export async function stopChild(/** @type {ChildProcess} */ child, /** @type {number} */ deadlineMs) {
  if (hasEnded(child)) return
  signalGroup(child, 'SIGTERM')
  const timer = setTimeout(() => signalGroup(child, 'SIGKILL'), deadlineMs)
  await waitForExit(child)
  clearTimeout(timer)
}

/**
 * Runs one step to its end and gives its exit code; `stopSteps` cuts it short.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {SpawnOptions} [options]
 */
export async function runStep(command, args, options = {}) {
  const child = startChild(command, args, { stdio: ['ignore', 'inherit', 'inherit'], ...options })
  steps.add(child)
  try {
    return await waitForExit(child)
  } finally {
    steps.delete(child)
  }
}

/**
 * Like `runStep`, with the output kept back: shown only when the step fails.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {SpawnOptions & { input?: string }} [options]
 */
export async function runQuietly(command, args, options = {}) {
  const child = startChild(command, args, { ...options, stdio: ['pipe', 'pipe', 'pipe'] })
  steps.add(child)
  // A command that ends without reading its input is judged by its exit code alone.
  child.stdin?.on('error', () => undefined)
  child.stdin?.end(options.input ?? '')
  let output = ''
  child.stdout?.on('data', (chunk) => (output += String(chunk)))
  child.stderr?.on('data', (chunk) => (output += String(chunk)))
  try {
    const closed = new Promise((resolve) => child.once('close', resolve))
    const code = await waitForExit(child)
    await closed
    return { code, output: output.trim() }
  } finally {
    steps.delete(child)
  }
}

/** Ends the steps that run; none can start afterwards. */
export async function stopSteps() {
  isStopping = true
  await Promise.all([...steps].map((child) => stopChild(child, 5_000)))
}

/** A short command's output, or null when it fails or is not there. */
export function readOutput(/** @type {string} */ command, /** @type {string[]} */ ...args) {
  const result = spawnSync(command, args, { encoding: 'utf8' })
  return result.status === 0 ? result.stdout.trim() : null
}

export function isAlive(/** @type {number} */ pid) {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM'
  }
}

export function requireSetpriv() {
  if (readOutput('setpriv', '--version') === null) {
    throw new Trouble('Stillfits needs setpriv (Debian package util-linux) to start and stop its processes.')
  }
}

export const delay = (/** @type {number} */ ms) => new Promise((resolve) => setTimeout(resolve, ms))
