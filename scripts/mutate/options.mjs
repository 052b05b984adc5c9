import { cpus } from 'node:os'
import { Trouble } from '../lib/say.mjs'

/**
 * @typedef {object} Options
 * @property {number} sample how many mutants are tried
 * @property {number} seed which ones
 * @property {number} seconds at most for one run of tests
 * @property {number} jobs at once
 * @property {string} files the start of the paths that are mutated
 * @property {string} tests the start of the paths of the tests that are run
 */

const usage =
  'Usage: npm run mutate -- [--sample 400] [--seed 1] [--seconds 120] [--jobs 2] [--files shared/engine] [--tests tests]'

/** @returns {Options} */
export function readOptions(/** @type {readonly string[]} */ args) {
  const given = new Map([
    ['--sample', '400'],
    ['--seed', '1'],
    ['--seconds', '120'],
    ['--jobs', String(Math.max(1, Math.floor(cpus().length / 2)))],
    ['--files', 'shared/engine'],
    ['--tests', 'tests'],
  ])
  for (let at = 0; at < args.length; at += 2) {
    const [name = '', value] = args.slice(at)
    if (!given.has(name) || value === undefined) throw new Trouble(usage)
    given.set(name, value)
  }
  const count = (/** @type {string} */ name) => {
    const value = Number(given.get(name))
    if (!Number.isInteger(value) || value < 1) throw new Trouble(usage)
    return value
  }
  const files = given.get('--files') ?? ''
  if (!files.startsWith('shared/engine')) throw new Trouble(`Only the engine is mutated. ${usage}`)
  return {
    sample: count('--sample'),
    seed: count('--seed'),
    seconds: count('--seconds'),
    jobs: count('--jobs'),
    files,
    tests: given.get('--tests') ?? '',
  }
}
