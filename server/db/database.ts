import type { NodePgQueryResultHKT } from 'drizzle-orm/node-postgres'
import type { PgDatabase } from 'drizzle-orm/pg-core'

/** The pool or a transaction on it: queries take either. */
export type Database = PgDatabase<NodePgQueryResultHKT>
