import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { checkout } from '../lib/checkout.mjs'
import { runProgram } from '../lib/database.mjs'
import { findPostgresIdentity, prepareFolder } from '../lib/postgres-folder.mjs'
import { startCluster } from '../lib/postgres.mjs'
import { runStep } from '../lib/processes.mjs'
import { findPostgres } from '../lib/requirements.mjs'
import { formatSeconds, say, Trouble } from '../lib/say.mjs'

/** @typedef {import('../lib/postgres.mjs').Cluster} Cluster */

/** A PostgreSQL that goes when the run ends, but flushes and logs as one that is meant to stay. */
export async function startBenchCluster(/** @type {import('../lib/lifecycle.mjs').Life['defer']} */ defer) {
  const postgres = findPostgres()
  if (!postgres) throw new Trouble('PostgreSQL is missing on this machine: apt-get install postgresql')
  const identity = findPostgresIdentity()
  // A name that the tests' own clearing up knows, should this run be killed outright.
  const home = mkdtempSync(join(tmpdir(), `stillfits-test-${process.pid}-`))
  prepareFolder(home, identity)
  defer(() => rmSync(home, { recursive: true, force: true }))
  return startCluster({ bin: postgres.bin, home, identity, defer })
}

/**
 * A database with a generated catalogue in it.
 * @param {Cluster} cluster
 * @param {number} pieces
 * @param {number} heaterShare
 * @returns {Promise<string>} where the application finds it
 */
export async function createCatalogue(cluster, pieces, heaterShare) {
  const startedMs = Date.now()
  const name = `bench_${pieces}_${Math.round(100 * heaterShare)}`
  await cluster.createDatabase(name)
  const urls = { app: cluster.urlFor('stillfits_app', name), owner: cluster.urlFor('stillfits_owner', name) }
  await runProgram('migrate', urls, { isBuilt: true })
  const args = ['--import', 'tsx', 'scripts/generate-catalogue/load.ts', String(pieces), String(heaterShare)]
  const env = { NODE_ENV: 'production', DATABASE_URL: urls.owner }
  const code = await runStep(process.execPath, args, { cwd: checkout, env })
  if (code !== 0) throw new Trouble('Generating the catalogue failed.')
  say(`${pieces} pieces, ${Math.round(100 * heaterShare)} % heaters, generated (${formatSeconds(startedMs)}).`)
  return urls.app
}
