import { and, asc, eq, gt, isNull, sql } from 'drizzle-orm'
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

/** So many rows are in memory at once as they come, beside what is made of them. */
const rowsAtOnce = 5000

const listRows = (db: Database, after: number) =>
  db
    .select(pieceColumns)
    .from(gear)
    .where(and(gt(gear.id, after), isNull(gear.mergedInto), isNull(gear.retiredAt)))
    .orderBy(asc(gear.id))
    .limit(rowsAtOnce)

export type PieceRow = Awaited<ReturnType<typeof listRows>>[number]

/** All gear but what was merged or retired, some at a time, and the version that it makes: seen at one moment. */
export async function readCatalogue(db: Database, take: (rows: readonly PieceRow[]) => void): Promise<number> {
  return db.transaction(
    async (tx) => {
      // Reading everything may take longer than a visitor's query is allowed to.
      await tx.execute(sql`set local statement_timeout = '60s'`)
      const version = await readVersion(tx)
      for (let after = 0; ;) {
        const rows = await listRows(tx, after)
        take(rows)
        const last = rows.at(-1)
        if (last === undefined || rows.length < rowsAtOnce) return version
        after = last.id
      }
    },
    { isolationLevel: 'repeatable read', accessMode: 'read only' },
  )
}
