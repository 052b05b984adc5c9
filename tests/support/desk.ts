import { expect, type APIRequestContext, type Browser, type BrowserContext } from '@playwright/test'
import type { Role } from '../../server/db/schema/people'
import { findDemoPerson } from './sign-in'

const ownSite = { 'Sec-Fetch-Site': 'same-origin' }

let said: string[] = []

/** Errors and warnings that browsers opened here told since this was last asked. */
export function takeOutput(): readonly string[] {
  const output = said
  said = []
  return output
}

/** A browser of somebody's own, signed in as the demo person of a role. */
export async function openAs(
  browser: Browser,
  origin: string | undefined,
  role: Role,
  options: object = {},
): Promise<BrowserContext> {
  const context = await browser.newContext({ ...(origin !== undefined && { baseURL: origin }), ...options })
  context.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) said.push(message.text())
  })
  context.on('weberror', (webError) => said.push(`uncaught: ${webError.error().message}`))
  const { email, password } = findDemoPerson(role)
  const answer = await context.request.post('/api/v1/session', { data: { email, password }, headers: ownSite })
  expect(answer.ok(), await answer.text()).toBe(true)
  return context
}

interface Versioned {
  readonly id: string
  readonly etag: string
}

async function write(
  request: APIRequestContext,
  method: 'POST' | 'PATCH',
  path: string,
  data: object | undefined,
  etag?: string,
) {
  const answer = await request.fetch(`/api/v1${path}`, {
    method,
    headers: {
      ...ownSite,
      'Idempotency-Key': crypto.randomUUID(),
      ...(data !== undefined && { 'Content-Type': 'application/json' }),
      ...(etag !== undefined && { 'If-Match': etag }),
    },
    ...(data !== undefined && { data }),
  })
  expect(answer.ok(), `${method} ${path}: ${await answer.text()}`).toBe(true)
  return { body: (await answer.json()) as { id: string }, etag: answer.headers()['etag'] ?? '' }
}

export async function submit(request: APIRequestContext, { id, etag }: Versioned): Promise<Versioned> {
  const sent = await write(request, 'POST', `/proposals/${id}/submit`, undefined, etag)
  return { id, etag: sent.etag }
}

/** Writes a proposal and keeps it to oneself. */
export async function draft(request: APIRequestContext, proposal: object): Promise<Versioned> {
  const { body, etag } = await write(request, 'POST', '/proposals', proposal)
  return { id: body.id, etag }
}

/** Writes a proposal and sends it in. */
export async function propose(request: APIRequestContext, proposal: object): Promise<Versioned> {
  return submit(request, await draft(request, proposal))
}

/** Adds a photo to a draft; resolves to the photo's id. */
export async function attachPhoto(request: APIRequestContext, id: string, photo: Buffer): Promise<string> {
  const answer = await request.post(`/api/v1/proposals/${id}/evidence`, {
    headers: { ...ownSite, 'Idempotency-Key': crypto.randomUUID() },
    multipart: { file: { name: 'rule.jpg', mimeType: 'image/jpeg', buffer: photo } },
  })
  expect(answer.ok(), await answer.text()).toBe(true)
  return ((await answer.json()) as { id: string }).id
}

export async function amend(request: APIRequestContext, id: string, patch: object): Promise<Versioned> {
  const { headers } = await getProposal(request, id)
  const changed = await write(request, 'PATCH', `/proposals/${id}`, patch, headers['etag'])
  return { id, etag: changed.etag }
}

export async function decide(request: APIRequestContext, id: string, decision: object): Promise<void> {
  const { headers } = await getProposal(request, id)
  await write(request, 'POST', `/proposals/${id}/decision`, decision, headers['etag'])
}

async function getProposal(request: APIRequestContext, id: string) {
  const answer = await request.get(`/api/v1/proposals/${id}`)
  expect(answer.ok(), await answer.text()).toBe(true)
  return { headers: answer.headers() }
}

export async function readRevision(request: APIRequestContext, slug: string): Promise<number> {
  const answer = await request.get(`/api/v1/gear/${slug}`)
  return ((await answer.json()) as { revision: number }).revision
}

/** A measured value as a form would send it. */
export const measured = (value: unknown, raw: string, evidence = 'Steel rule, three times.') => ({
  value,
  raw,
  source: 'measured',
  date: '2026-01-15',
  evidence,
})

/** A new invented scraper, approved by a moderator: a piece that no other test reads. Resolves to its slug. */
export async function recordScraper(
  member: APIRequestContext,
  moderator: APIRequestContext,
  model: string,
): Promise<string> {
  const { id } = await propose(member, {
    kind: 'scraper',
    identity: { brand: 'Wrackline', model, status: 'current' },
    values: { form: measured('handheld', 'handheld'), lengthMm: measured(300, '300 mm') },
  })
  await decide(moderator, id, { decision: 'approve' })
  const answer = await moderator.get(`/api/v1/proposals/${id}`)
  const { gear } = (await answer.json()) as { gear: { slug: string } | null }
  expect(gear).not.toBeNull()
  return gear?.slug ?? ''
}

/** Subjects of what an address received, newest first. */
export async function readSubjects(request: APIRequestContext, to: string): Promise<string[]> {
  const { items } = (await (await request.get('/mailroom.json')).json()) as {
    items: { to: string; subject: string }[]
  }
  return items.filter((item) => item.to === to).map(({ subject }) => subject)
}
