import type { Gear } from '#shared/schemas/gear'
import type { Proposal } from '#shared/schemas/proposals'
import type { SignedIn } from '#shared/schemas/accounts'
import type { ApiInit } from '../../../src/lib/api-client'

export interface Asked {
  readonly method: string
  readonly path: string
  readonly headers: Readonly<Record<string, string>>
  readonly body: Record<string, never>
}

export const inventedMember: SignedIn = {
  name: 'Invented Member',
  role: 'member',
  email: 'member@example.org',
  isConfirmed: true,
  can: { contribute: true, review: false, administer: false },
}

const problem = (status: number, title: string, more: object = {}) =>
  new Response(
    JSON.stringify({ type: 't', title, status, detail: `${title}.`, instance: '/', requestId: 'r', ...more }),
    { status },
  )

const json = (body: unknown, status = 200, etag?: string) =>
  new Response(JSON.stringify(body), { status, headers: etag === undefined ? {} : { ETag: etag } })

const everyRight = { amend: true, submit: true, withdraw: true, say: true, lease: false, decide: false }

/** A proposal as the API answers it. */
export function inventProposal(gear: Gear | null, more: Partial<Proposal> = {}): Proposal {
  return {
    id: '0b6f2a86-5f0e-4f6e-9d53-1f2f3a4b5c6d',
    kind: gear?.kind ?? 'heater',
    gear: gear && { slug: gear.slug, brand: gear.brand, model: gear.model, revision: gear.revision },
    brand: gear?.brand ?? null,
    model: gear?.model ?? null,
    status: 'draft',
    changed: [],
    summary: null,
    submittedAt: null,
    decidedAt: null,
    updatedAt: '2026-01-02T03:04:05.000Z',
    words: null,
    version: 1,
    author: inventedMember.name,
    isMine: true,
    record: { accepted: 0, declined: 0 },
    baseRevision: gear?.revision ?? null,
    identityNow: null,
    identity: {},
    values: {},
    fields: {},
    conflicts: [],
    flags: [],
    files: [],
    messages: [],
    lease: null,
    decision: null,
    revision: null,
    createdAt: '2026-01-02T03:04:05.000Z',
    can: everyRight,
    ...more,
  }
}

/** A server of one piece and one proposal, which a test changes under the page. */
export function createFakeRecord(initial: Gear) {
  const asked: Asked[] = []
  const world = {
    gear: initial,
    person: inventedMember as SignedIn | null,
    proposal: null as Proposal | null,
    /** Answers the next write with this instead. */
    refusal: null as (() => Response) | null,
  }

  function write({ method, path, headers, body }: Asked): Response {
    const refused = world.refusal?.()
    world.refusal = null
    if (refused) return refused
    if (world.person === null) return problem(401, 'Sign in first')
    const { gear: _, ...content } = body
    if (path === '/proposals') world.proposal = inventProposal(world.gear, content)
    else if (!world.proposal) return problem(404, 'No such proposal')
    else if (headers['If-Match'] !== `"v${world.proposal.version}"`)
      return problem(412, 'It was changed meanwhile', { current: world.proposal })
    else if (method === 'PATCH') world.proposal = { ...world.proposal, ...body, version: world.proposal.version + 1 }
    else world.proposal = { ...world.proposal, status: 'pending', version: world.proposal.version + 1 }
    return json(world.proposal, 200, `"v${world.proposal.version}"`)
  }

  function answer(path: string, init: ApiInit = {}): Response {
    const call: Asked = {
      method: init.method ?? 'GET',
      path: path.replace('/api/v1', ''),
      headers: init.headers ?? {},
      body: JSON.parse(init.body ?? '{}') as Asked['body'],
    }
    asked.push(call)
    if (call.path === '/session') return json({ person: world.person })
    if (call.method !== 'GET') return write(call)
    if (call.path === `/gear/${world.gear.slug}`) return json(world.gear)
    if (call.path.endsWith('/revisions')) return json({ slug: world.gear.slug, items: [] })
    if (call.path.startsWith('/gear/duplicates')) {
      const { slug, kind, brand, model, gtin } = world.gear
      return json({ items: [{ slug, kind, brand, model, gtin, match: 'name' }] })
    }
    if (call.path.startsWith('/proposals/') && world.proposal)
      return json(world.proposal, 200, `"v${world.proposal.version}"`)
    return problem(404, 'Not here')
  }

  return {
    world,
    asked,
    writes: () => asked.filter(({ method }) => method !== 'GET'),
    fetch: (path: string, init?: ApiInit) => Promise.resolve(answer(path, init)),
  }
}

export const refuseFields = (errors: readonly { pointer: string; detail: string }[]) => () =>
  problem(422, 'Some fields need another look', { errors })
