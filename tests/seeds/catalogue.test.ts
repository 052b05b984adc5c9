import { describe, expect, it } from 'vitest'
import { seedPieces } from '../../seeds/gear/index'
import { createSlug } from '../../server/modules/gear/slug'
import { kindKeys } from '../../shared/kinds/index'
import { isGtin } from '../../shared/schemas/gtin'
import { specsInputSchema } from '../../shared/schemas/specs'
import { listStates, readPiece } from './merge'

const slugOf = ({ slug, brand, model }: (typeof seedPieces)[number]) => slug ?? createSlug(brand, model)
const pieces = seedPieces.map(readPiece)

describe('the demo catalogue', () => {
  it('holds at least 600 pieces of at least 40 brands, and some of every kind', () => {
    expect(seedPieces.length).toBeGreaterThanOrEqual(600)
    expect(new Set(seedPieces.map(({ brand }) => brand)).size).toBeGreaterThanOrEqual(40)
    for (const kind of kindKeys) {
      const count = seedPieces.filter((piece) => piece.kind === kind).length
      expect(count, kind).toBeGreaterThanOrEqual(8)
    }
  })

  it('passes the checks of what people type, after every revision of every piece', () => {
    const problems = seedPieces.flatMap((piece) =>
      listStates(piece).flatMap((state, index) => {
        const input = Object.entries(state).map(([key, { evidence: _, ...value }]) => [key, value])
        const { error } = specsInputSchema(piece.kind).safeParse(Object.fromEntries(input))
        const issues = error?.issues ?? []
        return issues.map((issue) => `${slugOf(piece)} #${index + 1} ${issue.path.join('.')}: ${issue.message}`)
      }),
    )
    expect(problems).toEqual([])
  })

  it('names every piece once', () => {
    const slugs = seedPieces.map(slugOf)
    expect(slugs.filter((slug, index) => slugs.indexOf(slug) !== index)).toEqual([])
  })

  it('uses only GTINs of the range for restricted circulation, each once and with its check digit', () => {
    const gtins = seedPieces.flatMap(({ gtin }) => gtin ?? [])
    expect(gtins.length).toBeGreaterThan(100)
    expect(gtins.length).toBeLessThan(seedPieces.length)
    expect(new Set(gtins).size).toBe(gtins.length)
    // Prefixes 200 to 299: GS1 General Specifications, table of GS1 Prefixes (from memory).
    for (const gtin of gtins) expect(isGtin(gtin) && /^2\d{12}$/.test(gtin), gtin).toBe(true)
  })

  it('dates every revision between 2024 and 2026, in order', () => {
    for (const piece of seedPieces) {
      const dates = piece.revisions.map(({ date }) => date)
      for (const date of dates) expect(date).toMatch(/^202[456]-(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/)
      expect([...dates].sort(), slugOf(piece)).toEqual(dates)
    }
  })

  it('changes something in every revision', () => {
    for (const piece of seedPieces) {
      const states = listStates(piece)
      states.forEach((state, index) => expect(state, slugOf(piece)).not.toEqual(index > 0 ? states[index - 1] : {}))
    }
  })

  it('mixes sources, histories, gaps and pieces that are gone', () => {
    const values = pieces.flatMap(({ piece }) => Object.values(listStates(piece).at(-1) ?? {}))
    for (const source of ['maker', 'measured', 'estimate']) {
      expect(values.filter((value) => value.source === source).length, source).toBeGreaterThan(20)
    }
    expect(values.filter(({ plusMinus }) => plusMinus !== undefined).length).toBeGreaterThan(50)
    expect(seedPieces.filter(({ revisions }) => revisions.length > 1).length).toBeGreaterThan(50)
    expect(seedPieces.filter(({ revisions }) => revisions.length > 2).length).toBeGreaterThan(5)
    expect(seedPieces.filter(({ status }) => status === 'discontinued').length).toBeGreaterThan(20)
    expect(pieces.filter(({ piece, number }) => piece.kind === 'heater' && !number('lengthMm')).length).toBeGreaterThan(
      1,
    )
  })

  it('has many small rods, for both kinds of mains, with and without a thermostat', () => {
    const small = pieces.filter(({ piece, numbers }) => {
      const [powerW, lengthMm] = numbers('powerW', 'lengthMm') ?? []
      return piece.kind === 'heater' && powerW && lengthMm && powerW >= 50 && powerW <= 150 && lengthMm <= 300
    })
    const takes = (volts: number) => small.filter(({ values }) => (values['volts'] as number[]).includes(volts)).length
    expect(takes(120)).toBeGreaterThan(30)
    expect(takes(230)).toBeGreaterThan(10)
    expect(small.filter(({ values }) => values['thermostat'] === 'external-needed').length).toBeGreaterThan(5)
  })

  it('names only tanks and control groups that are there', () => {
    const slugs = new Set(seedPieces.map(slugOf))
    const groups = new Set(
      pieces.flatMap(({ piece, values }) => (piece.kind === 'light' ? [values['controlGroup']] : [])),
    )
    for (const { piece, name, values } of pieces) {
      for (const slug of (values['madeForTanks'] ?? []) as string[]) expect(slugs, `${name}: ${slug}`).toContain(slug)
      if (piece.kind === 'light-controller' && values['controlGroup'])
        expect(groups, name).toContain(values['controlGroup'])
    }
  })
})
