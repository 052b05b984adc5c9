import { asc, eq, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { catalogueVersion, gear } from '../../db/schema/index'

export async function readVersion(db: Database): Promise<number> {
  const [row] = await db
    .select({ version: catalogueVersion.version })
    .from(catalogueVersion)
    .where(eq(catalogueVersion.id, 1))
  if (row === undefined) throw new Error('The catalogue has no version: its migration has not run')
  return row.version
}

const pieceColumns = {
  id: gear.id,
  slug: gear.slug,
  kind: gear.kind,
  brand: gear.brand,
  model: gear.model,
  status: gear.status,
  updatedAt: gear.updatedAt,
  specs: gear.specs,
  provenance: gear.provenance,
}

export type PieceRow = Awaited<ReturnType<typeof readCatalogue>>['rows'][number]

/** All gear and the version that it makes, seen at one moment. */
export async function readCatalogue(db: Database) {
  return db.transaction(
    async (tx) => {
      // Reading everything may take longer than a visitor's query is allowed to.
      await tx.execute(sql`set local statement_timeout = '60s'`)
      const version = await readVersion(tx)
      const rows = await tx.select(pieceColumns).from(gear).orderBy(asc(gear.id))
      return { version, rows }
    },
    { isolationLevel: 'repeatable read', accessMode: 'read only' },
  )
}
