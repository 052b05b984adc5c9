import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { cpus, loadavg, tmpdir } from 'node:os'
import { join } from 'node:path'
import { checkout, dataFolder } from '../lib/checkout.mjs'
import { runQuietly } from '../lib/processes.mjs'
import { say, Trouble } from '../lib/say.mjs'
import { createCatalogue, startBenchCluster } from './cluster.mjs'
import { measureFirstVisit } from './measure-javascript.mjs'
import { measureFit, measureReplacements, measureSearch } from './measure-http.mjs'
import { readOptions } from './options.mjs'
import { askForHeater, askForHeaterAmongItems } from './questions.mjs'
import { readMemoryMb, startBuiltServer } from './servers.mjs'
import { drawTable } from './table.mjs'

/**
 * @typedef {import('../lib/lifecycle.mjs').Life} Life
 * @typedef {import('./table.mjs').Row} Row
 * @typedef {import('./cluster.mjs').Cluster} Cluster
 * @typedef {import('./options.mjs').Options} Options
 * @typedef {{ options: Options, cluster: Cluster, folder: string, defer: Life['defer'] }} Context
 * @typedef {import('./questions.mjs').askForHeater} Describe
 */

const targetSize = 100_000
const heaterShare = 0.1

/**
 * @param {string} name
 * @param {string} origin
 * @param {Describe} describe
 * @param {Context} context
 * @param {boolean} isTarget
 * @returns {Promise<Row[]>}
 */
async function fitRows(name, origin, describe, { options: { seconds }, folder, defer }, isTarget) {
  say(`${name} …`)
  const { fit, bytes, json, answerKb } = await measureFit({ origin, describe, seconds, folder, defer })
  const row = (/** @type {string} */ of, /** @type {import('./load.mjs').Load} */ load) => ({
    name: of,
    unit: 'ms',
    figures: load.ms,
    value: load.perSecond,
    yardstick: '',
    ratio: null,
    target: null,
  })
  const kB = `${answerKb.toFixed(0)} kB`
  return [
    {
      ...row(`${name}, requests/s`, fit),
      ratio: fit.perSecond / bytes.perSecond,
      yardstick: `bare Express sending ${kB} that are ready`,
      target: isTarget ? { of: 'ratio', least: 0.15 } : null,
    },
    {
      ...row(`${name}, requests/s`, fit),
      ratio: fit.perSecond / json.perSecond,
      yardstick: `bare Express writing ${kB} of JSON`,
    },
    row('  bare, ready bytes', bytes),
    row('  bare, JSON written', json),
  ]
}

/** @returns {Promise<Row[]>} */
async function searchRows(/** @type {string} */ name, /** @type {string} */ origin, /** @type {Context} */ context) {
  say(`search ${name} …`)
  const { search, read } = await measureSearch(origin, context.options.seconds)
  return [
    {
      name: `misspelt search ${name}, requests/s`,
      unit: 'ms',
      figures: search.ms,
      value: search.perSecond,
      ratio: search.ms.p95 / read.ms.p95,
      yardstick: 'p95 of reading one piece by its key',
      target: { of: 'p95', most: 150 },
    },
    {
      name: '  reading one piece',
      unit: 'ms',
      figures: read.ms,
      value: read.perSecond,
      ratio: null,
      yardstick: '',
      target: null,
    },
  ]
}

/** @returns {Promise<Row[]>} */
async function replacementRows(
  /** @type {number} */ size,
  /** @type {string} */ origin,
  /** @type {Context} */ context,
) {
  const name = `replacements among ${size}`
  say(`${name} …`)
  const { swap, fit } = await measureReplacements(origin, context.options.seconds)
  return [
    {
      name: `${name}, requests/s`,
      unit: 'ms',
      figures: swap.ms,
      value: swap.perSecond,
      ratio: swap.ms.p95 / fit.ms.p95,
      yardstick: 'p95 of fit in the same tank',
      target: size === targetSize ? { of: 'ratio', most: 4 } : null,
    },
    {
      name: '  fit in the same tank',
      unit: 'ms',
      figures: fit.ms,
      value: fit.perSecond,
      ratio: null,
      yardstick: '',
      target: null,
    },
  ]
}

/**
 * Everything that is measured on one catalogue, in one server.
 * @returns {Promise<Row[]>}
 */
async function measureSize(
  /** @type {number} */ size,
  /** @type {Context} */ context,
  /** @type {boolean} */ isLargest,
) {
  const { options, cluster, defer } = context
  const { only } = options
  const databaseUrl = await createCatalogue(cluster, size, heaterShare)
  const server = await startBuiltServer(databaseUrl, defer)
  const isTarget = size === targetSize
  /** @type {Row[]} */
  const rows = []
  if (only.has('fit') || only.has('memory'))
    rows.push(...(await fitRows(`fit of ${size}`, server.origin, askForHeater, context, isTarget)))
  if (isLargest && only.has('items'))
    rows.push(
      ...(await fitRows(`fit of ${size} in a furnished tank`, server.origin, askForHeaterAmongItems, context, false)),
    )
  if (isLargest && only.has('replacements')) rows.push(...(await replacementRows(size, server.origin, context)))
  if (isLargest && only.has('memory')) {
    const { now, highest } = readMemoryMb(server.pid)
    const target = isTarget ? /** @type {const} */ ({ of: 'value', most: 600 }) : null
    const base = { unit: 'MB', figures: null, yardstick: '', ratio: null }
    rows.push({ ...base, name: `memory of the server at ${size}`, value: now, target })
    rows.push({ ...base, name: '  at its highest', value: highest, target: null })
  }
  if (isLargest && only.has('search')) rows.push(...(await searchRows(`among ${size}`, server.origin, context)))
  if (isLargest && only.has('javascript')) {
    const { files, kB } = await measureFirstVisit(server.origin)
    const name = `JavaScript of a first visit, ${files} files gzipped`
    rows.push({
      name,
      unit: 'kB',
      figures: null,
      value: kB,
      ratio: null,
      yardstick: '',
      target: { of: 'value', most: 120 },
    })
  }
  await server.stop()
  return rows
}

/** Nothing but heaters, so many as a tenth of the largest catalogue. @returns {Promise<Row[]>} */
async function measureHeatersAlone(/** @type {Context} */ context) {
  const heaters = Math.max(...context.options.sizes) * heaterShare
  const databaseUrl = await createCatalogue(context.cluster, heaters, 1)
  const server = await startBuiltServer(databaseUrl, context.defer)
  const rows = await fitRows(`fit of ${heaters} heaters alone`, server.origin, askForHeater, context, false)
  await server.stop()
  return rows
}

/** @returns {Promise<Row[]>} */
async function measureEngine() {
  say('the engine alone …')
  const args = ['--import', 'tsx', 'scripts/bench/measure-engine.ts']
  const { code, output } = await runQuietly(process.execPath, args, { cwd: checkout })
  if (code !== 0) throw new Trouble(`Measuring the engine failed.\n${output}`)
  const { heaters, engine, loop, rules } = JSON.parse(output)
  const row = (/** @type {string} */ name, /** @type {import('./figures.mjs').Figures} */ figures) => {
    return { name, unit: 'ms', figures, value: figures.median, ratio: null, yardstick: '', target: null }
  }
  return [
    {
      ...row(`engine alone, ${heaters} heaters`, engine),
      ratio: engine.median / loop.median,
      yardstick: 'median of a loop by hand',
      target: /** @type {const} */ ({ of: 'ratio', most: 3 }),
    },
    row('  loop by hand', loop),
    {
      ...row('  the same rules in json-rules-engine', rules),
      ratio: rules.median / engine.median,
      yardstick: 'median of the engine',
      target: /** @type {const} */ ({ of: 'ratio', least: 5 }),
    },
  ]
}

/** How much slower the slowest of twenty gets as the catalogue grows. @returns {Row[]} */
function growthRows(/** @type {readonly Row[]} */ rows, /** @type {readonly number[]} */ sizes) {
  const find = (/** @type {number | undefined} */ size) =>
    rows.find(({ name }) => name === `fit of ${size}, requests/s`)
  const small = find(sizes[0])?.figures
  const large = find(sizes.at(-1))?.figures
  if (sizes.length < 2 || !small || !large) return []
  const isTarget = sizes[0] === 1000 && sizes.at(-1) === targetSize
  return [
    {
      name: `fit: p95 at ${sizes.at(-1)}`,
      unit: 'ms',
      figures: null,
      value: large.p95,
      ratio: large.p95 / small.p95,
      yardstick: `p95 at ${sizes[0]}`,
      target: isTarget ? { of: 'ratio', most: 8 } : null,
    },
  ]
}

/** Measures what was asked for, prints a table and keeps the figures in `.data/bench.json`. */
export async function runBench(/** @type {readonly string[]} */ args, /** @type {Life} */ life) {
  const options = readOptions(args)
  const { only, sizes } = options
  const folder = mkdtempSync(join(tmpdir(), 'stillfits-bench-'))
  life.defer(() => rmSync(folder, { recursive: true, force: true }))
  const loadBefore = loadavg()[0] ?? NaN
  /** @type {Row[]} */
  const rows = []
  if (only.has('engine')) rows.push(...(await measureEngine()))
  if (only.size > (only.has('engine') ? 1 : 0)) {
    const cluster = await startBenchCluster(life.defer)
    const context = { options, cluster, folder, defer: life.defer }
    // What only the largest catalogue is asked for needs no smaller ones.
    for (const size of only.has('fit') ? sizes : sizes.slice(-1))
      rows.push(...(await measureSize(size, context, size === sizes.at(-1))))
    if (only.has('heaters')) rows.push(...(await measureHeatersAlone(context)))
  }
  rows.push(...growthRows(rows, sizes))
  const machine = { cpus: cpus().length, model: cpus()[0]?.model ?? '', node: process.version, loadBefore }
  mkdirSync(dataFolder, { recursive: true })
  const file = join(dataFolder, 'bench.json')
  writeFileSync(
    file,
    `${JSON.stringify({ at: new Date().toISOString(), machine, options: { ...options, only: [...only] }, rows }, null, 2)}\n`,
  )
  for (const line of drawTable(rows)) say(line)
  say(`${machine.cpus} processors, load ${loadBefore.toFixed(1)} at the start. The figures are in ${file}.`)
}
