import request from 'supertest'
import type { ProposalStatus } from '../../../server/db/schema/proposals'
import { startApp, type TestApp } from '../../support/app'
import { startTestFiles, type TestFiles } from '../../support/fakes'
import { findDemoPerson, signIn, type SignedInHeaders } from '../../support/sign-in'

export interface EvidenceApp extends TestApp {
  readonly files: TestFiles
  readonly member: SignedInHeaders
  readonly moderator: SignedInHeaders
}

/** The app with a stand-in for the object store, and two people who are signed in. */
export async function startEvidenceApp(): Promise<EvidenceApp> {
  const files = await startTestFiles()
  const app = await startApp({ app: { files: files.store } })
  const [member, moderator] = [await signIn(app, 'member'), await signIn(app, 'moderator')]
  return {
    ...app,
    files,
    member,
    moderator,
    async stop() {
      await app.stop()
      await files.stop()
    },
  }
}

/** A proposal of the demo member. */
export async function addProposal(app: TestApp, status: ProposalStatus = 'draft'): Promise<string> {
  const { rows } = await app.client.pool.query<{ id: string }>(
    `insert into proposals (kind, author_id, status, decided_by)
     select 'heater', author.id, $2, case when $2 in ('approved', 'declined') then author.id end
     from people author where lower(author.email) = lower($1) returning id`,
    [findDemoPerson('member').email, status],
  )
  return rows[0]!.id
}

export const upload = (
  app: EvidenceApp,
  proposalId: string,
  content: Buffer,
  filename = 'photo.jpg',
  by = app.member,
) => request(app.url).post(`/api/v1/proposals/${proposalId}/evidence`).set(by).attach('file', content, { filename })

export async function readBytes(app: EvidenceApp, path: string, by: Record<string, string> = {}) {
  return request(app.url)
    .get(path)
    .set(by)
    .buffer(true)
    .parse((res, done) => {
      const chunks: Buffer[] = []
      res.on('data', (chunk: Buffer) => chunks.push(chunk))
      res.on('end', () => done(null, Buffer.concat(chunks)))
    })
}

/** What is left of evidence in the database and in the store. */
export async function countLeft(app: EvidenceApp): Promise<{ rows: number; objects: number; events: number }> {
  const { rows } = await app.client.pool.query<{ rows: number; events: number }>(
    `select (select count(*)::int from evidence_files) as rows,
       (select count(*)::int from audit_events where action like 'evidence.%') as events`,
  )
  return { ...rows[0]!, objects: (await app.files.listKeys()).length }
}

export const publish = (app: TestApp, id: string) =>
  app.client.pool.query('update evidence_files set published_at = now() where id = $1', [id])
