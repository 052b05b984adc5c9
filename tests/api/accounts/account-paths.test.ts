import request from 'supertest'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { meSchema, ownSessionsSchema, sessionSchema } from '../../../shared/schemas/accounts'
import { adminPeopleSchema, personSchema } from '../../../shared/schemas/people'
import { startApp, type TestApp } from '../../support/app'
import { findDemoPerson, signIn } from '../../support/sign-in'

interface Operation {
  readonly 'x-access'?: string
  readonly security?: readonly object[]
}

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

it('describes every call about accounts and people, with who may make it', async () => {
  const { body } = await request(app.url).get('/api/v1/openapi.json').expect(200)
  const { paths } = body as { paths: Record<string, Record<string, Operation>> }
  const about = Object.entries(paths).filter(([path]) => /\/(me|people|session|password-resets)\b/.test(path))
  const calls = about.flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, { 'x-access': access }]) => `${method} ${path} ${access}`),
  )
  expect(calls).toEqual(
    expect.arrayContaining([
      'post /api/v1/people anyone',
      'post /api/v1/people/confirm anyone',
      'get /api/v1/session anyone',
      'post /api/v1/session anyone',
      'delete /api/v1/session anyone',
      'post /api/v1/password-resets anyone',
      'post /api/v1/password-resets/confirm anyone',
      'get /api/v1/me member',
      'patch /api/v1/me member',
      'delete /api/v1/me member',
      'post /api/v1/me/email member',
      'post /api/v1/me/password member',
      'get /api/v1/me/sessions member',
      'delete /api/v1/me/sessions/{id} member',
      'get /api/v1/people/{name} anyone',
      'get /api/v1/admin/people admin',
      'patch /api/v1/admin/people/{name} admin',
    ]),
  )
  expect(paths['/api/v1/me']?.get?.security).toEqual([{ session: [] }])
})

it('answers readings as their schemas say, with nothing beside', async () => {
  const headers = await signIn(app, 'admin')
  const readings = [
    ['/session', sessionSchema],
    ['/me', meSchema],
    ['/me/sessions', ownSessionsSchema],
    [`/people/${encodeURIComponent(findDemoPerson('member').name)}`, personSchema],
    ['/admin/people', adminPeopleSchema],
  ] as const
  for (const [path, schema] of readings) {
    const { body } = await request(app.url).get(`/api/v1${path}`).set(headers).expect(200)
    expect(schema.strict().safeParse(body).error?.issues, path).toBeUndefined()
  }
})
