import pino from 'pino'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { readEnv } from '../../../server/config/env'
import { queues } from '../../../server/db/job-queue'
import { deliverLetter } from '../../../server/modules/mail/deliver-letter'
import { queueLetter, sweepLetters } from '../../../server/modules/mail/mail.service'
import { createMailer, type Mailer } from '../../../server/services/mail/mailer'
import { startWorkers, type Workers } from '../../../server/workers'
import { startApp, type TestApp } from '../../support/app'
import { startTestMail, type TestMail } from '../../support/fakes'
import { waitUntil } from '../../support/wait-until'

let app: TestApp
let mail: TestMail
let mailer: Mailer
let workers: Workers[] = []

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

beforeEach(async () => {
  await app.client.pool.query('delete from outbox')
  await app.client.pool.query('delete from jobs.job')
  mail = await startTestMail()
  mailer = createMailer(mail.url, 'stillfits@example.org')
})

afterEach(async () => {
  await Promise.all(workers.map((worker) => worker.stop()))
  workers = []
  mailer.close()
  await mail.stop()
})

function startWorker(): void {
  const env = readEnv({ DATABASE_URL: app.database.databaseUrl, PUBLIC_ORIGIN: 'https://fits.example' })
  const executeSql = (text: string, values: unknown[]) => app.client.pool.query(text, values)
  const logger = pino({ level: 'silent' })
  workers.push(startWorkers({ db: app.client.db, env, logger, mailer, files: null, executeSql, pollMs: 100 }))
}

const queue = (subject: string, recipient = 'reader@example.org') =>
  app.client.db.transaction((tx) =>
    queueLetter(tx, { recipient, kind: 'test', subject, textBody: `Text of ${subject}`, htmlBody: '<p>Text</p>' }),
  )

interface Row {
  readonly id: string
  readonly subject: string
  readonly status: string
  readonly attempts: number
  readonly last_error: string | null
}

const listRows = async () => (await app.client.pool.query<Row>('select * from outbox order by created_at, id')).rows
const allSent = (rows: Row[]) => rows.every(({ status }) => status === 'sent')
const delivery = () => ({ db: app.client.db, mailer, domain: 'fits.example' })

describe('the worker for letters', () => {
  it('sends what was queued, with text and HTML and a Message-ID made of the letter’s own id', async () => {
    await queue('First')
    startWorker()
    const [row] = await waitUntil(listRows, allSent)
    const [letter, ...others] = await mail.list()
    expect(others).toEqual([])
    expect(letter).toMatchObject({
      to: 'reader@example.org',
      subject: 'First',
      text: 'Text of First',
      html: '<p>Text</p>',
      messageId: `${row?.id}@fits.example`,
    })
  })

  it('sends each letter once when two workers share a database', async () => {
    const subjects = Array.from({ length: 30 }, (_, index) => `Letter ${index}`)
    for (const subject of subjects) await queue(subject)
    startWorker()
    startWorker()
    await waitUntil(listRows, allSent)
    const received = (await mail.list()).map(({ subject }) => subject)
    expect(received.sort()).toEqual([...subjects].sort())
  })

  it('lets mail follow when the mail server was away while it was queued', async () => {
    await mail.pause()
    startWorker()
    await queue('Patient')
    const [failed] = await waitUntil(listRows, ([row]) => row?.last_error !== null)
    expect(failed).toMatchObject({ status: 'waiting', last_error: expect.stringContaining('ECONNREFUSED') })
    await mail.resume()
    await waitUntil(listRows, allSent, 40_000)
    expect((await mail.list()).map(({ subject }) => subject)).toEqual(['Patient'])
  })

  it('waits longer before each further try', async () => {
    await mail.pause()
    await queue('Backing off')
    startWorker()
    const readJob = async () =>
      (
        await app.client.pool.query<{ tries: number; wait: number }>(
          `select retry_count as tries, extract(epoch from start_after - now())::float as wait from jobs.job
           where name = 'letters' and state = 'retry'`,
        )
      ).rows[0]
    const first = await waitUntil(readJob, (job) => job !== undefined)
    expect(first?.wait).toBeGreaterThan(3)
    await app.client.pool.query(`update jobs.job set retry_count = 5, start_after = now() where name = 'letters'`)
    const later = await waitUntil(readJob, (job) => job !== undefined && job.tries > 5 && job.wait > 0)
    expect(later?.wait).toBeGreaterThan(100)
  })
})

describe('a letter that cannot be sent', () => {
  it('is given up after its last try, and its job with it', async () => {
    await mail.pause()
    await queue('Hopeless')
    const [row] = await listRows()
    const tries = queues.letters.retryLimit + 1
    for (let attempt = 1; attempt < tries; attempt++) {
      await expect(deliverLetter(delivery(), row!.id)).rejects.toThrow()
    }
    await deliverLetter(delivery(), row!.id)
    expect((await listRows())[0]).toMatchObject({ status: 'dead', attempts: tries })
    await mail.resume()
    await deliverLetter(delivery(), row!.id)
    expect(await mail.list()).toEqual([])
  })
})

describe('a process that ends between sending a letter and noting it', () => {
  it('sends it at most once more, under the same Message-ID', async () => {
    await queue('Twice at most')
    const [row] = await listRows()
    const killed: Mailer = {
      ...mailer,
      send: async (letter) => {
        await mailer.send(letter)
        throw new Error('killed before the answer was noted')
      },
    }
    await expect(deliverLetter({ ...delivery(), mailer: killed }, row!.id)).rejects.toThrow('killed')
    await deliverLetter(delivery(), row!.id)
    await deliverLetter(delivery(), row!.id)
    const ids = (await mail.list()).map(({ messageId }) => messageId)
    expect(ids).toEqual([`${row?.id}@fits.example`, `${row?.id}@fits.example`])
  })
})

describe('the hourly sweep of letters', () => {
  it('gives a letter whose job is gone another one, and leaves those alone that have one', async () => {
    await queue('Stranded')
    await queue('Under way')
    await app.client.pool.query(`update outbox set created_at = now() - interval '1 hour'`)
    const [stranded] = await listRows()
    await app.client.pool.query(`delete from jobs.job where data->>'id' = $1`, [stranded?.id])
    expect(await sweepLetters(app.client.db)).toBe(1)
    expect(await sweepLetters(app.client.db)).toBe(0)
    startWorker()
    await waitUntil(listRows, allSent)
    expect(await mail.list()).toHaveLength(2)
  })

  it('forgets letters a month after they were sent', async () => {
    await queue('Old')
    await queue('New')
    await app.client.pool.query(
      `update outbox set status = 'sent', sent_at = now() - interval '31 days' where subject = 'Old'`,
    )
    await sweepLetters(app.client.db)
    expect((await listRows()).map(({ subject }) => subject)).toEqual(['New'])
  })
})
