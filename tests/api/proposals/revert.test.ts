import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { gearSchema } from '../../../shared/schemas/gear'
import { disputeListSchema, longJobSchema } from '../../../shared/schemas/review'
import { effectsSchema } from '../../../shared/schemas/proposals'
import { runTransaction } from '../../../server/db/retry'
import { runLongWork } from '../../../server/modules/revert/revert.service'
import { sql } from 'drizzle-orm'
import { expectProblem, listPointers } from '../problems'
import { addHeater, approve, draft, measured, propose, send, startDesk, submit, type Desk } from './proposing'

let desk: Desk

beforeAll(async () => {
  desk = await startDesk()
})

afterAll(() => desk.stop())

const readGear = async (slug: string) =>
  gearSchema.parse((await send(desk, null, 'get', `/gear/${slug}`).expect(200)).body)

const words = { words: 'All of it was made up' }

describe('reverting one person’s changes', () => {
  it('takes back 120 revisions of 60 pieces, new pieces among them, step by step and as new revisions', async () => {
    const slugs: string[] = []
    for (let index = 0; index < 59; index += 1) slugs.push(await addHeater(desk))
    for (const slug of slugs) {
      await approve(desk, await propose(desk, slug, { powerW: measured(200) }))
      await approve(desk, await propose(desk, slug, { powerW: measured(250), lengthMm: null }))
    }
    const identity = { brand: 'Quillmoor Testworks', model: 'Made Up' }
    await approve(
      desk,
      await submit(desk, await draft(desk, { kind: 'heater', identity, values: { powerW: measured(90) } })),
    )
    const [kept = ''] = slugs
    await approve(desk, await propose(desk, kept, { diameterMm: measured(26) }, {}, desk.moderator), desk.admin)
    await approve(desk, await propose(desk, kept, { diameterMm: measured(27) }))

    const path = '/admin/people/Nettle%20Brine/revert'
    expectProblem(await send(desk, desk.moderator, 'post', path, { body: words }), 403)
    expectProblem(await send(desk, desk.admin, 'post', '/admin/people/Nobody/revert', { body: words }), 404)
    const started = await send(desk, desk.admin, 'post', path, { body: words }).expect(202)
    const job = longJobSchema.parse(started.body)
    expect(job).toMatchObject({ status: 'waiting', done: 0, total: 60 })
    await runLongWork(desk.client.db, { id: job.id })
    const done = longJobSchema.parse((await send(desk, desk.admin, 'get', `/admin/jobs/${job.id}`).expect(200)).body)
    expect(done).toMatchObject({ status: 'done', done: 60, outcome: { changed: 60, skipped: 0 } })
    expectProblem(await send(desk, desk.member, 'get', `/admin/jobs/${job.id}`), 403)

    for (const slug of slugs.slice(1))
      expect(await readGear(slug)).toMatchObject({ revision: 4, specs: { powerW: 150, lengthMm: 220 } })
    expect(await readGear(kept)).toMatchObject({ specs: { powerW: 150, lengthMm: 220, diameterMm: 26 } })
    expect((await readGear(kept)).provenance.diameterMm).toMatchObject({ author: 'Quill Sounding' })
    expectProblem(await send(desk, null, 'get', '/gear/quillmoor-testworks-made-up'), 410)

    await runLongWork(desk.client.db, { id: job.id })
    const { rows } = await desk.client.pool.query(
      `select count(*)::int as total from audit_events where action = 'gear.revert'`,
    )
    expect(rows).toEqual([{ total: 59 }])
  }, 120_000)
})

describe('settling a dispute', () => {
  it('uses the chosen revision’s value from then on, and keeps the other sources', async () => {
    const slug = await addHeater(desk)
    await approve(desk, await propose(desk, slug, { powerW: measured(200) }))
    await approve(desk, await propose(desk, slug, { powerW: measured(150) }, {}, desk.admin))
    const third = await draft(desk, { kind: 'heater', gear: slug, baseRevision: 3, values: { powerW: measured(200) } })
    expectProblem(await send(desk, desk.member, 'post', `/proposals/${third.id}/submit`, { version: 1 }), 409)
    expectProblem(await send(desk, desk.member, 'get', '/review/disputes'), 403)
    const list = disputeListSchema.parse((await send(desk, desk.moderator, 'get', '/review/disputes').expect(200)).body)
    const dispute = list.items.find(({ gear }) => gear.slug === slug)
    expect(dispute).toMatchObject({ key: 'powerW', proposalId: third.id, status: 'open' })
    expect(dispute?.values.map(({ value, revision }) => [revision, value])).toEqual([
      [1, 150],
      [2, 200],
      [3, 150],
    ])
    const path = `/disputes/${dispute?.id}/settle`
    const body = { revision: 2, words: 'The plate says 200 W' }
    expectProblem(await send(desk, desk.member, 'post', path, { body }), 403)
    expect(
      listPointers(
        expectProblem(await send(desk, desk.moderator, 'post', path, { body: { ...body, revision: 9 } }), 422),
      ),
    ).toEqual(['#/revision'])
    const answers = await Promise.all([1, 2, 3, 4].map(() => send(desk, desk.moderator, 'post', path, { body })))
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409])
    const piece = await readGear(slug)
    expect(piece).toMatchObject({ revision: 4, specs: { powerW: 200 }, disputed: [] })
    expect(piece.sources.powerW?.map(({ value, isUsed }) => [value, isUsed])).toEqual([
      [200, true],
      [150, false],
      [150, false],
    ])
    await approve(desk, await propose(desk, slug, { powerW: measured(205) }))
    expect(await readGear(slug)).toMatchObject({ specs: { powerW: 205 } })
  })
})

describe('whose answers would change', () => {
  it('are told before a decision, by judging the piece as it is and as it would be', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { lengthMm: measured(600) })
    const read = async (who = desk.moderator) => send(desk, who, 'get', `/proposals/${proposal.id}/effects`)
    const effects = effectsSchema.parse((await read()).body)
    expect(effects.judged).toBe(3)
    expect(effects.items.length).toBeGreaterThan(0)
    for (const { before, after } of effects.items) expect(before).not.toBe(after)
    const same = await propose(desk, slug, { powerW: measured(150) })
    const none = await send(desk, desk.moderator, 'get', `/proposals/${same.id}/effects`).expect(200)
    expect(none.body).toEqual({ judged: 3, items: [] })
    expectProblem(await send(desk, null, 'get', `/proposals/${proposal.id}/effects`), 401)
  })
})

describe('two transactions that lock each other out', () => {
  it('both end well: the one that PostgreSQL gives up is run again', async () => {
    const [a, b] = [await addHeater(desk), await addHeater(desk)]
    const touch = (first: string, second: string) =>
      runTransaction(desk.client.db, async (tx) => {
        await tx.execute(sql`update gear set notes = ${first} where slug = ${first}`)
        await new Promise((resolve) => setTimeout(resolve, 200))
        await tx.execute(sql`update gear set notes = ${first} where slug = ${second}`)
      })
    await Promise.all([touch(a, b), touch(b, a)])
    const { rows } = await desk.client.pool.query<{ notes: string }>('select notes from gear where slug = any($1)', [
      [a, b],
    ])
    expect(new Set(rows.map(({ notes }) => notes)).size).toBe(1)
  })
})
