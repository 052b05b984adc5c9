import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { examples } from '../../server/modules/openapi/examples'
import { questionSchema, type AskAnswer } from '../../shared/schemas/ask'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

const post = (body: unknown) =>
  request(app.url)
    .post('/api/v1/ask')
    .send(body as object)

async function ask(text: string, units?: string): Promise<AskAnswer> {
  const response = await post({ text, ...(units !== undefined && { units }) }).expect(200)
  expect(response.headers['cache-control']).toContain('no-store')
  return questionSchema.strict().parse(response.body)
}

describe('reading a question', () => {
  it('gives kind and setup in canonical units, and the stretches that it read', async () => {
    const answer = await ask(examples.ask.text, 'us')
    expect(answer).toMatchObject({ intent: 'find', kind: 'heater' })
    // 20 US gal of 3.785411784 L; 4, 5 and 12 in of 25.4 mm; (60 − 32) / 1.8 °C.
    const setup = answer.setup as {
      tank: { volumeL: number; chambers: { lengthMm: number; widthMm: number; waterDepthMm: number }[] }
      room: { coldestC: number }
    }
    expect(setup.tank.volumeL).toBeCloseTo(75.708, 3)
    expect(setup.tank.chambers[0]).toMatchObject({ lengthMm: 101.6, widthMm: 127, waterDepthMm: 304.8 })
    expect(setup.room.coldestC).toBeCloseTo(15.556, 3)
    for (const { text, start, end } of answer.understood) expect(examples.ask.text.slice(start, end)).toBe(text)
  })

  it('gives a setup that the fit takes as it is', async () => {
    const { setup, kind } = await ask(examples.ask.text, 'us')
    const fit = await request(app.url).post('/api/v1/fit').send({ setup, kind, limit: 3 }).expect(200)
    expect((fit.body as { answers: unknown[] }).answers).toHaveLength(3)
  })

  it('finds the piece that is named, in the catalogue', async () => {
    const answer = await ask('does the Hearthbrine Ember 100 W fit my 20 gallon?')
    expect(answer).toMatchObject({ intent: 'check', kind: 'heater', gear: { slug: 'hearthbrine-ember-100-w' } })
  })

  it('reads bare numbers in the units that were asked for', async () => {
    const inches = (await ask('tank 24 x 18 x 16', 'us')).setup as { tank: { outerLengthMm: number } }
    expect(inches.tank.outerLengthMm).toBeCloseTo(609.6, 6)
  })

  it.each(['hello there', '???', '水槽加熱器', '\u202e\u0301', 'x'.repeat(2000), '1 '.repeat(999)])(
    'answers 200 where it understands nothing: %.12j',
    async (text) => {
      const answer = await ask(text)
      expect(answer.kind).toBeNull()
    },
  )

  it('names every wrong field at once', async () => {
    const response = await post({ text: '', units: 'furlongs', colour: 'red' })
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/colour', '#/text', '#/units'])
    expect(listPointers(expectProblem(await post({}), 422))).toEqual(['#/text'])
    expect(listPointers(expectProblem(await post({ text: 5 }), 422))).toEqual(['#/text'])
    expect(listPointers(expectProblem(await post({ text: 'x'.repeat(10_000) }), 422))).toEqual(['#/text'])
  })

  it('refuses broken JSON, another media type and another method', async () => {
    const url = request(app.url).post('/api/v1/ask')
    expectProblem(await url.set('content-type', 'application/json').send('{"text":'), 400)
    expectProblem(await request(app.url).post('/api/v1/ask').set('content-type', 'text/plain').send('hi'), 415)
    expectProblem(await request(app.url).get('/api/v1/ask'), 405)
  })
})
