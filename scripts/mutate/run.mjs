import { mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { dataFolder } from '../lib/checkout.mjs'
import { formatSeconds, say, Trouble } from '../lib/say.mjs'
import { drawSample } from './draw-sample.mjs'
import { listMutants } from './list-mutants.mjs'
import { readOptions } from './options.mjs'
import { ImportGraph, relateTests } from './related-tests.mjs'
import { writeReport } from './report.mjs'
import { copyTree } from './tree.mjs'
import { runTests, tryMutant } from './try-mutant.mjs'

/** Tests that need a browser, a database or the built client say nothing of the engine that others do not. */
const elsewhere = /^tests\/(api|client|e2e)\//

function listFiles(/** @type {string} */ folder, /** @type {string} */ part) {
  return readdirSync(join(folder, part), { recursive: true, encoding: 'utf8' })
    .map((name) => `${part}/${name}`)
    .sort()
}

/**
 * @param {readonly string[]} args
 * @param {import('../lib/lifecycle.mjs').Life} life
 */
export async function runMutants(args, { defer, isEnding }) {
  const options = readOptions(args)
  const first = copyTree(defer)
  const sources = listFiles(first, 'shared/engine').filter(
    (file) => file.endsWith('.ts') && file.startsWith(options.files),
  )
  const all = sources.flatMap((file) => listMutants(file, readFileSync(join(first, file), 'utf8')))
  const sample = drawSample(all, options.sample, options.seed)
  const tests = listFiles(first, 'tests').filter(
    (file) => file.endsWith('.test.ts') && file.startsWith(options.tests) && !elsewhere.test(file),
  )
  const testsOf = relateTests(new ImportGraph(first), tests)
  const needed = [...new Set(sample.flatMap(({ file }) => testsOf(file)))]
  say(
    `${all.length} possible faults, ${sample.length} of them tried (seed ${options.seed}), ${needed.length} test files.`,
  )
  if (needed.length > 0 && (await runTests(first, needed, 10 * options.seconds)) !== 0)
    throw new Trouble('The tests do not pass as the tree is: npm run test:unit says which.')

  const started = Date.now()
  const folders = [first, ...Array.from({ length: options.jobs - 1 }, () => copyTree(defer))]
  const queue = [...sample.entries()]
  /** @type {import('./report.mjs').Tried[]} */
  const tried = []
  const work = async (/** @type {string} */ folder) => {
    for (let next = queue.shift(); next && !isEnding(); next = queue.shift()) {
      const [at, mutant] = next
      const fate = await tryMutant(folder, mutant, testsOf(mutant.file), options.seconds)
      tried[at] = { ...mutant, fate }
      say(`${String(at + 1).padStart(4)} ${fate.padEnd(11)} ${mutant.file}:${mutant.line} ${mutant.operator}`)
    }
  }
  await Promise.all(folders.map(work))
  const found = tried.filter((one) => one !== undefined)
  mkdirSync(dataFolder, { recursive: true })
  const file = join(dataFolder, 'mutation.json')
  const { seed, files } = options
  writeFileSync(file, `${JSON.stringify({ seed, files, possible: all.length, tried: found }, null, 2)}\n`)
  say(`\n${writeReport(found)}\n${formatSeconds(started)}; also written to .data/mutation.json`)
}
