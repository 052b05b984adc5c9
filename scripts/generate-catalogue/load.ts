import { readEnv } from '../../server/config/env'
import { createDatabaseClient } from '../../server/db/client'
import { importPieces } from '../../server/modules/gear/gear-writes.service'
import type { PieceInput } from '../../server/modules/gear/gear.types'
import { generatePieces } from './generate-pieces'

const piecesPerImport = 2000

/** Fills the database of DATABASE_URL with `pieces` made-up pieces, through the same checks as what people type. */
async function loadGenerated(pieces: number, heaterShare: number): Promise<void> {
  const client = createDatabaseClient(readEnv(process.env).DATABASE_URL, { max: 1, statementTimeoutMs: 120_000 })
  try {
    let chunk: PieceInput[] = []
    for (const piece of generatePieces({ pieces, heaterShare })) {
      chunk.push(piece)
      if (chunk.length < piecesPerImport) continue
      await importPieces(client.db, chunk)
      chunk = []
    }
    await importPieces(client.db, chunk)
    await client.pool.query('vacuum analyze gear')
  } finally {
    await client.close()
  }
}

const [pieces = NaN, heaterShare = 0.1] = process.argv.slice(2).map(Number)
if (!Number.isInteger(pieces) || pieces < 1 || !(heaterShare >= 0 && heaterShare <= 1)) {
  process.stderr.write('Usage: DATABASE_URL=… tsx scripts/generate-catalogue/load.ts <pieces> [share of heaters]\n')
  process.exitCode = 2
} else {
  await loadGenerated(pieces, heaterShare)
}
