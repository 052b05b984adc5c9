import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { gearSchema } from '../../../shared/schemas/gear'
import { queueSchema, waitingTimesSchema } from '../../../shared/schemas/review'
import { expectProblem } from '../problems'
import { addHeater, approve, decide, draft, measured, propose, send, startDesk, submit, type Desk } from './proposing'

let desk: Desk

beforeAll(async () => {
  desk = await startDesk()
})

afterAll(() => desk.stop())

const readQueue = async (query = '') =>
  queueSchema.parse((await send(desk, desk.moderator, 'get', `/review${query}`).expect(200)).body)

const age = (id: string, hours: number) =>
  desk.client.pool.query(`update proposals set submitted_at = now() - $2 * interval '1 hour' where id = $1`, [
    id,
    hours,
  ])

describe('the queue', () => {
  it('lists what waits with age, kind, flags, the author’s record and who holds it', async () => {
    const [first, second] = [await addHeater(desk), await addHeater(desk)]
    await approve(desk, await propose(desk, first, { powerW: measured(160) }))
    const old = await propose(desk, first, { powerW: measured(200) })
    const flagged = await propose(desk, second, { lengthMm: measured(22) })
    const own = await propose(desk, second, { powerW: measured(175) }, {}, desk.moderator)
    const identity = { brand: 'Quillmoor Testworks', model: 'Net One' }
    const net = await submit(desk, await draft(desk, { kind: 'net', identity, values: {} }))
    await age(old.id, 200)
    await age(flagged.id, 30)
    await send(desk, desk.admin, 'post', `/proposals/${old.id}/lease`).expect(200)

    const queue = await readQueue()
    expect(queue).toMatchObject({
      total: 4,
      kinds: [
        { kind: 'heater', count: 3 },
        { kind: 'net', count: 1 },
      ],
      next: null,
    })
    expect(queue.items.map(({ id }) => id)).toEqual([old.id, flagged.id, own.id, net.id])
    expect(queue.items[0]).toMatchObject({
      slug: first,
      author: 'Nettle Brine',
      record: { accepted: 1, declined: 0 },
      lease: { holder: 'Plumb Harbour', isMine: false },
      isBehind: false,
      flags: 0,
    })
    expect(queue.items[1]).toMatchObject({ flags: 1, lease: null })
    expect(queue.items[2]).toMatchObject({ isMine: true, author: 'Quill Sounding' })
    expect(queue.items[3]).toMatchObject({ slug: null, brand: identity.brand, model: identity.model })

    const idsOf = async (query: string) => (await readQueue(query)).items.map(({ id }) => id)
    expect(await idsOf('?kind=net')).toEqual([net.id])
    expect(await idsOf('?age=week')).toEqual([old.id])
    expect(await idsOf('?age=day')).toEqual([old.id, flagged.id])
    expect(await idsOf('?flagged=yes')).toEqual([flagged.id])
    expect(await idsOf('?flagged=no&sort=newest')).toEqual([net.id, own.id, old.id])
    expect((await idsOf('?sort=flagged'))[0]).toBe(flagged.id)
    expect((await idsOf('?sort=newcomers'))[0]).toBe(own.id)
    expectProblem(await send(desk, desk.moderator, 'get', '/review?sort=colour'), 422)
    expectProblem(await send(desk, desk.moderator, 'get', '/review?cursor=x'), 422)
  })

  it('publishes how long people wait, to everybody', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(201) })
    await age(proposal.id, 10)
    await approve(desk, proposal)
    const times = waitingTimesSchema.parse((await send(desk, null, 'get', '/review/times').expect(200)).body)
    expect(times).toMatchObject({ days: 90, decided: 2, waiting: 4 })
    expect(times.hours?.p50).toBeCloseTo(5, 0)
    expect(times.hours?.p95).toBeGreaterThan(9)
    expect(times.oldestAt).not.toBeNull()
  })

  it('asks again who somebody is with each decision: a role that is gone decides nothing', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    await send(desk, desk.moderator, 'get', `/proposals/${proposal.id}`).expect(200)
    const setRole = (role: string) =>
      desk.client.pool.query(`update people set role = $1 where name = 'Quill Sounding'`, [role])
    await setRole('member')
    const answer = await decide(desk, proposal, { decision: 'approve' })
    await setRole('moderator')
    expectProblem(answer, 403)
    const piece = gearSchema.parse((await send(desk, null, 'get', `/gear/${slug}`)).body)
    expect(piece.specs.powerW).toBe(150)
  })
})

describe('files behind a value', () => {
  const addFile = async (proposalId: string | null, name: string) => {
    const { rows } = await desk.client.pool.query<{ id: string }>(
      `insert into evidence_files (proposal_id, uploader_id, kind, content_type, bytes, sha256, storage_key)
        select $1, id, 'photo', 'image/webp', 9, 'x', $2 from people where name = $3 returning id`,
      [proposalId, `${proposalId}${name}${Math.random()}`, name],
    )
    return rows[0]?.id ?? ''
  }

  it('are public with the approved value, and only those', async () => {
    const slug = await addHeater(desk)
    const { id } = await draft(desk, { kind: 'heater', gear: slug, baseRevision: 1, values: {} })
    const [shown, unused, foreign] = [
      await addFile(id, 'Nettle Brine'),
      await addFile(id, 'Nettle Brine'),
      await addFile(null, 'Plumb Harbour'),
    ]
    const wrong = { values: { powerW: { ...measured(200), files: [foreign] } } }
    const refused = expectProblem(
      await send(desk, desk.member, 'patch', `/proposals/${id}`, { body: wrong, version: 1 }),
      422,
    )
    expect(refused.errors?.[0]?.pointer).toBe('#/values/powerW/files/0')
    const body = { values: { powerW: { ...measured(200), files: [shown] } } }
    const { body: amended } = await send(desk, desk.member, 'patch', `/proposals/${id}`, { body, version: 1 }).expect(
      200,
    )
    await approve(desk, await submit(desk, amended as never))
    const { rows } = await desk.client.pool.query('select id from evidence_files where published_at is not null')
    expect(rows).toEqual([{ id: shown }])
    expect(rows).not.toContainEqual({ id: unused })
    const piece = gearSchema.parse((await send(desk, null, 'get', `/gear/${slug}`)).body)
    expect(piece.provenance.powerW?.files).toEqual([expect.objectContaining({ id: shown, kind: 'photo' })])
  })
})
