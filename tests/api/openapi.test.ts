import { Ajv2020 } from 'ajv/dist/2020.js'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { worksheets } from '../../shared/engine/worksheets/registry'
import { kindKeys } from '../../shared/kinds/index'
import { kindListSchema } from '../../shared/schemas/kinds'
import { startApp, type TestApp } from '../support/app'
import { addHeaters } from './records'

interface Media {
  readonly schema: object
  readonly example?: object
}

interface Operation {
  readonly summary: string
  readonly tags: readonly string[]
  readonly parameters?: readonly { readonly name: string; readonly in: string; readonly required?: boolean }[]
  readonly requestBody?: { readonly content: Record<string, Media> }
  readonly responses: Record<string, { readonly description: string; readonly content?: Record<string, Media> }>
}

interface Document {
  readonly openapi: string
  readonly info: { readonly title: string; readonly version: string }
  readonly paths: Record<string, Record<string, Operation>>
  readonly components: { readonly schemas: Record<string, object> }
}

let app: TestApp
let document: Document
let ajv: Ajv2020

beforeAll(async () => {
  app = await startApp()
  await addHeaters(app.client.db)
  document = (await request(app.url).get('/api/v1/openapi.json').expect(200)).body as Document
  // Formats and examples are OpenAPI's own vocabulary beside JSON Schema 2020-12.
  ajv = new Ajv2020({ strict: false, validateFormats: false })
  ajv.addSchema({ $id: 'https://stillfits.example/openapi', ...document })
})

afterAll(() => app.stop())

const operations = () =>
  Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
  )

const operationsOf = (...tags: string[]) =>
  operations().filter(({ operation }) => tags.includes(operation.tags[0] ?? ''))

/** JSON pointer of a part of the document (RFC 6901), for ajv to resolve references from. */
function pointTo(...parts: string[]): string {
  const escaped = parts.map((part) => encodeURIComponent(part.replaceAll('~', '~0').replaceAll('/', '~1')))
  return `https://stillfits.example/openapi#/${escaped.join('/')}`
}

function expectValid(value: unknown, ...parts: string[]): void {
  const validate = ajv.getSchema(pointTo(...parts))
  expect(validate, parts.join(' ')).toBeDefined()
  expect(validate?.(value), JSON.stringify(validate?.errors?.slice(0, 3))).toBe(true)
}

describe('the OpenAPI document', () => {
  it('is OpenAPI 3.1 and describes every call about gear and setups', () => {
    expect(document.openapi).toBe('3.1.0')
    expect(
      operationsOf('catalogue', 'fit', 'service')
        .map(({ method, path }) => `${method} ${path}`)
        .sort(),
    ).toEqual([
      'get /api/v1/gear',
      'get /api/v1/gear/{slug}',
      'get /api/v1/gear/{slug}/revisions',
      'get /api/v1/gear/{slug}/revisions/{number}',
      'get /api/v1/kinds',
      'get /api/v1/worksheets',
      'get /health',
      'get /ready',
      'post /api/v1/ask',
      'post /api/v1/fit',
      'post /api/v1/fit/check',
      'post /api/v1/replacements',
      'post /api/v1/setups/report',
      ...worksheets.map(({ name }) => `post /api/v1/worksheets/${name}`).sort(),
    ])
  })

  it('describes every call about proposals, their review and the care of gear', () => {
    expect(
      operationsOf('proposals', 'review', 'gear care')
        .map(({ method, path }) => `${method} ${path.replace('/api/v1', '')}`)
        .sort(),
    ).toEqual([
      'delete /proposals/{id}/lease',
      'get /admin/jobs/{id}',
      'get /gear/duplicates',
      'get /gear/{slug}/care',
      'get /gear/{slug}/sources/{key}',
      'get /proposals',
      'get /proposals/{id}',
      'get /proposals/{id}/effects',
      'get /review',
      'get /review/disputes',
      'get /review/reports',
      'get /review/times',
      'patch /proposals/{id}',
      'post /admin/people/{name}/revert',
      'post /disputes/{id}/settle',
      'post /gear/{slug}/confirmations',
      'post /gear/{slug}/merge',
      'post /gear/{slug}/reports',
      'post /gear/{slug}/restore',
      'post /gear/{slug}/retire',
      'post /gear/{slug}/unmerge',
      'post /gear/{slug}/unretire',
      'post /proposals',
      'post /proposals/{id}/decision',
      'post /proposals/{id}/lease',
      'post /proposals/{id}/messages',
      'post /proposals/{id}/submit',
      'post /proposals/{id}/withdraw',
      'post /reports/{id}/settle',
    ])
  })

  it('has a description for every answer, and a parameter for every name in a path', () => {
    for (const { path, operation } of operations()) {
      expect(operation.summary).not.toBe('')
      for (const { description } of Object.values(operation.responses)) expect(description).not.toBe('')
      const names = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name)
      const described = (operation.parameters ?? []).filter((parameter) => parameter.in === 'path')
      expect(described.map(({ name }) => name)).toEqual(names)
      expect(described.every(({ required }) => required)).toBe(true)
    }
  })

  it('refers to nothing that is not there, and every schema compiles', () => {
    const text = JSON.stringify(document)
    const references = new Set(
      [...text.matchAll(/"\$ref":"#\/components\/schemas\/(\w+)"/g)].map(([, name]) => name ?? ''),
    )
    expect(references.size).toBeGreaterThan(5)
    for (const name of references) expect(Object.keys(document.components.schemas)).toContain(name)
    for (const name of Object.keys(document.components.schemas)) {
      expect(ajv.getSchema(pointTo('components', 'schemas', name))).toBeDefined()
    }
  })

  it('gives examples that work and fit their own schemas, as do the answers', async () => {
    const posts = operationsOf('fit').filter(({ method }) => method === 'post')
    expect(posts).toHaveLength(5 + worksheets.length)
    for (const { path, operation } of posts) {
      const example = operation.requestBody?.content['application/json']?.example
      expectValid(example, 'paths', path, 'post', 'requestBody', 'content', 'application/json', 'schema')
      const { body } = await request(app.url).post(path).send(example).expect(200)
      expectValid(body, 'paths', path, 'post', 'responses', '200', 'content', 'application/json', 'schema')
    }
  })

  it('describes the answers to readings', async () => {
    const slug = 'quillmoor-testworks-rod-a'
    for (const { path } of operationsOf('catalogue', 'service').filter(({ method }) => method === 'get')) {
      const { body } = await request(app.url).get(path.replace('{slug}', slug).replace('{number}', '1')).expect(200)
      expectValid(body, 'paths', path, 'get', 'responses', '200', 'content', 'application/json', 'schema')
    }
  })

  it('describes problems', async () => {
    const { body } = await request(app.url)
      .get('/api/v1/gear?kind=spoon')
      .buffer(true)
      .parse((res, done) => {
        let text = ''
        res.on('data', (part: Buffer) => (text += part.toString()))
        res.on('end', () => done(null, JSON.parse(text)))
      })
    expectValid(body, 'components', 'schemas', 'Problem')
  })

  it('refuses in its schemas what the API refuses', () => {
    const schema = ['paths', '/api/v1/fit', 'post', 'requestBody', 'content', 'application/json', 'schema']
    const validate = ajv.getSchema(pointTo(...schema))
    for (const body of [{}, { setup: {}, kind: 'heater' }, { setup: { tank: { wallMm: -1 } }, kind: 'heater' }]) {
      expect(validate?.(body), JSON.stringify(body)).toBe(false)
    }
    expect(validate?.({ setup: { tank: { volumeL: 75 } }, kind: 'heater', wish: 1 })).toBe(false)
    expect(validate?.({ setup: { tank: { volumeL: 75 } }, kind: 'heater' })).toBe(true)
  })
})

describe('GET /api/v1/kinds', () => {
  it('publishes every kind with a JSON Schema, and the checks that read each attribute', async () => {
    const response = await request(app.url).get('/api/v1/kinds').expect(200)
    const { items } = kindListSchema.parse(response.body)
    expect(items.map(({ key }) => key)).toEqual([...kindKeys])
    const heater = items.find(({ key }) => key === 'heater')
    expect(heater?.attributes.find(({ key }) => key === 'lengthMm')?.checks).toContain('heater.space')
    for (const { attributes, checks, jsonSchema } of items) {
      const keys = attributes.map(({ key }) => key)
      const { $schema: _, ...schema } = jsonSchema
      expect(Object.keys(schema.properties ?? {})).toEqual(keys)
      expect(ajv.compile(schema)({ unheardOf: 1 })).toBe(false)
      const ids = checks.map(({ id }) => id)
      for (const id of attributes.flatMap((attribute) => attribute.checks ?? [])) expect(ids).toContain(id)
    }
  })

  it('answers 304 to whoever has it', async () => {
    const { headers } = await request(app.url).get('/api/v1/kinds')
    await request(app.url)
      .get('/api/v1/kinds')
      .set('If-None-Match', headers.etag ?? '')
      .expect(304)
  })
})
