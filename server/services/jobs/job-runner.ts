import { setTimeout as wait } from 'node:timers/promises'
import PgBoss from 'pg-boss'
import { jobSchema, type QueueName } from '../../db/job-queue'

export interface JobRunner {
  /** Takes up jobs of a queue, each once at a time across all processes; one that throws is tried again later. */
  handle(queue: QueueName, work: (data: unknown) => Promise<void>): void
  /** A job each hour, whichever process asks first. */
  repeatHourly(queue: QueueName): void
  /** Takes up nothing more, and resolves when what is under way has ended. */
  stop(): Promise<void>
}

export interface JobRunnerOptions {
  readonly executeSql: (text: string, values: unknown[]) => Promise<{ rows: unknown[] }>
  readonly onError: (error: unknown) => void
  /** How long an idle queue is left alone. */
  readonly pollMs?: number
}

const batchSize = 10
const hourlyCheckMs = 10 * 60_000

/**
 * pg-boss keeps the queue: retries with growing delays, and jobs whose process is gone. Its own workers are not used,
 * since they leave a promise unheard that rejects when the database goes away, which ends the process.
 */
export async function startJobRunner({ executeSql, onError, pollMs = 1_000 }: JobRunnerOptions): Promise<JobRunner> {
  const boss = new PgBoss({
    schema: jobSchema,
    db: { executeSql },
    migrate: false,
    schedule: false,
    maintenanceIntervalSeconds: 60,
  })
  boss.on('error', onError)
  await boss.start()

  const stopping = new AbortController()
  const loops: Promise<void>[] = []

  const pause = (ms: number) => wait(ms, undefined, { signal: stopping.signal }).catch(() => undefined)

  async function settle(queue: QueueName, id: string, work: () => Promise<void>): Promise<void> {
    try {
      await work()
    } catch (error) {
      onError(error)
      const { message } = error instanceof Error ? error : { message: String(error) }
      await boss.fail(queue, id, { message })
      return
    }
    await boss.complete(queue, id)
  }

  async function runBatch(queue: QueueName, work: (data: unknown) => Promise<void>): Promise<number> {
    const jobs = await boss.fetch(queue, { batchSize })
    for (const { id, data } of jobs) await settle(queue, id, () => work(data))
    return jobs.length
  }

  async function loop(queue: QueueName, work: (data: unknown) => Promise<void>): Promise<void> {
    while (!stopping.signal.aborted) {
      const done = await runBatch(queue, work).catch((error: unknown) => {
        onError(error)
        return 0
      })
      if (done < batchSize) await pause(pollMs)
    }
  }

  async function repeat(queue: QueueName): Promise<void> {
    while (!stopping.signal.aborted) {
      // The slot is one hour wide and unique in the database: asking again in the same hour adds nothing.
      await boss.send(queue, {}, { singletonHours: 1 }).catch(onError)
      await pause(hourlyCheckMs)
    }
  }

  return {
    handle: (queue, work) => void loops.push(loop(queue, work)),
    repeatHourly: (queue) => void loops.push(repeat(queue)),
    async stop() {
      stopping.abort()
      await Promise.all(loops)
      await boss.stop({ graceful: false })
    },
  }
}
