import { computeGtinCheckDigit } from '#shared/schemas/gtin'
import type { KindKey } from '#shared/kinds/index'
import type { Backing, SeedPiece, SeedRevision, SeedValue } from './types'

type Values = Readonly<Record<string, unknown>>

/** Pieces of one maker that differ by a few columns: one row per piece, `null` where nobody knows. */
export interface Family {
  readonly kind: KindKey
  readonly brand: string
  /** Stands before each row's name in the model; an empty line leaves the name alone. */
  readonly line: string
  readonly date: string
  readonly author: string
  readonly common: Values
  readonly columns: readonly string[]
  readonly rows: Readonly<Record<string, readonly unknown[]>>
  /** Number of the first piece's GTIN; pieces follow one by one. */
  readonly gtinFrom?: number
  readonly discontinued?: readonly string[] | 'all'
  /** Attributes whose values do not come from the maker. */
  readonly backing?: Readonly<Record<string, Backing>>
  readonly later?: Readonly<Record<string, readonly SeedRevision[]>>
  readonly notes?: Readonly<Record<string, string>>
}

export const fromMaker: Backing = { source: 'maker' }

export const measuredTo = (plusMinus: number, evidence: string): Backing => ({
  source: 'measured',
  plusMinus,
  evidence,
})

export const measuredBy = (evidence: string): Backing => ({ source: 'measured', evidence })

export const estimatedFrom = (evidence: string): Backing => ({ source: 'estimate', evidence })

/** Values that share one backing; `undefined` and `null` are left out as unknown. */
export function back(values: Values, backing: Backing): Record<string, SeedValue> {
  const known = Object.entries(values).filter(([, value]) => value !== null && value !== undefined)
  return Object.fromEntries(known.map(([key, value]) => [key, { value, ...backing }]))
}

/** Somebody's own reading of some values, each with its ±. */
export function remeasure(
  date: string,
  author: string,
  evidence: string,
  readings: Readonly<Record<string, readonly [unknown, number?]>>,
): SeedRevision {
  const values = Object.fromEntries(
    Object.entries(readings).map(([key, [value, plusMinus]]): [string, SeedValue] => [
      key,
      { value, source: 'measured', ...(plusMinus !== undefined && { plusMinus }), evidence },
    ]),
  )
  return { date, author, summary: `Measured ${Object.keys(readings).length === 1 ? 'one value' : 'anew'}`, values }
}

/** A newer data sheet; `null` takes back what it no longer says. */
export function restate(date: string, author: string, summary: string, values: Values): SeedRevision {
  const entries = Object.entries(values).map(([key, value]): [string, SeedValue | null] => [
    key,
    value === null ? null : { value, source: 'maker', evidence: 'maker’s sheet of that month' },
  ])
  return { date, author, summary, values: Object.fromEntries(entries) }
}

/**
 * GS1 keeps the prefixes 200 to 299 for restricted circulation numbers (GS1 General Specifications, table of GS1
 * Prefixes; from memory), so that none of these can be the number of a product on sale.
 */
function createInternalGtin(number: number): string {
  const digits = `200${String(number).padStart(9, '0')}`
  return `${digits}${computeGtinCheckDigit(digits)}`
}

/** The pieces of a family, in the order of its rows. Throws where a row and the columns do not match. */
export function createFamily(family: Family): SeedPiece[] {
  const { kind, brand, line, date, author, common, columns, backing = {}, later = {}, notes = {} } = family
  const names = new Set(Object.keys(family.rows))
  const named = [family.discontinued ?? [], Object.keys(later), Object.keys(notes)]
  for (const name of named.flatMap((list) => (list === 'all' ? [] : list))) {
    if (!names.has(name)) throw new Error(`${brand} ${line} has no row “${name}”`)
  }
  return Object.entries(family.rows).map(([name, cells], index): SeedPiece => {
    if (cells.length !== columns.length) throw new Error(`${brand} ${line} ${name}: ${cells.length} cells`)
    const values = { ...common, ...Object.fromEntries(columns.map((key, i) => [key, cells[i]])) }
    const first = Object.entries(values).map(([key, value]) => back({ [key]: value }, backing[key] ?? fromMaker))
    const isGone = family.discontinued === 'all' || family.discontinued?.includes(name)
    return {
      kind,
      brand,
      model: line ? `${line} ${name}` : name,
      status: isGone ? 'discontinued' : 'current',
      ...(family.gtinFrom !== undefined && { gtin: createInternalGtin(family.gtinFrom + index) }),
      ...(notes[name] !== undefined && { notes: notes[name] }),
      revisions: [
        { date, author, summary: 'First entry', values: Object.assign({}, ...first) as Record<string, SeedValue> },
        ...(later[name] ?? []),
      ],
    }
  })
}
