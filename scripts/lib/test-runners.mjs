import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { checkout } from './checkout.mjs'
import { runStep } from './processes.mjs'

/** @typedef {{ passed: number, failed: number }} Count */

/**
 * A runner that fails without a failed test (a file that does not load, a broken setup, no tests at all) counts as
 * one failure.
 * @returns {Count}
 */
const settle = (/** @type {Count} */ { passed, failed }, /** @type {number} */ exitCode) => ({
  passed,
  failed: exitCode !== 0 && failed === 0 ? 1 : failed,
})

/**
 * @param {readonly string[]} args
 * @param {(file: string) => Record<string, string>} describeEnv
 * @param {(file: string) => readonly string[]} describeArgs
 * @param {(report: any) => Count} count
 */
async function runAndCount(args, describeEnv, describeArgs, count) {
  const folder = mkdtempSync(join(tmpdir(), 'stillfits-report-'))
  const file = join(folder, 'report.json')
  try {
    // Someone's NODE_ENV=production would take from React what its tests need.
    const env = { ...describeEnv(file), NODE_ENV: undefined }
    const code = await runStep(process.execPath, [...args, ...describeArgs(file)], { cwd: checkout, env })
    const counted = existsSync(file) ? count(JSON.parse(readFileSync(file, 'utf8'))) : { passed: 0, failed: 0 }
    return settle(counted, code)
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

export function runVitest() {
  return runAndCount(
    [join(checkout, 'node_modules/vitest/vitest.mjs'), 'run', '--reporter=default', '--reporter=json'],
    () => ({}),
    (file) => [`--outputFile.json=${file}`],
    (report) => ({ passed: report.numPassedTests, failed: report.numFailedTests }),
  )
}

export function runPlaywright() {
  return runAndCount(
    [join(checkout, 'node_modules/@playwright/test/cli.js'), 'test', '--reporter=list,json'],
    (file) => ({ PLAYWRIGHT_JSON_OUTPUT_FILE: file }),
    () => [],
    // One that passed only on its second try is named in the output, and passed.
    ({ stats, errors }) => ({ passed: stats.expected + stats.flaky, failed: stats.unexpected + errors.length }),
  )
}
