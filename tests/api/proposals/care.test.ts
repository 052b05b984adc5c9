import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { gearListSchema, gearSchema } from '../../../shared/schemas/gear'
import { duplicatesSchema, gearCareSchema } from '../../../shared/schemas/review'
import { expectProblem, listPointers } from '../problems'
import { addHeater, approve, measured, propose, send, startDesk, type Desk } from './proposing'

let desk: Desk

beforeAll(async () => {
  desk = await startDesk()
})

afterAll(() => desk.stop())

const readGear = async (slug: string) =>
  gearSchema.parse((await send(desk, null, 'get', `/gear/${slug}`).expect(200)).body)

const words = { words: 'Looked at both boxes' }

const listSlugs = async (query: string) =>
  gearListSchema.parse((await send(desk, null, 'get', `/gear?${query}`)).body).items.map(({ slug }) => slug)

describe('confirming a value', () => {
  it('counts once a person, never for one’s own, and starts anew when the value changes', async () => {
    const slug = await addHeater(desk)
    await approve(desk, await propose(desk, slug, { powerW: measured(200) }))
    const path = `/gear/${slug}/confirmations`
    const body = { key: 'powerW', measured: 201 }
    const first = await send(desk, desk.moderator, 'post', path, { body }).expect(201)
    expect(first.body).toEqual({ key: 'powerW', count: 1 })
    expect((await send(desk, desk.moderator, 'post', path, { body }).expect(200)).body).toEqual({
      key: 'powerW',
      count: 1,
    })
    expectProblem(await send(desk, desk.member, 'post', path, { body }), 403)
    expectProblem(await send(desk, null, 'post', path, { body }), 401)
    expectProblem(await send(desk, desk.admin, 'post', path, { body: { key: 'wingspanMm' } }), 422)
    expectProblem(await send(desk, desk.admin, 'post', path, { body: { key: 'form', measured: 2 } }), 422)
    expectProblem(await send(desk, desk.admin, 'post', '/gear/no-such-piece/confirmations', { body }), 404)
    expect((await readGear(slug)).confirmations).toEqual({ powerW: 1 })
    const care = gearCareSchema.parse((await send(desk, desk.moderator, 'get', `/gear/${slug}/care`)).body)
    expect(care).toMatchObject({
      confirmed: ['powerW'],
      state: 'live',
      can: { confirm: true, merge: true, unmerge: false },
    })
    await approve(desk, await propose(desk, slug, { powerW: measured(210) }))
    expect((await readGear(slug)).confirmations).toEqual({})
    expect((await send(desk, desk.moderator, 'post', path, { body }).expect(201)).body).toEqual({
      key: 'powerW',
      count: 1,
    })
  })
})

describe('reporting what is wrong', () => {
  it('needs no account, and a moderator settles it', async () => {
    const slug = await addHeater(desk)
    const path = `/gear/${slug}/reports`
    const body = { key: 'powerW', words: 'The box says 250 W' }
    await send(desk, null, 'post', path, { body }).expect(201)
    expect(
      listPointers(
        expectProblem(await send(desk, null, 'post', path, { body: { key: 'wingspanMm', words: 'x' } }), 422),
      ),
    ).toEqual(['#/key'])
    expect(
      listPointers(expectProblem(await send(desk, null, 'post', path, { body: { status: 'settled' } }), 422)),
    ).toEqual(['#/status', '#/words'])
    expectProblem(await send(desk, desk.member, 'get', '/review/reports'), 403)
    const { items } = (await send(desk, desk.moderator, 'get', '/review/reports').expect(200)).body as {
      items: { id: string }[]
    }
    expect(items).toEqual([expect.objectContaining({ ...body, author: null, gear: expect.objectContaining({ slug }) })])
    const settle = `/reports/${items[0]?.id}/settle`
    expectProblem(await send(desk, desk.member, 'post', settle, { body: words }), 403)
    await send(desk, desk.moderator, 'post', settle, { body: words }).expect(200)
    expectProblem(await send(desk, desk.moderator, 'post', settle, { body: words }), 409)
    expect((await send(desk, desk.moderator, 'get', '/review/reports')).body).toMatchObject({ items: [] })
  })
})

describe('restoring a revision', () => {
  it('makes it the present state again as a new revision, from the head that was seen', async () => {
    const slug = await addHeater(desk)
    const identity = { model: `Renamed ${slug}` }
    await approve(desk, await propose(desk, slug, { powerW: measured(200), lengthMm: null }, { identity }))
    const path = `/gear/${slug}/restore`
    const body = { revision: 1, words: 'The change was about another piece' }
    expectProblem(await send(desk, desk.moderator, 'post', path, { body }), 428)
    const stale = expectProblem(await send(desk, desk.moderator, 'post', path, { body, version: '"r1.x"' }), 412)
    expect(stale.current).toMatchObject({ slug, revision: 2 })
    expectProblem(await send(desk, desk.member, 'post', path, { body, version: '"r2"' }), 403)
    const etag = (await send(desk, null, 'get', `/gear/${slug}`)).headers.etag ?? ''
    await send(desk, desk.moderator, 'post', path, { body, version: etag }).expect(200)
    const piece = await readGear(slug)
    expect(piece).toMatchObject({ revision: 3, specs: { powerW: 150, lengthMm: 220 } })
    expect(piece.model).not.toBe(identity.model)
    expect(piece.provenance.powerW).toMatchObject({ author: 'tester', revision: 3 })
    expectProblem(await send(desk, desk.moderator, 'post', path, { body, version: '"r3"' }), 409)
    expectProblem(
      await send(desk, desk.moderator, 'post', path, { body: { ...body, revision: 9 }, version: '"r3"' }),
      422,
    )
  })
})

describe('merging and retiring', () => {
  it('leads from the duplicate to the other piece, out of lists and search, until it is undone', async () => {
    const [copy, kept] = [await addHeater(desk), await addHeater(desk)]
    const body = { into: kept, ...words }
    expectProblem(await send(desk, desk.member, 'post', `/gear/${copy}/merge`, { body }), 403)
    expect(
      listPointers(
        expectProblem(
          await send(desk, desk.moderator, 'post', `/gear/${copy}/merge`, { body: { ...body, into: copy } }),
          422,
        ),
      ),
    ).toEqual(['#/into'])
    const merged = await send(desk, desk.moderator, 'post', `/gear/${copy}/merge`, { body }).expect(200)
    expect(merged.body).toMatchObject({ state: 'merged', mergedInto: kept, can: { unmerge: true, merge: false } })
    const moved = await request(desk.url).get(`/api/v1/gear/${copy}`).redirects(0).expect(301)
    expect(moved.headers.location).toBe(`/api/v1/gear/${kept}`)
    expect(await listSlugs(`q=${copy}`)).not.toContain(copy)
    expect(await listSlugs('kind=heater&sort=-updated&limit=100')).not.toContain(copy)
    expectProblem(
      await send(desk, desk.moderator, 'post', `/gear/${kept}/merge`, { body: { into: copy, ...words } }),
      409,
    )
    const late = { kind: 'heater', gear: copy, baseRevision: 1, values: { powerW: measured(1000) } }
    expectProblem(await send(desk, desk.member, 'post', '/proposals', { body: late }), 409)
    await send(desk, desk.moderator, 'post', `/gear/${copy}/unmerge`, { body: words }).expect(200)
    expect(await readGear(copy)).toMatchObject({ slug: copy, revision: 1 })
    expect(await listSlugs('kind=heater&sort=-updated&limit=100')).toContain(copy)
  })

  it('answers 410 with the reason for a retired piece, until it is back', async () => {
    const slug = await addHeater(desk)
    await send(desk, desk.moderator, 'post', `/gear/${slug}/retire`, { body: { words: 'It was never sold' } }).expect(
      200,
    )
    expect(expectProblem(await send(desk, null, 'get', `/gear/${slug}`), 410).detail).toContain('It was never sold')
    expect(await listSlugs(`q=${slug}`)).not.toContain(slug)
    expectProblem(await send(desk, desk.moderator, 'post', `/gear/${slug}/retire`, { body: words }), 409)
    expect((await send(desk, desk.member, 'get', `/gear/${slug}/care`)).body).toMatchObject({
      state: 'retired',
      can: { unretire: false },
    })
    await send(desk, desk.moderator, 'post', `/gear/${slug}/unretire`, { body: words }).expect(200)
    expect((await readGear(slug)).slug).toBe(slug)
  })

  it('ends two opposite merges at once with one of them, not with a lock', async () => {
    const [a, b] = [await addHeater(desk), await addHeater(desk)]
    const answers = await Promise.all([
      send(desk, desk.moderator, 'post', `/gear/${a}/merge`, { body: { into: b, ...words } }),
      send(desk, desk.admin, 'post', `/gear/${b}/merge`, { body: { into: a, ...words } }),
    ])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
  })
})

describe('likely duplicates', () => {
  it('are found by barcode and by name however it is written, the surest first', async () => {
    const slug = await addHeater(desk)
    const { brand, model } = await readGear(slug)
    const query = new URLSearchParams({ kind: 'heater', brand: brand.toUpperCase(), model: model.replace(' ', '-') })
    const { items } = duplicatesSchema.parse(
      (await send(desk, null, 'get', `/gear/duplicates?${query}`).expect(200)).body,
    )
    expect(items[0]).toMatchObject({ slug, match: 'name' })
    expect(items.length).toBeLessThanOrEqual(6)
    expectProblem(await send(desk, null, 'get', '/gear/duplicates?colour=red'), 422)
    const nothing = await send(desk, null, 'get', '/gear/duplicates?brand=Zzyzx&model=Qqqq').expect(200)
    expect(nothing.body).toEqual({ items: [] })
  })
})
