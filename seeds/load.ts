import { readEnv } from '../server/config/env'
import { createDatabaseClient } from '../server/db/client'
import { AppError } from '../server/lib/errors'
import { importDemoPeople } from '../server/modules/accounts/demo-people.service'
import { importPieces } from '../server/modules/gear/gear-writes.service'
import { seedPieces } from './gear/index'
import { demoPeople } from './people'

/** Loads the demo catalogue through the same checks as what people type; a second run changes nothing. */
async function loadSeeds(): Promise<void> {
  const { DATABASE_URL } = readEnv(process.env)
  const client = createDatabaseClient(DATABASE_URL, { max: 1, statementTimeoutMs: 60_000 })
  try {
    const { created, extended, unchanged } = await importPieces(client.db, seedPieces)
    const newPeople = await importDemoPeople(client.db, demoPeople)
    process.stdout.write(
      `Demo data: ${created} pieces new, ${extended} extended, ${unchanged} as they were; ${newPeople} people new.\n`,
    )
  } finally {
    await client.close()
  }
}

function describe(error: unknown): string {
  if (!(error instanceof AppError)) return error instanceof Error ? error.message : String(error)
  return [error.message, ...error.issues.map(({ pointer, detail }) => `  ${pointer}: ${detail}`)].join('\n')
}

await loadSeeds().catch((error: unknown) => {
  process.stderr.write(`Loading the demo data failed: ${describe(error)}\n`)
  process.exitCode = 1
})
