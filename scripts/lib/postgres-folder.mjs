import { chmodSync, chownSync, lstatSync, mkdirSync, statSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { checkoutKey, dataFolder } from './checkout.mjs'
import { readOutput } from './processes.mjs'
import { say, Trouble } from './say.mjs'

/** @typedef {{ uid: number, gid: number }} Identity */

/** PostgreSQL refuses to run as root: there it runs as the user that its package made. Otherwise as who we are. */
export function findPostgresIdentity() {
  if (process.getuid?.() !== 0) return null
  const uid = Number(readOutput('id', '-u', 'postgres') ?? NaN)
  const gid = Number(readOutput('id', '-g', 'postgres') ?? NaN)
  if (!Number.isInteger(uid) || !Number.isInteger(gid)) {
    throw new Trouble('PostgreSQL cannot run as root, and this machine has no user "postgres" for it.')
  }
  return { uid, gid }
}

/** A folder that only PostgreSQL's user may enter. Its parent is made passable, when it is ours. */
export function prepareFolder(/** @type {string} */ folder, /** @type {Identity | null} */ identity) {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  if (identity) chownSync(folder, identity.uid, identity.gid)
  chmodSync(folder, 0o700)
}

/** Whether PostgreSQL's user can get there and write: any parent folder may be closed to it. */
function isUsable(/** @type {string} */ folder, /** @type {Identity | null} */ identity) {
  const as = identity ? [`--reuid=${identity.uid}`, `--regid=${identity.gid}`, '--clear-groups'] : []
  const owner = identity?.uid ?? process.getuid?.()
  return (
    statSync(folder).uid === owner &&
    readOutput('setpriv', ...as, '--', 'sh', '-c', 'cd "$1" && test -w .', 'sh', folder) !== null
  )
}

function makeParent(/** @type {string} */ parent, /** @type {number} */ mode) {
  mkdirSync(parent, { recursive: true })
  const { uid } = lstatSync(parent)
  if (uid !== process.getuid?.()) throw new Trouble(`${parent} belongs to another user.`)
  chmodSync(parent, mode)
}

/** Folders under a shared temporary folder can be laid there by anybody: only a real folder of ours is trusted. */
function makeSharedParent(/** @type {string} */ parent) {
  makeParent(parent, 0o711)
  if (!lstatSync(parent).isDirectory()) throw new Trouble(`${parent} is not a folder.`)
}

/**
 * The project's own data folder: in the checkout, or in a temporary folder that outlives restarts when PostgreSQL
 * cannot use the checkout.
 * @param {number} major a folder serves one major version
 * @param {Identity | null} identity
 */
export function chooseDataFolder(major, identity) {
  const name = `postgres-${major}`
  const fallback = join(readOutput('test', '-w', '/var/tmp') === null ? tmpdir() : '/var/tmp', fallbackName())
  const parents = [
    { parent: dataFolder, make: () => makeParent(dataFolder, 0o755) },
    { parent: fallback, make: () => makeSharedParent(fallback) },
  ]
  const reasons = []
  for (const { parent, make } of parents) {
    try {
      make()
      const folder = join(parent, name)
      prepareFolder(folder, identity)
      if (isUsable(folder, identity)) {
        if (parent === fallback) say(`PostgreSQL cannot use this checkout's .data folder; its data is in ${folder}.`)
        return folder
      }
      reasons.push(`${folder}: PostgreSQL's user cannot reach it`)
    } catch (error) {
      reasons.push(error instanceof Error ? error.message : String(error))
    }
  }
  throw new Trouble(`There is no folder for PostgreSQL's data:\n  ${reasons.join('\n  ')}`)
}

const fallbackName = () => `stillfits-${process.getuid?.() ?? 0}-${checkoutKey}`
