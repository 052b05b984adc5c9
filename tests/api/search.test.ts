import pg from 'pg'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { importPieces } from '../../server/modules/gear/gear-writes.service'
import { addRevision, createPiece } from '../../server/modules/gear/gear-writes.service'
import { refreshSearchTexts } from '../../server/modules/gear/gear-search.service'
import { gearListSchema, type GearList } from '../../shared/schemas/gear'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'
import { describePiece, describeRevision, wholeHeater } from './records'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

async function search(q: string, more: Record<string, string> = {}): Promise<GearList> {
  const response = await request(app.url)
    .get('/api/v1/gear')
    .query({ q, ...more })
    .expect(200)
  return gearListSchema.strict().parse(response.body)
}

const slugsOf = ({ items }: GearList) => items.map(({ slug }) => slug)

describe('searching the catalogue', () => {
  it.each([
    ['by its name', 'Hearthbrine Ember 100 W'],
    ['with slips of the finger', 'heartbrnie embr 100w'],
    ['in another order', '100 watt ember hearthbrine'],
    ['glued together', 'hearthbrineember100w'],
    ['taken apart', 'hearth brine em ber 100 w'],
    ['in capitals with accents and signs', 'HÉARTHBRINE -- "Ember"; 100W!'],
    ['in letters of full width', 'Ｈｅａｒｔｈｂｒｉｎｅ Ember 100 W'],
    ['with marks that cannot be seen', 'Hearth\u00adbrine\u200b \u202eEmber\u202c 100 W'],
  ])('finds a piece %s', async (_, q) => {
    expect(slugsOf(await search(q))[0]).toBe('hearthbrine-ember-100-w')
  })

  it('finds a piece by its barcode number', async () => {
    await createPiece(app.client.db, describePiece('Barcoded', wholeHeater, { gtin: '4006381333931' }))
    expect(slugsOf(await search('4006381333931'))).toEqual(['quillmoor-testworks-barcoded'])
  })

  it('finds what people call a kind, and the same length in either system', async () => {
    const heads = await search('power heads', { limit: '100' })
    expect(heads.total).toBeGreaterThan(20)
    expect(new Set(heads.items.map(({ kind }) => kind))).toEqual(new Set(['wavemaker']))
    const inches = slugsOf(await search('net 8 in')).sort()
    expect(inches).toContain('wrasselund-scoop-8-in')
    expect(slugsOf(await search('net 20.3 cm')).sort()).toEqual(inches)
  })

  it('keeps to the kind that was chosen', async () => {
    const list = await search('ember', { kind: 'temperature-controller' })
    expect(list.items.every(({ kind }) => kind === 'temperature-controller')).toBe(true)
    expect((await search('net', { kind: 'heater' })).hint).toContain('among the heaters')
  })

  it('finds a new piece at once, and a changed one by its new values', async () => {
    const slug = await createPiece(app.client.db, describePiece('Zephyrine 7', { ...wholeHeater, powerW: 333 }))
    expect(slugsOf(await search('zephirine 7'))).toEqual([slug])
    await addRevision(app.client.db, slug, describeRevision({ powerW: 444 }))
    expect(slugsOf(await search('heater 444 w'))).toEqual([slug])
    expect(slugsOf(await search('heater 333 w'))).toEqual([])
  })

  it('writes anew what an earlier release wrote', async () => {
    const slug = await createPiece(app.client.db, describePiece('Ombrelune 3', wholeHeater))
    const owner = new pg.Client({ connectionString: app.database.ownerUrl })
    await owner.connect()
    await owner.query(
      "UPDATE gear SET search_name = '', search_code = '', search_full_code = '', search_terms = '{}', search_version = 0 WHERE slug = $1",
      [slug],
    )
    await owner.end()
    expect(slugsOf(await search('ombrelune'))).toEqual([])
    expect(await refreshSearchTexts(app.client.db)).toBe(1)
    expect(slugsOf(await search('ombrelune'))).toEqual([slug])
    expect(await refreshSearchTexts(app.client.db)).toBe(0)
  })

  it('pages through every answer once, in the order of the whole', async () => {
    const whole = slugsOf(await search('skimer', { limit: '100' }))
    const seen: string[] = []
    for (let cursor: string | null = '', pages = 0; cursor !== null && pages < 20; pages += 1) {
      const list: GearList = await search('skimer', { limit: '7', ...(cursor !== '' && { cursor }) })
      seen.push(...slugsOf(list))
      cursor = list.next
    }
    expect(seen).toEqual(whole)
    expect(seen.length).toBeGreaterThan(15)
  })

  it('loses and repeats nothing where a piece comes in between two pages', async () => {
    const first = await search('vantrosse', { limit: '5' })
    await importPieces(app.client.db, [describePiece('Vantrosse lookalike', wholeHeater)])
    const second = await search('vantrosse', { limit: '5', cursor: first.next ?? '' })
    expect(slugsOf(second).filter((slug) => slugsOf(first).includes(slug))).toEqual([])
  })

  it('refuses a cursor of another question', async () => {
    const { next } = await search('heater', { limit: '5' })
    const response = await request(app.url)
      .get('/api/v1/gear')
      .query({ q: 'heaters', limit: '5', cursor: next ?? '' })
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/cursor'])
  })
})

describe('whatever is typed', () => {
  it.each([
    '%',
    '_',
    '\\',
    '%%%%',
    '*',
    "'; DROP TABLE gear; --",
    '½',
    '"',
    '(((((',
    'مضخة',
    'משאבה',
    '\u0301\u0301\u0301',
    '水槽',
    '🐠',
    '\ud83d',
    '1/0',
    '99999999999999999999999999 w',
    'a'.repeat(200),
    'x '.repeat(100).trim(),
    '1 '.repeat(100).trim(),
    'zzzzqqqq',
  ])('answers %j, and explains where there is nothing', async (q) => {
    const list = await search(q)
    if (list.total === 0) expect(list.hint).toMatch(/\w/)
    expect(list.items.length).toBeLessThanOrEqual(list.total)
  })

  it.each(['a', 's', '4', 'é', 't1', 'xl'])('answers %j with what begins so or has it as a word', async (q) => {
    const list = await search(q)
    if (list.total === 0) expect(list.hint).toContain('Type a few more letters')
  })

  it.each([
    ['nothing', ''],
    ['blanks', '   '],
    ['a NUL', 'a\0b'],
    ['10 000 characters', 'x'.repeat(10_000)],
  ])('refuses %s by its key', async (_, q) => {
    const response = await request(app.url).get('/api/v1/gear').query({ q })
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/q'])
  })

  it('says when only the first words were looked for', async () => {
    const list = await search(`hearthbrine ember 100 w ${'ember '.repeat(20)}`)
    expect(list.hint).toContain('first words')
    expect(list.total).toBeGreaterThan(0)
  })
})

describe('the way of the database', () => {
  it.each([
    ['names', `SELECT id FROM gear WHERE 'hearthbrin ember' <% search_name`, 'gear_search_name_idx'],
    [
      'terms',
      `SELECT id FROM gear WHERE search_terms && '{100w,98w}' AND search_terms && '{kind:heater}'`,
      'gear_search_terms_idx',
    ],
    [
      'codes',
      `SELECT id FROM gear WHERE search_code = 'ember100w' OR search_code LIKE 'ember100w%'`,
      'gear_search_code_idx',
    ],
    ['codes with brands', `SELECT id FROM gear WHERE search_full_code LIKE 'hearth%'`, 'gear_search_full_code_idx'],
  ])('to %s is an index', async (_, statement, index) => {
    const client = new pg.Client({ connectionString: app.database.databaseUrl })
    await client.connect()
    try {
      // The demo catalogue fits a few pages, where reading all of it is cheaper: this asks whether the index can serve.
      await client.query('SET enable_seqscan = off')
      const { rows } = await client.query<{ 'QUERY PLAN': string }>(`EXPLAIN ${statement}`)
      expect(rows.map((row) => row['QUERY PLAN']).join('\n')).toContain(index)
    } finally {
      await client.end()
    }
  })
})
