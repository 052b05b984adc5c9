import { describe, expect, it } from 'vitest'
import { gradePiece } from './grade-pieces'
import { judgedQueries } from './judged-queries'
import { queryClasses } from './queries/types'
import { findPercentile, scoreFirst, scoreOrder } from './score-class'

describe('the measures of a search', () => {
  it('give the worked example its value', () => {
    // Grades 3, 2, 3, 0, 1, 2 with gain 2^g − 1: DCG 13.848, ideal order 3, 3, 2, 2, 1, 0: 14.595. Worked by hand.
    const grades = [3, 2, 3, 0, 1, 2]
    const dcg = 7 + 3 / Math.log2(3) + 7 / 2 + 1 / Math.log2(6) + 3 / Math.log2(7)
    const ideal = 7 + 7 / Math.log2(3) + 3 / 2 + 3 / Math.log2(5) + 1 / Math.log2(6)
    expect(scoreOrder(grades, grades)).toBeCloseTo(dcg / ideal, 12)
    expect(dcg).toBeCloseTo(13.848, 3)
    expect(ideal).toBeCloseTo(14.595, 3)
  })

  it('are 1 for the best order and 0 for none', () => {
    expect(scoreOrder([3, 2, 1], [1, 3, 2, 0])).toBe(1)
    expect(scoreOrder([], [3])).toBe(0)
    expect(scoreFirst([0, 3], 3)).toBe(0.5)
    expect(scoreFirst([0, 2], 3)).toBe(0)
  })

  it('take the nearest rank for a percentile', () => {
    const values = Array.from({ length: 20 }, (_, index) => index + 1)
    expect(findPercentile(values, 0.95)).toBe(19)
    expect(findPercentile([7], 0.95)).toBe(7)
  })
})

describe('the judged queries', () => {
  it('are over 300, at least half of them blind, with each class in both halves', () => {
    const blind = judgedQueries.filter(({ isBlind }) => isBlind)
    expect(judgedQueries.length).toBeGreaterThanOrEqual(300)
    expect(blind.length * 2).toBeGreaterThanOrEqual(judgedQueries.length)
    for (const each of queryClasses) {
      for (const isBlind of [true, false]) {
        const count = judgedQueries.filter((judged) => judged.queryClass === each && judged.isBlind === isBlind).length
        expect(count, `${each}, ${isBlind ? 'blind' : 'open'}`).toBeGreaterThanOrEqual(12)
      }
    }
  })

  it('are graded by the best pattern that names a piece', () => {
    const piece = { slug: 'a-b-100', kind: 'heater', specs: { powerW: 100, volts: [120, 230] } }
    expect(gradePiece(piece, { 1: 'a-*', 3: 'kind:heater[powerW=90..110,volts=230]' })).toBe(3)
    expect(gradePiece(piece, { 1: 'a-*', 3: 'kind:heater[powerW=50]' })).toBe(1)
    expect(gradePiece(piece, { 3: 'kind:net a-b' })).toBe(0)
  })
})
