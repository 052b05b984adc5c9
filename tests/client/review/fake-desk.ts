import type { ApiInit } from '../../../src/lib/api-client'
import type { Proposal } from '#shared/schemas/proposals'

const problem = (status: number, detail: string, more: object = {}) =>
  json(status, { type: 't', title: 'Refused', status, detail, instance: '/', requestId: 'r', ...more })

export function json(status: number, body: unknown, headers: Record<string, string> = {}): Response {
  const text = status === 204 ? null : JSON.stringify(body)
  return new Response(text, { status, headers: { 'Content-Type': 'application/json', ...headers } })
}

const rights = { amend: false, submit: false, withdraw: false, say: true, lease: true, decide: true }

/** An invented change of an invented heater: a length that its author calls right, and a conflict about its power. */
export const proposal: Proposal = {
  id: '11111111-1111-4111-8111-111111111111',
  kind: 'heater',
  gear: { slug: 'invented-short-100', brand: 'Invented', model: 'Short 100', revision: 4 },
  brand: 'Invented',
  model: 'Short 100',
  status: 'pending',
  changed: ['lengthMm', 'powerW'],
  summary: 'Measured with calipers',
  submittedAt: '2026-01-01T10:00:00.000Z',
  decidedAt: null,
  updatedAt: '2026-01-01T10:00:00.000Z',
  words: null,
  version: 2,
  author: 'Inventa Ruler',
  isMine: false,
  record: { accepted: 3, declined: 1 },
  baseRevision: 3,
  identityNow: { brand: 'Invented', model: 'Short 100', status: 'current', gtin: null, notes: null },
  identity: {},
  values: {
    lengthMm: { value: 254, raw: '10 in', source: 'measured', date: '2025-12-30', evidence: 'https://example.org/l' },
    powerW: { value: 120, source: 'maker', date: '2025-12-30' },
  },
  fields: {
    lengthMm: {
      base: { value: 250, source: 'maker', date: '2024-01-01', author: 'Catalogue', revision: 1 },
      now: { value: 250, source: 'maker', date: '2024-01-01', author: 'Catalogue', revision: 1 },
      proposed: { value: 254, raw: '10 in', source: 'measured', date: '2025-12-30', evidence: 'https://example.org/l' },
      state: 'change',
    },
    powerW: {
      base: { value: 100, source: 'maker', date: '2024-01-01', author: 'Catalogue', revision: 1 },
      now: { value: 110, source: 'measured', date: '2025-12-31', author: 'Other Person', revision: 4 },
      proposed: { value: 120, source: 'maker', date: '2025-12-30' },
      state: 'conflict',
    },
  },
  conflicts: ['powerW'],
  flags: [{ path: 'lengthMm', rule: 'usual', value: 254, reason: 'I measured it twice.' }],
  files: [],
  messages: [],
  lease: null,
  decision: null,
  revision: null,
  createdAt: '2026-01-01T09:00:00.000Z',
  can: rights,
}

/** A second one, with a single value, that waits too. */
export const second: Proposal = {
  ...proposal,
  id: '22222222-2222-4222-8222-222222222222',
  model: 'Long 200',
  changed: ['lengthMm'],
  values: { lengthMm: proposal.values.lengthMm! },
  fields: { lengthMm: proposal.fields.lengthMm! },
  conflicts: [],
  flags: [],
}

export const moderator = {
  name: 'Invented Moderator',
  role: 'moderator',
  email: 'moderator@example.org',
  isConfirmed: true,
  can: { contribute: true, review: true, administer: false },
}

export interface Sent {
  readonly method: string
  readonly path: string
  readonly body: unknown
  readonly ifMatch: string | undefined
}

type Answer = (sent: Sent) => Response | undefined

/** Answers as the API does about two proposals; `answer` comes first, to be quicker, to refuse or to fail. */
export function createFakeDesk(answer: Answer = () => undefined) {
  const proposals = new Map([proposal, second].map((one) => [one.id, one]))
  const sent: Sent[] = []
  const change = (id: string, changed: Partial<Proposal>) => {
    const before = proposals.get(id)
    if (before) proposals.set(id, { ...before, ...changed, version: before.version + 1 })
  }
  const toItem = (one: Proposal) => ({
    ...one,
    slug: one.gear?.slug ?? null,
    flags: one.flags.length,
    isBehind: one.conflicts.length > 0,
  })
  const respond = ({ method, path, body }: Sent): Response => {
    const url = new URL(path, 'http://desk.invalid')
    const [, , , , id = '', step] = url.pathname.split('/')
    const one = proposals.get(id)
    if (url.pathname === '/api/v1/session') return json(200, { person: moderator })
    if (url.pathname === '/api/v1/review') {
      const kind = url.searchParams.get('kind')
      const items = [...proposals.values()].filter(
        ({ status, kind: own }) => status === 'pending' && (kind ?? own) === own,
      )
      return json(200, {
        items: items.map(toItem),
        total: items.length,
        kinds: [{ kind: 'heater', count: items.length }],
        next: null,
      })
    }
    if (url.pathname === '/api/v1/review/times')
      return json(200, {
        days: 90,
        decided: 41,
        hours: { p50: 5, p75: 20, p95: 72 },
        waiting: 2,
        oldestAt: proposal.submittedAt,
      })
    if (one && step === undefined) return json(200, one, { ETag: `"v${one.version}"` })
    if (one && step === 'effects')
      return json(200, {
        judged: 6,
        items: [{ origin: 'demo', question: 'A heater for a small chamber', before: 'fits', after: 'no' }],
      })
    if (one && step === 'lease') {
      const until = new Date(Date.now() + 15 * 60_000).toISOString()
      change(id, { lease: method === 'POST' ? { holder: 'Quill Sounding', isMine: true, until } : null })
      return json(200, proposals.get(id))
    }
    if (one && step === 'decision') {
      const { decision } = body as { decision: string }
      change(id, {
        status: decision === 'approve' ? 'approved' : decision === 'decline' ? 'declined' : 'sent-back',
        revision: decision === 'approve' ? 5 : null,
        can: { ...rights, lease: false, decide: false },
      })
      return json(200, proposals.get(id))
    }
    return problem(404, 'Not here.')
  }
  return {
    sent,
    change,
    fetch: (path: string, init: ApiInit = {}) => {
      const body = init.body === undefined ? null : (JSON.parse(init.body) as unknown)
      const request = { method: init.method ?? 'GET', path, body, ifMatch: init.headers?.['If-Match'] }
      if (request.method !== 'GET') sent.push(request)
      return Promise.resolve(answer(request) ?? respond(request))
    },
  }
}

export { problem }
