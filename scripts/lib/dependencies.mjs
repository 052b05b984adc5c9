import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { checkout } from './checkout.mjs'
import { withLock } from './lock.mjs'
import { runQuietly } from './processes.mjs'
import { formatSeconds, say, Trouble } from './say.mjs'

/** @typedef {{ version?: string, link?: boolean, optional?: boolean }} LockedPackage */

/** @returns {Record<string, LockedPackage> | null} */
function readPackages(/** @type {string} */ file) {
  try {
    return JSON.parse(readFileSync(join(checkout, file), 'utf8')).packages ?? null
  } catch {
    return null
  }
}

/** npm writes what it installed to a lock file of its own in node_modules, and only when all went well. */
export function areDependenciesFresh() {
  const wanted = readPackages('package-lock.json')
  const installed = readPackages('node_modules/.package-lock.json')
  if (!wanted || !installed) return false
  return Object.entries(wanted).every(([path, { version, link, optional }]) => {
    if (path === '' || link) return true
    const found = installed[path]
    // Optional ones are left out on platforms that they are not for.
    return found ? found.version === version : optional === true
  })
}

/** Build tools are needed to start from a clone, also where NODE_ENV or npm's settings would leave them out. */
export async function ensureDependencies() {
  if (areDependenciesFresh()) return
  await withLock('install', async () => {
    if (areDependenciesFresh()) return
    const startedMs = Date.now()
    say('Installing the npm packages that package-lock.json names …')
    const { code, output } = await runQuietly('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
      cwd: checkout,
    })
    if (code !== 0) throw new Trouble(`npm ci failed.\n${output.split('\n').slice(-20).join('\n')}`)
    say(`Installed the npm packages (${formatSeconds(startedMs)}).`)
  })
}
