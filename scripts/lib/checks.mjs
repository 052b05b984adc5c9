import { join } from 'node:path'
import { checkout } from './checkout.mjs'
import { runQuietly } from './processes.mjs'
import { formatSeconds, say } from './say.mjs'

const bin = (/** @type {string} */ path) => join(checkout, 'node_modules', path)
const compiler = bin('typescript/bin/tsc')
const cruised = ['server', 'src', 'shared', 'seeds', 'scripts', 'tests']

/** @typedef {{ name: string, args: readonly string[] }} Check */

/** The longest first: two run at a time. @type {readonly Check[]} */
const checks = [
  { name: 'lint', args: [bin('eslint/bin/eslint.js'), '.', '--max-warnings', '0'] },
  { name: 'types of tests, seeds and scripts', args: [compiler, '-p', '.'] },
  { name: 'types of server', args: [compiler, '-p', 'server'] },
  { name: 'types of src', args: [compiler, '-p', 'src'] },
  { name: 'types of shared', args: [compiler, '-p', 'shared'] },
  {
    name: 'import rules',
    args: [bin('dependency-cruiser/bin/dependency-cruise.mjs'), '--config', '.dependency-cruiser.mjs', ...cruised],
  },
  { name: 'format', args: [bin('prettier/bin/prettier.cjs'), '--check', '--log-level', 'warn', '.'] },
]

async function passes(/** @type {Check} */ { name, args }) {
  const startedMs = Date.now()
  const { code, output } = await runQuietly(process.execPath, args, { cwd: checkout })
  say(`${code === 0 ? 'ok    ' : 'FAILED'} ${name} (${formatSeconds(startedMs)})`)
  if (code !== 0) say(output)
  return code === 0
}

/** Runs every check, also after one has failed: one look shows all that is wrong. Needs no database. */
export async function runChecks() {
  const waiting = [...checks]
  let failed = 0
  const work = async () => {
    for (let check = waiting.shift(); check; check = waiting.shift()) {
      if (!(await passes(check))) failed += 1
    }
  }
  await Promise.all([work(), work()])
  return { passed: checks.length - failed, failed }
}
