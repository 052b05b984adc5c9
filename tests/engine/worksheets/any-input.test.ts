import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { worksheets } from '../../../shared/engine/worksheets/registry'
import type { Worksheet, WorksheetField } from '../../../shared/engine/worksheets/types'
import { put } from '../../../shared/engine/worksheets/quantities'
import { findSetupField } from '../../../shared/kinds/setup-fields'
import type { FieldAttribute } from '../../../shared/kinds/types'
import { createWorksheetSchema } from '../../../shared/schemas/worksheets'
import { work, workAny, type Body } from './work'

function arbitraryOf(attribute: FieldAttribute): fc.Arbitrary<unknown> {
  const values = 'options' in attribute ? attribute.options.map(({ value }) => value) : []
  switch (attribute.type) {
    case 'measure': {
      const [min, max] = attribute.plausible
      return attribute.unit === 'count' ? fc.integer({ min, max }) : fc.double({ min, max, noNaN: true })
    }
    case 'choice':
      return fc.constantFrom(...values).map((value) => (attribute.numeric ? Number(value) : value))
    case 'set':
      return fc.subarray(values)
    case 'boolean':
      return fc.boolean()
    default:
      return fc.constant('invented')
  }
}

interface Tree {
  [key: string]: unknown
}

/** Puts a value at a dotted path; the entries of lists go by their place. */
function place(tree: Tree, [word = '', ...rest]: readonly string[], value: unknown): void {
  if (rest.length === 0) {
    tree[word] = value
    return
  }
  const isList = rest[0] === '0' || rest[0] === '1'
  place((tree[word] ??= isList ? [] : {}) as Tree, rest, value)
}

const asked = ({ fields, setup }: Worksheet): readonly WorksheetField[] => [
  ...fields,
  ...(setup?.asks ?? []).map((path) => ({ path, attribute: findSetupField(path)!.attribute })),
]

/** Any values that the fields allow, optional ones at random; two entries in every list. */
function bodiesOf(sheet: Worksheet): fc.Arbitrary<Body> {
  const parts = asked(sheet).flatMap((field) =>
    (field.path.includes('*') ? ['0', '1'] : ['']).map((at) => ({ ...field, path: field.path.replace('*', at) })),
  )
  const values = parts.map(({ attribute, isRequired }) =>
    isRequired ? arbitraryOf(attribute) : fc.option(arbitraryOf(attribute), { nil: undefined }),
  )
  return fc.tuple(...values).map((drawn) => {
    const body: Tree = Object.fromEntries((sheet.setup?.sections ?? []).map((section) => [section, {}]))
    parts.forEach(({ path }, index) => {
      if (drawn[index] !== undefined) place(body, path.split('.'), drawn[index])
    })
    return body
  })
}

const isFiniteOrNone = (value: unknown): boolean =>
  typeof value !== 'number' || Number.isFinite(value) || value === null

describe.each(worksheets.map((sheet) => [sheet.name, sheet] as const))('the worksheet %s', (name, sheet) => {
  it('takes its own example, and gives every result that it names', () => {
    expect(createWorksheetSchema(sheet).safeParse(sheet.example).error?.issues ?? []).toEqual([])
    const { result, steps, cautions } = work(name, sheet.example)
    for (const { key } of sheet.results) expect(Object.keys(result)).toContain(key)
    expect(steps.length).toBeGreaterThan(1)
    expect(cautions.length).toBeGreaterThan(0)
  })

  it('gives numbers or names a field, whatever is typed, and the same in both unit systems', () => {
    const paths = new Set(asked(sheet).map(({ path }) => path.split('.')[0]))
    fc.assert(
      fc.property(bodiesOf(sheet), (body) => {
        const [metric, us] = [workAny(name, body), workAny(name, body, 'us')]
        if (!metric.ok) {
          for (const { path } of metric.problems) expect(paths, path).toContain(path.split('.')[0])
          expect(us.ok).toBe(false)
          return
        }
        expect(us.ok && us.result).toEqual(metric.result)
        for (const [key, value] of Object.entries(metric.result)) expect(isFiniteOrNone(value), key).toBe(true)
        for (const { title, text, value } of metric.steps) {
          expect(isFiniteOrNone(value), title).toBe(true)
          expect(text, title).not.toMatch(/NaN|Infinity|undefined/)
        }
      }),
      { numRuns: name === 'light-map' ? 25 : 120 },
    )
  })
})

describe('a number in a formula', () => {
  it.each([
    [1.98, '1.98'],
    [0.012, '0.012'],
    [1023.343, '1023'],
    [60_412.7, '60413'],
    [0.000258, '0.000258'],
    [-4.5, '−4.5'],
    [0, '0'],
  ])('%f is written %s', (value, text) => {
    expect(put(value)).toBe(text)
  })
})
