import { sql } from 'drizzle-orm'
import type { Database } from './database'

/** The schema that pg-boss keeps its tables in. */
export const jobSchema = 'jobs'

export interface QueuePolicy {
  /** How often a job is tried again after its first try. */
  readonly retryLimit: number
  /** Before the first retry; doubled, with some chance, for each further one. */
  readonly retryDelaySeconds: number
  /** A job whose process is gone is taken up again after this. */
  readonly expireSeconds: number
}

/** Letters: twelve tries over some six hours outlast an evening's outage of a mail server. */
export const queues = {
  letters: { retryLimit: 11, retryDelaySeconds: 5, expireSeconds: 120 },
  sweep: { retryLimit: 2, retryDelaySeconds: 60, expireSeconds: 900 },
  'long-work': { retryLimit: 5, retryDelaySeconds: 5, expireSeconds: 900 },
} as const satisfies Record<string, QueuePolicy>

export type QueueName = keyof typeof queues

/** Adds a job in the transaction of what asks for it: both are kept, or neither. */
export async function enqueueJob(db: Database, queue: QueueName, data: Readonly<Record<string, unknown>>) {
  const { retryLimit, retryDelaySeconds, expireSeconds } = queues[queue]
  await db.execute(sql`
    insert into ${sql.identifier(jobSchema)}.job
      (name, data, retry_limit, retry_delay, retry_backoff, expire_in, policy)
    values (${queue}, ${JSON.stringify(data)}::jsonb, ${retryLimit}, ${retryDelaySeconds}, true,
      ${expireSeconds} * interval '1 second', 'standard')`)
}
