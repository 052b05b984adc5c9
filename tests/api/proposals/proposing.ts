import { randomUUID } from 'node:crypto'
import request from 'supertest'
import { expect } from 'vitest'
import { proposalSchema, type Proposal } from '../../../shared/schemas/proposals'
import { defaultRateLimits } from '../../../server/http/rate-limits'
import { importPieces } from '../../../server/modules/gear/gear-writes.service'
import { startApp, type TestApp } from '../../support/app'
import { signIn, type SignedInHeaders } from '../../support/sign-in'
import { describePiece, wholeHeater } from '../records'

export interface Desk extends TestApp {
  readonly member: SignedInHeaders
  readonly moderator: SignedInHeaders
  readonly admin: SignedInHeaders
}

const roomyLimits = { ...defaultRateLimits, writesPerHour: 5000, proposalsPerHour: 5000 }

/** The app with its three demo people signed in. */
export async function startDesk(): Promise<Desk> {
  const app = await startApp({ app: { rateLimits: roomyLimits } })
  const member = await signIn(app, 'member')
  const moderator = await signIn(app, 'moderator')
  const admin = await signIn(app, 'admin')
  return { ...app, member, moderator, admin }
}

let models = 0

/** A heater of its own for a test; answers its slug. */
export async function addHeater({ client }: Desk, values = wholeHeater): Promise<string> {
  models += 1
  await importPieces(client.db, [describePiece(`Bench ${models}`, values)])
  return `quillmoor-testworks-bench-${models}`
}

type Source = 'measured' | 'maker' | 'estimate'

export const measured = (value: unknown, source: Source = 'measured') => ({ value, source, date: '2025-06-01' })

/** Sends a request as somebody; `version` goes as If-Match. */
export function send(
  desk: Desk,
  who: SignedInHeaders | null,
  method: 'get' | 'post' | 'patch' | 'delete',
  path: string,
  { body, version }: { readonly body?: object; readonly version?: number | string } = {},
) {
  const agent = request(desk.url)
  const call = agent[method](`/api/v1${path}`).set(who ?? {})
  if (path === '/proposals' && method === 'post') void call.set('Idempotency-Key', randomUUID())
  if (version !== undefined) void call.set('If-Match', typeof version === 'string' ? version : `"v${version}"`)
  return body === undefined ? call : call.send(body)
}

export async function draft(desk: Desk, body: object, who = desk.member): Promise<Proposal> {
  return proposalSchema.parse((await send(desk, who, 'post', '/proposals', { body }).expect(201)).body)
}

export async function submit(desk: Desk, { id, version }: Proposal, who = desk.member): Promise<Proposal> {
  return proposalSchema.parse((await send(desk, who, 'post', `/proposals/${id}/submit`, { version }).expect(200)).body)
}

/** A change of one piece's values, sent in. */
export async function propose(desk: Desk, gear: string, values: object, more: object = {}, who = desk.member) {
  const { revision } = (await send(desk, null, 'get', `/gear/${gear}`).expect(200)).body as { revision: number }
  return submit(desk, await draft(desk, { kind: 'heater', gear, baseRevision: revision, values, ...more }, who), who)
}

export async function decide(desk: Desk, { id, version }: Proposal, body: object, who = desk.moderator) {
  return send(desk, who, 'post', `/proposals/${id}/decision`, { body, version })
}

export async function approve(desk: Desk, proposal: Proposal, who = desk.moderator): Promise<Proposal> {
  const response = await decide(desk, proposal, { decision: 'approve' }, who)
  expect(response.status, JSON.stringify(response.body)).toBe(200)
  return proposalSchema.parse(response.body)
}

/** How many rows each table holds that a decision writes to. */
export async function countRows({ client }: Desk): Promise<Record<string, number>> {
  const tables = ['gear', 'gear_revisions', 'gear_values', 'audit_events', 'proposal_messages', 'outbox']
  const { rows } = await client.pool.query<Record<string, string>>(
    `select ${tables.map((table) => `(select count(*) from ${table}) as ${table}`).join(', ')}`,
  )
  return Object.fromEntries(Object.entries(rows[0] ?? {}).map(([table, total]) => [table, Number(total)]))
}
