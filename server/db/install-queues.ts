import type pg from 'pg'
import PgBoss from 'pg-boss'
import { jobSchema, queues } from './job-queue'

/** The application's own role reads and writes rows of the queues; making them is the owner's. */
const grants = `
  DO $$
  BEGIN
    IF EXISTS (SELECT FROM pg_roles WHERE rolname = 'stillfits_app') THEN
      GRANT USAGE ON SCHEMA ${jobSchema} TO stillfits_app;
      GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA ${jobSchema} TO stillfits_app;
    END IF;
  END
  $$`

/** Makes the queue's tables and each queue, or brings them up to date. */
export async function installQueues(client: pg.Client): Promise<void> {
  const boss = new PgBoss({
    schema: jobSchema,
    db: { executeSql: (text: string, values: unknown[]) => client.query(text, values) },
    schedule: false,
    supervise: false,
  })
  boss.on('error', () => undefined)
  await boss.start()
  for (const [name, { retryLimit, retryDelaySeconds, expireSeconds }] of Object.entries(queues)) {
    await boss.createQueue(name, {
      name,
      policy: 'standard',
      retryLimit,
      retryDelay: retryDelaySeconds,
      retryBackoff: true,
      expireInSeconds: expireSeconds,
    })
  }
  await boss.stop({ graceful: false, close: false })
  await client.query(grants)
}
