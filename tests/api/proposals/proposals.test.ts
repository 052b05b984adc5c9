import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { proposalListSchema, proposalSchema } from '../../../shared/schemas/proposals'
import { expectProblem, listPointers } from '../problems'
import { addHeater, draft, measured, propose, send, startDesk, type Desk } from './proposing'

let desk: Desk

beforeAll(async () => {
  desk = await startDesk()
})

afterAll(() => desk.stop())

const newPiece = { kind: 'heater', identity: { brand: 'Quillmoor Testworks', model: 'Fresh Rod' } }

describe('writing a proposal', () => {
  it('keeps a draft with its version as ETag, which its author alone reads', async () => {
    const body = { ...newPiece, values: { powerW: { ...measured(150), raw: '150 watts' } } }
    const response = await send(desk, desk.member, 'post', '/proposals', { body }).expect(201)
    expect(response.headers).toMatchObject({ etag: '"v1"', 'cache-control': 'private, no-store' })
    const proposal = proposalSchema.parse(response.body)
    expect(proposal).toMatchObject({ status: 'draft', version: 1, isMine: true, author: 'Nettle Brine' })
    expect(proposal.values).toEqual(body.values)
    expect(proposal.can).toEqual({
      amend: true,
      submit: true,
      withdraw: true,
      say: false,
      lease: false,
      decide: false,
    })
    expect(response.headers.location).toBe(`/api/v1/proposals/${proposal.id}`)
    await send(desk, desk.member, 'get', `/proposals/${proposal.id}`).expect(200)
    expectProblem(await send(desk, desk.moderator, 'get', `/proposals/${proposal.id}`), 404)
    expectProblem(await send(desk, null, 'get', `/proposals/${proposal.id}`), 401)
  })

  it('names every wrong field by its place, and keeps nothing', async () => {
    const before = proposalListSchema.parse((await send(desk, desk.member, 'get', '/proposals')).body).total
    const body = {
      ...newPiece,
      identity: { model: 'Wrong Rod', gtin: '4000000000001' },
      values: {
        powerW: { ...measured('many'), source: 'rumour' },
        lengthMm: { ...measured(240), plusMinus: -1, date: '2999-01-01' },
        form: { ...measured('glass-rod'), plusMinus: 2 },
        wingspanMm: measured(1),
      },
    }
    const problem = expectProblem(await send(desk, desk.member, 'post', '/proposals', { body }), 422)
    expect(listPointers(problem)).toEqual([
      '#/identity/gtin',
      '#/values/lengthMm/date',
      '#/values/lengthMm/plusMinus',
      '#/values/powerW/source',
    ])
    const rest = {
      ...body,
      identity: {},
      values: { powerW: measured('many'), form: body.values.form, wingspanMm: measured(1) },
    }
    expect(
      listPointers(expectProblem(await send(desk, desk.member, 'post', '/proposals', { body: rest }), 422)),
    ).toEqual(['#/values/form/plusMinus', '#/values/powerW/value', '#/values/wingspanMm'])
    const after = proposalListSchema.parse((await send(desk, desk.member, 'get', '/proposals')).body).total
    expect(after).toBe(before)
  })

  it.each([
    'javascript:alert(1)',
    'data:text/html,x',
    'http://example.org/sheet',
    'see ftp://example.org/sheet',
    'https://',
  ])('refuses the evidence link %s', async (evidence) => {
    const body = { ...newPiece, values: { powerW: { ...measured(100), evidence } } }
    const problem = expectProblem(await send(desk, desk.member, 'post', '/proposals', { body }), 422)
    expect(listPointers(problem)).toEqual(['#/values/powerW/evidence'])
  })

  it.each(['Calipers, three readings: 240, 241, 240', 'https://example.org/sheet.pdf'])(
    'takes the evidence %s',
    async (evidence) => {
      const proposal = await draft(desk, { ...newPiece, values: { powerW: { ...measured(100), evidence } } })
      expect(proposal.values.powerW?.evidence).toBe(evidence)
    },
  )

  it('leaves of notes only what cannot run', async () => {
    const notes = '<p>Sturdy <script>alert(1)</script><img src=x onerror=alert(1)><em>rod</em></p>'
    const { identity } = await draft(desk, { ...newPiece, identity: { ...newPiece.identity, notes }, values: {} })
    expect(identity.notes).toBe('<p>Sturdy <em>rod</em></p>')
  })

  it.each(['role', 'status', 'authorId', 'version', 'decidedBy', 'id', 'revision'])(
    'refuses the field %s, which nobody sends, when written and when amended',
    async (field) => {
      const body = { ...newPiece, values: {}, [field]: 1 }
      expect(listPointers(expectProblem(await send(desk, desk.member, 'post', '/proposals', { body }), 422))).toEqual([
        `#/${field}`,
      ])
      const { id, version } = await draft(desk, { ...newPiece, values: {} })
      const patch = { body: { [field]: 'approved' }, version }
      expect(
        listPointers(expectProblem(await send(desk, desk.member, 'patch', `/proposals/${id}`, patch), 422)),
      ).toEqual([`#/${field}`])
      const unchanged = await send(desk, desk.member, 'get', `/proposals/${id}`)
      expect(unchanged.body).toMatchObject({ status: 'draft', version: 1, author: 'Nettle Brine' })
    },
  )

  it('finds by itself what looks unlikely, whatever the form sent along', async () => {
    const slug = await addHeater(desk)
    const { flags } = await propose(desk, slug, { lengthMm: measured(22) }, { flags: [] })
    expect(flags).toEqual([expect.objectContaining({ path: 'lengthMm', value: 22, reason: null })])
    const reason = 'It is a stub for nano tanks'
    const said = await propose(desk, slug, { lengthMm: measured(22) }, { flags: [{ ...flags[0], reason }] })
    expect(said.flags).toEqual([{ ...flags[0], reason }])
  })

  it('answers 415 to anything but JSON, 404 about a piece that is not there, 401 to a visitor', async () => {
    const text = await send(desk, desk.member, 'post', '/proposals').set('Content-Type', 'text/plain').send('{}')
    expectProblem(text, 415)
    const nowhere = { kind: 'heater', gear: 'no-such-piece', baseRevision: 1, values: {} }
    expectProblem(await send(desk, desk.member, 'post', '/proposals', { body: nowhere }), 404)
    expectProblem(await send(desk, null, 'post', '/proposals', { body: newPiece }), 401)
  })
})

describe('changing a proposal', () => {
  it('needs the version that it starts from, and shows the present one where that is old', async () => {
    const { id } = await draft(desk, { ...newPiece, values: {} })
    const body = { summary: 'Measured anew' }
    expectProblem(await send(desk, desk.member, 'patch', `/proposals/${id}`, { body }), 428)
    const amended = await send(desk, desk.member, 'patch', `/proposals/${id}`, { body, version: 1 }).expect(200)
    expect(amended.headers.etag).toBe('"v2"')
    const stale = await send(desk, desk.member, 'patch', `/proposals/${id}`, { body: { summary: 'Older' }, version: 1 })
    expect(expectProblem(stale, 412).current).toMatchObject({ id, version: 2, summary: 'Measured anew' })
    expectProblem(await send(desk, desk.member, 'patch', `/proposals/${id}`, { body, version: 'W/"x"' }), 412)
  })

  it('lets one of 50 changes of the same version through', async () => {
    const { id } = await draft(desk, { ...newPiece, values: {} })
    const changes = Array.from({ length: 50 }, (_, index) =>
      send(desk, desk.member, 'patch', `/proposals/${id}`, { body: { summary: `Change ${index}` }, version: 1 }),
    )
    const statuses = (await Promise.all(changes)).map(({ status }) => status)
    expect(statuses.filter((status) => status === 200)).toHaveLength(1)
    expect(statuses.filter((status) => status === 412)).toHaveLength(49)
    expect((await send(desk, desk.member, 'get', `/proposals/${id}`)).body).toMatchObject({ version: 2 })
  })

  it('is its author’s alone: to others a draft is not there, and what waits is not theirs', async () => {
    const slug = await addHeater(desk)
    const { id, version } = await propose(desk, slug, { powerW: measured(200) })
    const body = { summary: 'Mine now' }
    expectProblem(await send(desk, desk.moderator, 'patch', `/proposals/${id}`, { body, version }), 403)
    expectProblem(await send(desk, desk.moderator, 'post', `/proposals/${id}/withdraw`, { version }), 403)
    const own = await draft(desk, { ...newPiece, values: {} }, desk.moderator)
    expectProblem(await send(desk, desk.member, 'patch', `/proposals/${own.id}`, { body, version: 1 }), 404)
  })
})

describe('sending a proposal in', () => {
  it('names what a new piece still lacks, and what contradicts itself', async () => {
    const unnamed = await draft(desk, { kind: 'heater', values: {} })
    const path = `/proposals/${unnamed.id}/submit`
    const problem = expectProblem(await send(desk, desk.member, 'post', path, { version: 1 }), 422)
    expect(listPointers(problem)).toEqual(['#/identity/brand', '#/identity/model'])
    const slug = await addHeater(desk)
    const empty = await draft(desk, { kind: 'heater', gear: slug, baseRevision: 1, values: {} })
    const refused = await send(desk, desk.member, 'post', `/proposals/${empty.id}/submit`, { version: 1 })
    expect(listPointers(expectProblem(refused, 422))).toEqual(['#/values'])
  })

  it('keeps its place in the queue when amended, with a new version', async () => {
    const slug = await addHeater(desk)
    const pending = await propose(desk, slug, { powerW: measured(200) })
    const body = { values: { powerW: measured(250) } }
    const response = await send(desk, desk.member, 'patch', `/proposals/${pending.id}`, {
      body,
      version: pending.version,
    })
    const amended = proposalSchema.parse(response.body)
    expect(amended).toMatchObject({ status: 'pending', submittedAt: pending.submittedAt, version: pending.version + 1 })
    expect(amended.messages.map(({ kind }) => kind)).toEqual(['submitted', 'amended'])
  })

  it('lists mine by status, page by page', async () => {
    const { id, version } = await draft(desk, { ...newPiece, values: {} })
    await send(desk, desk.member, 'post', `/proposals/${id}/withdraw`, { version }).expect(200)
    const list = proposalListSchema.parse((await send(desk, desk.member, 'get', '/proposals?status=withdrawn')).body)
    expect(list.items.map((item) => item.id)).toEqual([id])
    expectProblem(await send(desk, desk.member, 'get', '/proposals?status=lost'), 422)
    for (let index = 0; index < 21; index += 1) await draft(desk, { ...newPiece, values: {} }, desk.admin)
    const seen: string[] = []
    for (let cursor: string | null = ''; cursor !== null;) {
      const query = cursor === '' ? '' : `?cursor=${cursor}`
      const page = proposalListSchema.parse(
        (await send(desk, desk.admin, 'get', `/proposals${query}`).expect(200)).body,
      )
      seen.push(...page.items.map((item) => item.id))
      cursor = page.next
    }
    expect(new Set(seen).size).toBe(21)
    expect(seen).toHaveLength(21)
  })

  it('lets author and moderator talk, and tells the author of it by letter', async () => {
    const slug = await addHeater(desk)
    const { id } = await propose(desk, slug, { powerW: measured(200) })
    const body = { words: 'Which side of the cap\ndid you measure?' }
    const response = await send(desk, desk.moderator, 'post', `/proposals/${id}/messages`, { body }).expect(201)
    expect(proposalSchema.parse(response.body).messages.at(-1)).toMatchObject({
      kind: 'message',
      author: 'Quill Sounding',
      ...body,
    })
    const { rows } = await desk.client.pool.query(
      `select recipient, text_body from outbox where kind = 'proposal.message'`,
    )
    expect(rows).toEqual([{ recipient: 'member@example.org', text_body: expect.stringContaining(`/proposals/${id}`) }])
    const foreign = await draft(desk, { ...newPiece, values: {} }, desk.admin)
    expectProblem(await send(desk, desk.member, 'post', `/proposals/${foreign.id}/messages`, { body }), 404)
  })
})
