import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../support/app'
import { answerQueries } from '../search/answer-queries'
import { floors } from '../search/floors'
import { queryClasses } from '../search/queries/types'
import { scoreClass, type QueryScore } from '../search/score-class'

let app: TestApp
let scores: readonly QueryScore[]

beforeAll(async () => {
  app = await startApp()
  scores = await answerQueries(app.url, app.client.pool)
}, 120_000)

afterAll(() => app.stop())

describe.each(['blind', 'open'] as const)('the search, by the %s half of the judged queries', (half) => {
  it.each(queryClasses)('does not fall below its floor: %s', (queryClass) => {
    const own = scores.filter(({ judged }) => judged.queryClass === queryClass && judged.isBlind === (half === 'blind'))
    const { ndcg, mrr, zeroRate } = scoreClass(own)
    if (queryClass === 'no answer') {
      expect(zeroRate).toBe(1)
      return
    }
    const floor = floors[queryClass][half]
    expect(zeroRate).toBe(0)
    expect(ndcg).toBeGreaterThanOrEqual(floor.ndcg)
    expect(mrr).toBeGreaterThanOrEqual(floor.mrr)
  })
})
