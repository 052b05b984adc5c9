import { rmSync } from 'node:fs'
import { chooseOwnHome, openDatabase, readGivenDatabase, runProgram } from './lib/database.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'
import { takeRunLock } from './lib/run-lock.mjs'
import { say, Trouble } from './lib/say.mjs'

/** @typedef {import('./lib/lifecycle.mjs').Life} Life */

async function migrate(/** @type {Life} */ life) {
  await runProgram('migrate', await openDatabase(life), { isBuilt: false })
  say('The database is up to date.')
}

async function seed(/** @type {Life} */ life) {
  const urls = await openDatabase(life)
  await runProgram('migrate', urls, { isBuilt: false })
  await runProgram('load', urls, { isBuilt: false })
  say('The demo data is loaded.')
}

/** Only ever the project's own database: somebody else's server is theirs to empty. */
async function reset(/** @type {Life} */ life) {
  if (readGivenDatabase()) throw new Trouble('db:reset empties only the database of this checkout: unset DATABASE_URL.')
  const lock = await takeRunLock()
  rmSync(chooseOwnHome(), { recursive: true, force: true })
  await lock.release()
  await seed(life)
}

const commands = { migrate, seed, reset }

await live(async (life) => {
  const name = process.argv[2]
  if (name !== 'migrate' && name !== 'seed' && name !== 'reset') {
    throw new Trouble('Usage: npm run db:migrate, db:seed or db:reset')
  }
  requireNode()
  requireSetpriv()
  if (!readGivenDatabase()) await ensureRequirements(['postgresql'])
  await ensureDependencies()
  await commands[name](life)
  return 0
})
