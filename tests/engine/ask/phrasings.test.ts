import { describe, expect, it } from 'vitest'
import { readQuestion } from '#shared/engine/ask/read-question'
import type { Filter } from '#shared/engine/ask/types'
import { catalogue } from './phrasings/catalogue'
import { hobbyistPhrasings } from './phrasings/hobbyists'
import { piecePhrasings } from './phrasings/pieces'
import { setupPhrasings } from './phrasings/setups'
import type { Phrasing } from './phrasings/types'

const round = (value: unknown): unknown => {
  if (typeof value === 'number') return Number(value.toPrecision(9))
  return Array.isArray(value) ? value.map(round) : value
}
const roundAll = (record: Readonly<Record<string, unknown>>) =>
  Object.fromEntries(Object.entries(record).map(([key, value]) => [key, round(value)]))

const read = ([text, system]: Phrasing) => {
  const question = readQuestion(text, system, catalogue)
  const values = Object.fromEntries(Object.entries(question.fields).map(([path, { value }]) => [path, value]))
  return { ...question, values }
}

describe.each([
  ['the setup', setupPhrasings],
  ['the piece', piecePhrasings],
  ['both at length', hobbyistPhrasings],
])('a question about %s', (_, phrasings) => {
  it.each(phrasings.map((phrasing) => [phrasing[0], phrasing] as const))('reads "%s"', (_text, phrasing) => {
    const { intent, kind, fields = {}, filters = {}, ignored } = phrasing[2]
    const question = read(phrasing)
    expect(roundAll(question.values)).toEqual(roundAll(fields))
    expect(roundAll(question.filters as Record<string, Filter>)).toEqual(roundAll(filters as Record<string, Filter>))
    expect(question.kind).toBe(kind)
    expect(question.intent).toBe(intent ?? 'find')
    if (ignored !== undefined) expect(question.ignored).toEqual(ignored)
  })
})
