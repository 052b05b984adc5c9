import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { hasEnded, signalGroup, startChild, waitForExit } from '../lib/processes.mjs'
import { applyMutant } from './list-mutants.mjs'

/**
 * @typedef {import('./list-mutants.mjs').Mutant} Mutant
 * @typedef {'killed' | 'timed out' | 'survived' | 'not reached'} Fate
 */

/** So many tests are asked first: most faults are noticed next door, and the rest of the tests take minutes. */
const nearest = 4

/**
 * Runs some tests to the first that fails; null where they took too long.
 * @param {string} folder
 * @param {readonly string[]} tests
 * @param {number} seconds
 * @returns {Promise<number | null>} the exit code
 */
export async function runTests(folder, tests, seconds) {
  const vitest = join(folder, 'node_modules', 'vitest', 'vitest.mjs')
  const args = [vitest, 'run', '--project', 'unit', '--bail', '1', '--reporter', 'dot', ...tests]
  const child = startChild(process.execPath, args, { cwd: folder, stdio: 'ignore', whenParentDies: 'TERM' })
  let isLate = false
  const timer = setTimeout(() => {
    isLate = true
    signalGroup(child, 'SIGKILL')
  }, seconds * 1000)
  const code = await waitForExit(child)
  clearTimeout(timer)
  if (!hasEnded(child)) signalGroup(child, 'SIGKILL')
  return isLate ? null : code
}

/**
 * Puts one fault into the copy, runs the tests that reach it, nearest first, and takes it out again.
 * @param {string} folder
 * @param {Mutant} mutant
 * @param {readonly string[]} tests
 * @param {number} seconds
 * @returns {Promise<Fate>}
 */
export async function tryMutant(folder, mutant, tests, seconds) {
  if (tests.length === 0) return 'not reached'
  const path = join(folder, mutant.file)
  const text = readFileSync(path, 'utf8')
  writeFileSync(path, applyMutant(text, mutant))
  try {
    for (const some of [tests.slice(0, nearest), tests.slice(nearest)]) {
      if (some.length === 0) continue
      const code = await runTests(folder, some, seconds)
      if (code === null) return 'timed out'
      if (code !== 0) return 'killed'
    }
    return 'survived'
  } finally {
    writeFileSync(path, text)
  }
}
