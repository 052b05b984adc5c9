import { mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { prepareDatabase } from './database.mjs'
import { findPostgresIdentity, prepareFolder } from './postgres-folder.mjs'
import { startCluster } from './postgres.mjs'
import { isAlive } from './processes.mjs'
import { findPostgres } from './requirements.mjs'
import { Trouble } from './say.mjs'

/** Where tests find the cluster: each test file copies the template, migrated and filled once. */
export const testClusterVariable = 'STILLFITS_TEST_CLUSTER'
const template = 'stillfits_template'
const prefix = 'stillfits-test-'

/**
 * @typedef {object} TestCluster
 * @property {string} adminUrl may make and drop databases
 * @property {string} ownerUrl of the template; another database by its name in the path
 * @property {string} appUrl
 * @property {string} template
 */

/** A run that was killed could not clear up after itself. */
function sweepAbandoned() {
  for (const name of readdirSync(tmpdir())) {
    const pid = Number(/^stillfits-test-(\d+)-/.exec(name)?.[1])
    if (!pid || isAlive(pid)) continue
    try {
      rmSync(join(tmpdir(), name), { recursive: true, force: true })
    } catch {
      // Another user's: theirs to clear.
    }
  }
}

/**
 * A throwaway PostgreSQL with the template in it, unless an outer run has made one already.
 * @param {(stop: () => unknown) => void} defer
 * @returns {Promise<TestCluster>}
 */
export async function startTestCluster(defer) {
  const given = process.env[testClusterVariable]
  if (given) return JSON.parse(given)
  const postgres = findPostgres()
  if (!postgres) throw new Trouble('PostgreSQL is missing on this machine: apt-get install postgresql')
  sweepAbandoned()
  const identity = findPostgresIdentity()
  const home = mkdtempSync(join(tmpdir(), `${prefix}${process.pid}-`))
  prepareFolder(home, identity)
  defer(() => rmSync(home, { recursive: true, force: true }))
  const cluster = await startCluster({ bin: postgres.bin, home, identity, isThrowaway: true, defer })
  await cluster.createDatabase(template)
  const urls = { app: cluster.urlFor('stillfits_app', template), owner: cluster.urlFor('stillfits_owner', template) }
  await prepareDatabase(urls, { isBuilt: false }, { DEMO: '1' })
  const found = { adminUrl: cluster.urlFor('admin', 'postgres'), ownerUrl: urls.owner, appUrl: urls.app, template }
  process.env[testClusterVariable] = JSON.stringify(found)
  return found
}
