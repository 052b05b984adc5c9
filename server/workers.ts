import { setTimeout as wait } from 'node:timers/promises'
import { z } from 'zod'
import type { Env } from './config/env'
import { getOwnOrigin } from './config/origin'
import type { Database } from './db/database'
import type { Logger } from './lib/logger'
import { sweepEvidence } from './modules/evidence/evidence-sweep.service'
import { deliverLetter } from './modules/mail/deliver-letter'
import { sweepLetters } from './modules/mail/mail.service'
import { runLongWork } from './modules/revert/revert.service'
import type { FileStore } from './services/files/file-store'
import { startJobRunner, type JobRunner, type JobRunnerOptions } from './services/jobs/job-runner'
import type { Mailer } from './services/mail/mailer'

export interface WorkerDependencies {
  readonly db: Database
  readonly env: Env
  readonly logger: Logger
  readonly mailer: Mailer | null
  readonly files: FileStore | null
  readonly executeSql: JobRunnerOptions['executeSql']
  readonly pollMs?: number
}

export interface Workers {
  readonly stop: () => Promise<void>
}

const letterJobSchema = z.object({ id: z.uuid() })
const retryMs = 5_000

/** Gives each queue its work. Without a mail server letters wait; the request that queued them has long succeeded. */
function assignWork(runner: JobRunner, { db, env, logger, mailer, files }: WorkerDependencies): void {
  if (mailer !== null) {
    const delivery = { db, mailer, domain: new URL(getOwnOrigin(env)).hostname }
    runner.handle('letters', async (data) => deliverLetter(delivery, letterJobSchema.parse(data).id))
  }
  runner.handle('sweep', async () => {
    const requeued = await sweepLetters(db)
    const swept = files === null ? null : await sweepEvidence(db, files)
    logger.info({ requeued, swept }, 'swept')
  })
  runner.repeatHourly('sweep')
  runner.handle('long-work', (data) => runLongWork(db, data))
}

/** Work outside of requests. The database may be away when the process starts: it is asked again until it answers. */
export function startWorkers(dependencies: WorkerDependencies): Workers {
  const { logger, executeSql, pollMs } = dependencies
  const stopping = new AbortController()
  const onError = (error: unknown) => logger.warn({ err: error }, 'a job or its queue failed')

  async function start(): Promise<JobRunner | null> {
    while (!stopping.signal.aborted) {
      try {
        return await startJobRunner({ executeSql, onError, ...(pollMs !== undefined && { pollMs }) })
      } catch (error) {
        onError(error)
        await wait(retryMs, undefined, { signal: stopping.signal }).catch(() => undefined)
      }
    }
    return null
  }

  const started = start().then((runner) => {
    if (runner !== null) assignWork(runner, dependencies)
    return runner
  })
  return {
    async stop() {
      stopping.abort()
      await (await started)?.stop()
    },
  }
}
