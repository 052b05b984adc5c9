import { randomBytes } from 'node:crypto'
import pg from 'pg'
import { testClusterVariable, type TestCluster } from '../../scripts/lib/test-cluster.mjs'

export interface TestDatabase {
  /** As the application: it cannot empty or alter tables. */
  readonly databaseUrl: string
  /** As the owner of the tables. */
  readonly ownerUrl: string
  readonly name: string
  /** Ends every connection to it, as a restart of PostgreSQL would. */
  readonly cutConnections: () => Promise<void>
  readonly drop: () => Promise<void>
}

function readTestCluster(): TestCluster {
  const text = process.env[testClusterVariable]
  if (!text) throw new Error("There is no test cluster: run these tests through the project's vitest configuration.")
  return JSON.parse(text) as TestCluster
}

async function runAsAdmin(cluster: TestCluster, sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: cluster.adminUrl, connectionTimeoutMillis: 10_000 })
  await client.connect()
  try {
    await client.query(sql)
  } finally {
    await client.end()
  }
}

function withDatabaseName(url: string, name: string): string {
  const changed = new URL(url)
  changed.pathname = `/${name}`
  return changed.href
}

/** A database of one's own, copied from the template: migrated, with the demo data in it. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const cluster = readTestCluster()
  const name = `test_${randomBytes(8).toString('hex')}`
  await runAsAdmin(cluster, `CREATE DATABASE ${name} TEMPLATE ${cluster.template} OWNER stillfits_owner`)
  return {
    name,
    databaseUrl: withDatabaseName(cluster.appUrl, name),
    ownerUrl: withDatabaseName(cluster.ownerUrl, name),
    cutConnections: () =>
      runAsAdmin(cluster, `SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE datname = '${name}'`),
    drop: () => runAsAdmin(cluster, `DROP DATABASE IF EXISTS ${name} WITH (FORCE)`),
  }
}
