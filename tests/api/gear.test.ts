import pg from 'pg'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import {
  gearListSchema,
  gearSchema,
  revisionListSchema,
  revisionSchema,
  type GearList,
} from '../../shared/schemas/gear'
import { addRevision, createPiece, importPieces } from '../../server/modules/gear/gear-writes.service'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'
import { addHeaters, describePiece, describeRevision, testBrand, wholeHeater } from './records'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
  await addHeaters(app.client.db)
})

afterAll(() => app.stop())

const get = (path: string) => request(app.url).get(path)
const search = (query: Record<string, string>) => get('/api/v1/gear').query({ q: 'quillmoor', ...query })
const modelsOf = (list: GearList) => list.items.map(({ model }) => model)

describe('the gear list', () => {
  it('puts the piece first whose brand and model hold every word, in any order and case', async () => {
    const response = await search({ q: 'ROD b quillmoor' }).expect(200)
    const list = gearListSchema.parse(response.body)
    expect(modelsOf(list)[0]).toBe('Rod B')
    expect(list).toMatchObject({ total: 3, next: null })
    expect(list.items[0]?.specs).toEqual({ ...wholeHeater, lengthMm: 600 })
  })

  it('keeps to one kind', async () => {
    const heaters = gearListSchema.parse((await search({ kind: 'heater' }).expect(200)).body)
    expect(heaters.total).toBe(3)
    const nets = gearListSchema.parse((await search({ kind: 'net' }).expect(200)).body)
    expect(nets).toMatchObject({ items: [], total: 0, next: null })
  })

  it('pages through everything once, by cursor and by the Link header', async () => {
    const seen: string[] = []
    let path: string | undefined = '/api/v1/gear?q=quillmoor&limit=2'
    for (let page = 0; path !== undefined && page < 5; page += 1) {
      const response = await get(path).expect(200)
      const list = gearListSchema.parse(response.body)
      seen.push(...modelsOf(list))
      const link = /^<([^>]+)>; rel="next"$/.exec(response.headers.link ?? '')
      expect(link === null).toBe(list.next === null)
      if (link !== null) expect(new URL(link[1] ?? '', app.url).searchParams.get('cursor')).toBe(list.next)
      path = link?.[1]
    }
    expect(seen).toEqual(['Rod A', 'Rod B', 'Rod C'])
  })

  it('pages the newest first without losing pieces that share a moment', async () => {
    const first = gearListSchema.parse((await search({ sort: '-updated', limit: '2' }).expect(200)).body)
    const rest = await search({ sort: '-updated', limit: '2', cursor: first.next ?? '' }).expect(200)
    expect([...modelsOf(first), ...modelsOf(gearListSchema.parse(rest.body))]).toEqual(['Rod C', 'Rod B', 'Rod A'])
  })

  it('treats the signs of patterns as plain text', async () => {
    for (const q of ['%', '_', '\\', "'", '; drop table gear']) {
      const alone = gearListSchema.parse((await get('/api/v1/gear').query({ q }).expect(200)).body)
      expect(alone.total).toBe(0)
      expect(alone.hint).toMatch(/letter or digit|Nothing in the catalogue/)
    }
  })

  it('names every wrong query key in one answer', async () => {
    const response = await get('/api/v1/gear?kind=spoon&sort=colour&limit=9999&q=&colour=red&cursor=x')
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/colour', '#/kind', '#/limit', '#/q', '#/sort'])
  })

  it.each(['0', '-1', '1.5', 'NaN', '1e2', '9'.repeat(400)])('refuses the limit %s', async (limit) => {
    expect(listPointers(expectProblem(await search({ limit }), 422))).toEqual(['#/limit'])
  })

  it('refuses a search of 10 000 characters, and one with a NUL', async () => {
    expect(listPointers(expectProblem(await search({ q: 'x'.repeat(10_000) }), 422))).toEqual(['#/q'])
    expect(listPointers(expectProblem(await get('/api/v1/gear?q=a%00b'), 422))).toEqual(['#/q'])
  })

  it('names a key that is given twice', async () => {
    const problem = expectProblem(await get('/api/v1/gear?kind=heater&kind=net&q=a&q=b'), 422)
    expect(listPointers(problem)).toEqual(['#/kind', '#/q'])
  })

  it('refuses cursors that were made up, damaged, or come from another question', async () => {
    const { next } = gearListSchema.parse((await search({ limit: '1' })).body)
    const cursor = next ?? ''
    const payload = Buffer.from(JSON.stringify({ sort: 'name', brand: '', model: '', id: 1 })).toString('base64url')
    const forged = ['x', '.', '..', payload, `${payload}.`, `${payload}.abc`, `${cursor}x`, cursor.slice(1), 'ü']
    for (const each of forged) {
      expect(listPointers(expectProblem(await search({ limit: '1', cursor: each }), 422))).toEqual(['#/cursor'])
    }
    const elsewhere = await search({ limit: '1', cursor, kind: 'heater' })
    expect(listPointers(expectProblem(elsewhere, 422))).toEqual(['#/cursor'])
    await search({ limit: '1', cursor }).expect(200)
  })

  it('answers 304 to whoever has it already, and 200 again after a change', async () => {
    const first = await search({}).expect(200)
    const { etag } = first.headers
    expect(etag).toMatch(/^"[\w-]+"$/)
    const again = await search({})
      .set('If-None-Match', etag ?? '')
      .expect(304)
    expect(again.text).toBe('')
    await importPieces(app.client.db, [describePiece('Rod D', wholeHeater)])
    await search({})
      .set('If-None-Match', etag ?? '')
      .expect(200)
  })
})

describe('a piece of gear', () => {
  const path = '/api/v1/gear/quillmoor-testworks-history'
  const piece = describePiece(
    'History',
    { powerW: 100 },
    {
      notes: '<p onclick="x()">Plain <script>alert(1)</script><a href="javascript:x">link</a><svg></svg></p>',
      revisions: [
        describeRevision({ powerW: 100, lengthMm: 240, diameterMm: 24 }, { date: '2024-05-01' }),
        {
          date: '2024-08-02',
          author: 'second tester',
          summary: 'Measured the length again',
          values: {
            lengthMm: { value: 238.5, source: 'measured', plusMinus: 0.5, evidence: 'calipers' },
            diameterMm: null,
          },
        },
      ],
    },
  )

  beforeAll(async () => {
    await createPiece(app.client.db, piece)
  })

  it('gives bare values beside what backs each of them', async () => {
    const gear = gearSchema.strict().parse((await get(path).expect(200)).body)
    expect(gear).toMatchObject({ kind: 'heater', brand: testBrand, model: 'History', status: 'current', revision: 2 })
    expect(gear.specs).toEqual({ powerW: 100, lengthMm: 238.5 })
    expect(gear.provenance).toEqual({
      powerW: { source: 'measured', date: '2024-05-01', author: 'tester', revision: 1 },
      lengthMm: {
        source: 'measured',
        plusMinus: 0.5,
        evidence: 'calipers',
        date: '2024-08-02',
        author: 'second tester',
        revision: 2,
      },
    })
  })

  it('keeps nothing of its notes that could run', async () => {
    const { notes } = gearSchema.parse((await get(path)).body)
    expect(notes).toBe('<p>Plain <a rel="nofollow ugc noopener">link</a></p>')
  })

  it('lists its revisions, newest first, with the keys that each changed', async () => {
    const { items } = revisionListSchema.strict().parse((await get(`${path}/revisions`).expect(200)).body)
    expect(items.map(({ number, changed }) => [number, changed])).toEqual([
      [2, ['diameterMm', 'lengthMm']],
      [1, ['diameterMm', 'lengthMm', 'powerW']],
    ])
    expect(items[0]?.summary).toBe('Measured the length again')
  })

  it('keeps every earlier state whole', async () => {
    const first = revisionSchema.strict().parse((await get(`${path}/revisions/1`).expect(200)).body)
    expect(first.specs).toEqual({ powerW: 100, lengthMm: 240, diameterMm: 24 })
    expect(Object.keys(first.provenance).sort()).toEqual(['diameterMm', 'lengthMm', 'powerW'])
    const second = revisionSchema.parse((await get(`${path}/revisions/2`).expect(200)).body)
    expect(second.specs).toEqual({ powerW: 100, lengthMm: 238.5 })
    expect(second.provenance.powerW?.revision).toBe(1)
    expect(second.provenance.diameterMm).toBeUndefined()
  })

  it.each(['no-such-piece', '..%2f..%2fetc', 'A B', `${'x'.repeat(10_000)}`, '%00', 'x'.repeat(121)])(
    'answers 404 where there is none: %.20s',
    async (slug) => {
      expectProblem(await get(`/api/v1/gear/${encodeURIComponent(decodeURIComponent(slug))}`), 404)
    },
  )

  it.each(['0', '-1', '3', '1.0', 'one', '99999999999999999999'])('answers 404 for the revision %s', async (number) => {
    expectProblem(await get(`${path}/revisions/${number}`), 404)
  })
})

describe('writing gear', () => {
  it('refuses a revision with every wrong value named, and writes nothing of it', async () => {
    await createPiece(app.client.db, describePiece('Careful', wholeHeater))
    const bad = describeRevision({ powerW: -5, lengthMm: Number.NaN, colour: 'red' }, { date: 'yesterday' })
    const failed = await addRevision(app.client.db, 'quillmoor-testworks-careful', bad).catch((error: unknown) => error)
    const pointers = (failed as { issues: { pointer: string }[] }).issues.map(({ pointer }) => pointer).sort()
    expect(pointers).toEqual(['#/colour', '#/date', '#/lengthMm/value', '#/powerW/value'])
    const { body } = await get('/api/v1/gear/quillmoor-testworks-careful')
    expect(gearSchema.parse(body)).toMatchObject({ revision: 1, specs: wholeHeater })
  })

  it('numbers revisions without a gap when twenty come at once', async () => {
    const slug = await createPiece(app.client.db, describePiece('Busy', { powerW: 100 }))
    const writes = Array.from({ length: 20 }, (_, index) =>
      addRevision(app.client.db, slug, describeRevision({ powerW: 101 + index })),
    )
    const numbers = (await Promise.all(writes)).map(({ number }) => number)
    expect(numbers.sort((a, b) => a - b)).toEqual(Array.from({ length: 20 }, (_, index) => index + 2))
  })

  it('brings pieces in once, however often it is told to', async () => {
    const piece = describePiece('Again', { powerW: 100 })
    expect(await importPieces(app.client.db, [piece])).toEqual({ created: 1, extended: 0, unchanged: 0 })
    expect(await importPieces(app.client.db, [piece])).toEqual({ created: 0, extended: 0, unchanged: 1 })
    const longer = { ...piece, revisions: [...piece.revisions, describeRevision({ powerW: 99 })] }
    expect(await importPieces(app.client.db, [longer])).toEqual({ created: 0, extended: 1, unchanged: 0 })
    expect(await importPieces(app.client.db, [piece])).toEqual({ created: 0, extended: 0, unchanged: 1 })
  })

  it('refuses a second piece of the same name or number', async () => {
    // 4006381333931 is GS1's often shown example of an EAN-13 with its check digit (from memory; checked by the schema).
    const piece = describePiece('Twin', { powerW: 100 }, { gtin: '4006381333931' })
    await createPiece(app.client.db, piece)
    await expect(createPiece(app.client.db, piece)).rejects.toMatchObject({ code: 'conflict' })
    const other = { ...piece, model: 'Twin Two' }
    await expect(createPiece(app.client.db, other)).rejects.toMatchObject({ code: 'conflict', message: /GTIN/ })
  })

  it('brings in all of a list or nothing of it', async () => {
    const list = [describePiece('Half One', { powerW: 100 }), describePiece('Half Two', { powerW: 1e9 })]
    await expect(importPieces(app.client.db, list)).rejects.toMatchObject({ code: 'invalid' })
    expectProblem(await get('/api/v1/gear/quillmoor-testworks-half-one'), 404)
  })
})

describe('the history', () => {
  it.each([
    'UPDATE gear_revisions SET author = author',
    'DELETE FROM gear_revisions',
    'TRUNCATE gear_revisions CASCADE',
    'UPDATE gear_values SET value = value',
    'DELETE FROM gear_values',
    'TRUNCATE gear_values',
    'TRUNCATE gear CASCADE',
  ])('refuses %s, even from the owner of the tables', async (statement) => {
    const owner = new pg.Client({ connectionString: app.database.ownerUrl })
    await owner.connect()
    try {
      await expect(owner.query(statement)).rejects.toThrow(/immutable/)
    } finally {
      await owner.end()
    }
  })
})
