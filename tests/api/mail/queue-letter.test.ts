import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { queueLetter } from '../../../server/modules/mail/mail.service'
import { startApp, type TestApp } from '../../support/app'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

const letter = {
  recipient: 'reader@example.org',
  kind: 'test.letter',
  subject: 'A letter',
  textBody: 'Text',
  htmlBody: '<p>Text</p>',
}

async function count(): Promise<{ letters: number; jobs: number }> {
  const { rows } = await app.client.pool.query<{ letters: number; jobs: number }>(`
    select (select count(*)::int from outbox where kind = 'test.letter') as letters,
      (select count(*)::int from jobs.job j join outbox o on j.data->>'id' = o.id::text where o.kind = 'test.letter') as jobs`)
  return rows[0]!
}

describe('queueing a letter', () => {
  it('keeps neither the letter nor its job when what it tells of is rolled back', async () => {
    const failed = app.client.db.transaction(async (tx) => {
      await queueLetter(tx, letter)
      throw new Error('the change failed')
    })
    await expect(failed).rejects.toThrow('the change failed')
    expect(await count()).toEqual({ letters: 0, jobs: 0 })
  })

  it('keeps the letter and one job for it when the change is committed', async () => {
    await app.client.db.transaction((tx) => queueLetter(tx, letter))
    expect(await count()).toEqual({ letters: 1, jobs: 1 })
  })
})
