import { join } from 'node:path'
import { checkout } from './checkout.mjs'
import { takeLock } from './lock.mjs'
import { chooseDataFolder, findPostgresIdentity } from './postgres-folder.mjs'
import { attachToCluster, startCluster } from './postgres.mjs'
import { runStep } from './processes.mjs'
import { findPostgres } from './requirements.mjs'
import { say, Trouble } from './say.mjs'

/**
 * Where the application finds its database. `owner` migrates; with a server that was given, both are one.
 * @typedef {{ app: string, owner: string }} DatabaseUrls
 * @typedef {import('./lifecycle.mjs').Life} Life
 */

/** @returns {DatabaseUrls | null} a server that the person named, instead of one of our own */
export function readGivenDatabase(env = process.env) {
  if (!env.DATABASE_URL) return null
  return { app: env.DATABASE_URL, owner: env.DATABASE_OWNER_URL || env.DATABASE_URL }
}

function locate() {
  const postgres = findPostgres()
  if (!postgres) throw new Trouble('PostgreSQL is missing on this machine: apt-get install postgresql')
  const identity = findPostgresIdentity()
  return { bin: postgres.bin, identity, home: chooseDataFolder(postgres.major, identity) }
}

export const chooseOwnHome = () => locate().home

const urlsOf = (/** @type {import('./postgres.mjs').Cluster} */ cluster) => ({
  app: cluster.urlFor('stillfits_app'),
  owner: cluster.urlFor('stillfits_owner'),
})

/**
 * Starts the project's own PostgreSQL; the caller holds the checkout's `run` lock.
 * @param {Life} life
 * @returns {Promise<DatabaseUrls>}
 */
export async function startOwnDatabase(life) {
  say('Starting PostgreSQL …')
  const onLost = () => {
    say('PostgreSQL does not start any more.')
    void life.end(1)
  }
  const cluster = await startCluster({ ...locate(), defer: life.defer, onLost })
  await cluster.createDatabase('stillfits')
  return urlsOf(cluster)
}

/** For a command of its own: the server that is running, or one that runs as long as the command. */
export async function openDatabase(/** @type {Life} */ life) {
  const given = readGivenDatabase()
  if (given) return given
  const lock = await takeLock('run')
  if (lock) {
    life.defer(lock.release)
    return startOwnDatabase(life)
  }
  const { bin, home } = locate()
  const running = attachToCluster(bin, home)
  if (!running) throw new Trouble('Stillfits is just starting or stopping in this folder; try again in a moment.')
  return urlsOf(running)
}

/** The settings of a process that talks to the database. */
export const databaseEnv = (/** @type {DatabaseUrls} */ urls) => ({
  DATABASE_URL: urls.app,
  DATABASE_OWNER_URL: urls.owner,
})

/**
 * Runs a program of the built server, or its source, against the database.
 * @param {'migrate' | 'load'} program
 * @param {DatabaseUrls} urls
 * @param {{ isBuilt: boolean }} options
 */
export async function runProgram(program, urls, { isBuilt }) {
  const source = { migrate: 'server/db/migrate.ts', load: 'seeds/load.ts' }[program]
  const args = isBuilt ? [join(checkout, 'dist/server', `${program}.js`)] : ['--import', 'tsx', join(checkout, source)]
  const env = { NODE_ENV: process.env.NODE_ENV || 'production', ...databaseEnv(urls) }
  const code = await runStep(process.execPath, args, { cwd: checkout, env })
  if (code !== 0) {
    throw new Trouble(`${program === 'migrate' ? 'Migrating the database' : 'Loading the demo data'} failed.`)
  }
}

/** Whether invented data stands in: always, unless DEMO=0. */
export const isDemo = (env = process.env) => !['0', 'false', 'off'].includes(env.DEMO ?? '')

/** Brings a database to where the code wants it, with the demo data unless DEMO=0. */
export async function prepareDatabase(
  /** @type {DatabaseUrls} */ urls,
  /** @type {{ isBuilt: boolean }} */ options,
  env = process.env,
) {
  say('Migrating the database …')
  await runProgram('migrate', urls, options)
  if (!isDemo(env)) return
  say('Loading the demo data …')
  await runProgram('load', urls, options)
}
