import { describe, expect, it } from 'vitest'
import { applyMutant, listMutants } from '../../scripts/mutate/list-mutants.mjs'
import { drawSample } from '../../scripts/mutate/draw-sample.mjs'
import { writeReport } from '../../scripts/mutate/report.mjs'

const mutate = (text: string) => listMutants('one.ts', text).map((mutant) => applyMutant(text, mutant))

describe('the faults that are put into a file', () => {
  it('swap what is computed and compared, at the boundary and beyond it', () => {
    expect(mutate('const a = b * c')).toEqual(['const a = b / c'])
    expect(mutate('const a = b < c')).toEqual(['const a = b <= c', 'const a = b >= c'])
    expect(mutate('const a = b === c && d')).toEqual(['const a = b !== c && d', 'const a = b === c || d'])
  })

  it('change numbers and truths a little', () => {
    expect(mutate('const a = 0')).toEqual(['const a = 1'])
    expect(mutate('const a = 1025')).toEqual(['const a = 1127.5'])
    expect(mutate('const a = true')).toEqual(['const a = false'])
  })

  it('turn conditions round and return nothing', () => {
    expect(mutate('if (a) b()')).toEqual(['if (!(a)) b()'])
    expect(mutate('const a = !b')).toEqual(['const a = (b)'])
    expect(mutate('function f() { return a }')).toEqual(['function f() { return undefined }'])
  })

  it('leave types, imports and words alone', () => {
    const text = "import { a } from 'b'\ntype C = 1 | true\ninterface D { e: 2 }\nconst f = `g ${a + 1} h` + 'i'\n"
    expect(mutate(text)).toEqual([])
  })

  it('name the line and what stood there', () => {
    expect(listMutants('one.ts', '\nconst a = b - c')[0]).toMatchObject({ line: 2, operator: 'arithmetic', was: '-' })
  })
})

describe('a sample', () => {
  const list = Array.from({ length: 100 }, (_, index) => index)

  it('is the same for the same seed, another for another, and holds nothing twice', () => {
    expect(drawSample(list, 20, 7)).toEqual(drawSample(list, 20, 7))
    expect(drawSample(list, 20, 7)).not.toEqual(drawSample(list, 20, 8))
    expect(new Set(drawSample(list, 100, 7)).size).toBe(100)
    expect(drawSample(list, 500, 7)).toHaveLength(100)
  })
})

describe('the report', () => {
  it('counts what was noticed and lists what was not', () => {
    const mutant = { file: 'a.ts', line: 3, operator: 'constant' as const, start: 0, end: 1, was: '1', becomes: '2' }
    const text = writeReport([
      { ...mutant, fate: 'killed' },
      { ...mutant, fate: 'timed out' },
      { ...mutant, line: 9, fate: 'survived' },
    ])
    expect(text).toContain('Noticed 2 of 3 faults (66.7 %)')
    expect(text).toContain('a.ts:9 constant: 1 → 2')
    expect(text).not.toContain('a.ts:3')
  })
})
