import { Trouble } from '../lib/say.mjs'

export const measureNames = /** @type {const} */ ([
  'fit',
  'heaters',
  'items',
  'replacements',
  'search',
  'memory',
  'javascript',
  'engine',
])

/** @typedef {typeof measureNames[number]} MeasureName */
/** @typedef {{ sizes: readonly number[], seconds: number, only: ReadonlySet<MeasureName> }} Options */

const usage = `Usage: npm run bench -- [--sizes 1000,10000,100000] [--seconds 8] [--only ${measureNames.join(',')}]`

/** @returns {Options} */
export function readOptions(/** @type {readonly string[]} */ args) {
  const given = new Map([
    ['--sizes', '1000,10000,100000'],
    ['--seconds', '8'],
    ['--only', measureNames.join(',')],
  ])
  for (let at = 0; at < args.length; at += 2) {
    const [name = '', value] = args.slice(at)
    if (!given.has(name) || value === undefined) throw new Trouble(usage)
    given.set(name, value)
  }
  const list = (/** @type {string} */ name) => (given.get(name) ?? '').split(',')
  const sizes = list('--sizes').map(Number)
  const seconds = Number(given.get('--seconds'))
  const only = measureNames.filter((name) => list('--only').includes(name))
  const isRight = sizes.every((size) => Number.isInteger(size) && size >= 100) && seconds > 0 && only.length > 0
  if (!isRight || only.length < list('--only').length) throw new Trouble(usage)
  return { sizes: sizes.sort((a, b) => a - b), seconds, only: new Set(only) }
}
