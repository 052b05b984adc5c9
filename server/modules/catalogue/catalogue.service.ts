import type { Database } from '../../db/database'
import { createSnapshotBuilder, type Snapshot } from './build-snapshot'
import { readCatalogue, readVersion } from './catalogue.queries'

export interface Catalogue {
  /** The whole catalogue, at most `maxAgeMs` behind the database. Rejects when the database does not answer. */
  snapshot(): Promise<Snapshot>
}

const maxAgeMs = 2000

/** Keeps one copy for all requests. However many ask at once, one query looks for a newer version, and one loads it. */
export function createCatalogue(db: Database, now: () => number = Date.now): Catalogue {
  let current: Snapshot | null = null
  let checkedAt = Number.NEGATIVE_INFINITY
  let pending: Promise<Snapshot> | null = null

  async function load(): Promise<Snapshot> {
    const builder = createSnapshotBuilder()
    return builder.finish(await readCatalogue(db, (rows) => builder.add(rows)))
  }

  async function refresh(): Promise<Snapshot> {
    const startedAt = now()
    const known = current
    const isCurrent = known !== null && (await readVersion(db)) === known.version
    current = isCurrent ? known : await load()
    checkedAt = startedAt
    return current
  }

  return {
    async snapshot() {
      if (current !== null && now() - checkedAt < maxAgeMs) return current
      pending ??= refresh().finally(() => {
        pending = null
      })
      return pending
    },
  }
}
