import { describe, expect, it } from 'vitest'
import { proposalRequestSchema } from '#shared/schemas/proposals'
import { createPrinter } from '#shared/units/print'
import { isUntouched } from '../../../src/features/propose/model/compare-typed'
import { askDoubts, typeSuggestion, writeFlags } from '../../../src/features/propose/model/doubts'
import { mapPointer } from '../../../src/features/propose/model/form-errors'
import { notesToText, textToNotes } from '../../../src/features/propose/model/notes-text'
import { readTyped } from '../../../src/features/propose/model/read-typed'
import { findMeanwhile, rebaseTyped, respellTyped } from '../../../src/features/propose/model/rebase'
import { layOver, pickTouched } from '../../../src/features/propose/model/touched'
import { createBase, type TypedForm, type TypedSpec } from '../../../src/features/propose/model/typed-form'
import { inventedHeater, inventedTank } from '../support/invented-gear'

const us = createPrinter('us')
const metric = createPrinter('metric')
const heaterBase = createBase('heater', inventedHeater, us)

function type(typed: TypedForm, specs: Readonly<Record<string, Partial<TypedSpec>>>): TypedForm {
  const changed = Object.entries(specs).map(([key, spec]) => [key, { ...typed.specs[key]!, ...spec }])
  return { ...typed, specs: { ...typed.specs, ...Object.fromEntries(changed) } }
}
const typeHeater = (specs: Readonly<Record<string, Partial<TypedSpec>>>) => type(heaterBase.typed, specs)

describe('what is typed', () => {
  it('proposes nothing while it says what is on record', () => {
    const read = readTyped(heaterBase, heaterBase.typed, 'us')
    expect(read).toMatchObject({ values: {}, identity: {}, problems: [] })
    expect(isUntouched(heaterBase.typed, heaterBase.typed)).toBe(true)
  })

  it('proposes what differs, canonical and as it was spelled, in either unit system', () => {
    const { values } = readTyped(
      heaterBase,
      typeHeater({ lengthMm: { text: '10 5/8"' }, diameterMm: { text: '2,4 cm' } }),
      'us',
    )
    expect(values).toMatchObject({
      lengthMm: { value: 269.875, raw: '10 5/8"', source: 'measured' },
      diameterMm: { value: 24, raw: '2,4 cm' },
    })
    expect(Object.keys(values)).toEqual(['lengthMm', 'diameterMm'])
  })

  it('without a unit is taken in the reader’s own, and the unit is kept with it', () => {
    const { values } = readTyped(heaterBase, typeHeater({ lengthMm: { text: '10.5' } }), 'us')
    expect(values.lengthMm).toMatchObject({ value: 266.7, raw: '10.5 in' })
  })

  it('takes a value away where its field is emptied', () => {
    expect(readTyped(heaterBase, typeHeater({ lengthMm: { text: ' ' } }), 'us').values).toEqual({ lengthMm: null })
  })

  it('proposes the same number again where it is better backed, as exact as it is on record', () => {
    const typed = typeHeater({
      lengthMm: { source: 'measured', plusMinus: '0.5 mm', evidence: 'calipers', date: '2026-01-02' },
    })
    expect(readTyped(heaterBase, typed, 'us').values.lengthMm).toEqual({
      value: inventedHeater.specs.lengthMm,
      source: 'measured',
      plusMinus: 0.5,
      evidence: 'calipers',
      date: '2026-01-02',
    })
  })

  it('takes the backing of all where a value says nothing of its own, and the files that it names', () => {
    const typed: TypedForm = {
      ...typeHeater({ lengthMm: { text: '11 in' }, powerW: { text: '150 W', source: 'maker' } }),
      backing: { source: 'estimate', date: '2026-03-04', evidence: 'a tape' },
      files: [{ id: 'file-1', name: 'a.jpg', kind: 'photo', only: ['lengthMm'] }],
    }
    const { values } = readTyped(heaterBase, typed, 'us')
    expect(values.lengthMm).toMatchObject({
      source: 'estimate',
      date: '2026-03-04',
      evidence: 'a tape',
      files: ['file-1'],
    })
    expect(values.powerW).toMatchObject({ source: 'maker', date: '2026-03-04' })
    expect(values.powerW).not.toHaveProperty('files')
  })

  it('names every field that cannot be read, and still proposes the others', () => {
    const read = readTyped(
      heaterBase,
      typeHeater({ lengthMm: { text: '5 gallons' }, powerW: { text: '99999 W' }, diameterMm: { text: '1 in' } }),
      'us',
    )
    expect(read.problems.map(({ path }) => path)).toEqual(['specs.lengthMm.text', 'specs.powerW.text'])
    expect(Object.keys(read.values)).toEqual(['diameterMm'])
  })

  it('names a contradiction at the field, in the words of the record', () => {
    const typed = typeHeater({ ratedVolumeMinL: { text: '100 gal' }, ratedVolumeMaxL: { text: '20 gal' } })
    expect(readTyped(heaterBase, typed, 'us').problems).toEqual([
      { path: 'specs.ratedVolumeMinL.text', message: 'Smallest rated volume must not be above largest rated volume.' },
    ])
  })

  it('of a list keeps the ids of its entries, makes up missing ones, and passes over empty ones', () => {
    const base = createBase('tank', inventedTank, us)
    const entries = [...base.typed.specs.chambers!.entries, {}, { widthMm: '4 in' }]
    const { values, places } = readTyped(base, type(base.typed, { chambers: { entries } }), 'us')
    expect(values.chambers?.value).toEqual([
      { id: 'rear-1', widthMm: 100 },
      { id: 'chamber-1', widthMm: 101.6 },
    ])
    expect(places.chambers).toEqual([0, 2])
  })

  it('of a new piece is what the API takes', () => {
    const base = createBase('heater', null, metric)
    const typed: TypedForm = {
      ...type(base.typed, { lengthMm: { text: '25 cm' }, volts: { text: '120,230' }, form: { text: 'glass-rod' } }),
      identity: { ...base.typed.identity, brand: ' Invented ', model: 'Ember 100', gtin: '2000 0000 0001 5' },
    }
    const { identity, values, problems } = readTyped(base, typed, 'metric')
    expect(problems).toEqual([])
    expect(identity).toEqual({ brand: 'Invented', model: 'Ember 100', status: 'current', gtin: '2000000000015' })
    expect(proposalRequestSchema.safeParse({ kind: 'heater', identity, values }).error).toBeUndefined()
    expect(values).toMatchObject({ volts: { value: [120, 230] }, form: { value: 'glass-rod' } })
  })

  it('of a new piece needs a brand and a model', () => {
    const base = createBase('net', null, us)
    expect(readTyped(base, base.typed, 'us').problems.map(({ path }) => path)).toEqual([
      'identity.brand',
      'identity.model',
    ])
  })
})

describe('an unlikely number', () => {
  const typed = typeHeater({ lengthMm: { text: '270 in' } })

  it('that is outside of what can be is an error, and one that can be is a question with a suggestion to take', () => {
    expect(readTyped(heaterBase, typed, 'us').problems).toHaveLength(1)
    const slipped = typeHeater({ powerW: { text: '1000 W' } })
    const [doubt] = askDoubts(heaterBase, readTyped(heaterBase, slipped, 'us'), us)
    expect(doubt).toMatchObject({ place: 'specs.powerW.text', suggestions: [{ value: 100 }] })
    expect(typeSuggestion('heater', doubt!, 100, us)).toBe('100 W')
  })

  it('is sent with the reason that was given, and without one where none was', () => {
    const slipped = typeHeater({ powerW: { text: '1000 W' } })
    const doubts = askDoubts(heaterBase, readTyped(heaterBase, slipped, 'us'), us)
    const flag = { path: 'powerW', rule: 'slip', value: 1000 }
    expect(writeFlags(doubts, slipped)).toEqual([{ ...flag, reason: null }])
    const explained = { ...slipped, reasons: { [doubts[0]!.id]: 'an inline heater for a pond' } }
    expect(writeFlags(doubts, explained)).toEqual([{ ...flag, reason: 'an inline heater for a pond' }])
  })
})

describe('a record that moved on', () => {
  const now = { ...inventedHeater, revision: 4, specs: { ...inventedHeater.specs, lengthMm: 300, powerW: 150 } }
  const typed = typeHeater({ lengthMm: { text: '11 in' } })

  it('is told field by field, with what stands in the form beside it', () => {
    const { values } = readTyped(heaterBase, typed, 'metric')
    expect(findMeanwhile(heaterBase, now, values, metric)).toEqual([
      { key: 'lengthMm', label: 'length', was: '269\u00a0mm', now: '300\u00a0mm', mine: '279\u00a0mm' },
      { key: 'powerW', label: 'power', was: '100\u00a0W', now: '150\u00a0W', mine: null },
    ])
  })

  it('takes along what was not touched and leaves what was typed', () => {
    const { typed: next, base } = rebaseTyped(heaterBase, typed, now, us)
    expect(next.specs.lengthMm?.text).toBe('11 in')
    expect(next.specs.powerW?.text).toBe('150 W')
    expect(Object.keys(readTyped(base, next, 'us').values)).toEqual(['lengthMm'])
  })

  it('leaves a kept draft what it says: only what was typed is laid over the newer record', () => {
    const kept = pickTouched(heaterBase, typeHeater({ lengthMm: { text: '11' } }), 'us')
    const base = createBase('heater', now, metric)
    const restored = layOver(base, kept)
    expect(Object.keys(readTyped(base, restored, 'metric').values)).toEqual(['lengthMm'])
    expect(restored.specs.lengthMm?.text).toBe('11 in')
    expect(restored.specs.powerW?.text).toBe('150 W')
  })
})

describe('the other unit system', () => {
  it('prints what is on record anew and leaves a typed number what it was', () => {
    const typed = typeHeater({ diameterMm: { text: '1' } })
    const { typed: next, base } = respellTyped(heaterBase, typed, 'us', metric)
    expect(next.specs.lengthMm?.text).toBe('269 mm')
    expect(next.specs.diameterMm?.text).toBe('1 in')
    expect(readTyped(base, next, 'metric').values).toMatchObject({ diameterMm: { value: 25.4 } })
  })
})

describe('a refusal of the API', () => {
  it.each([
    ['#/values/lengthMm/value', 'specs.lengthMm.text'],
    ['#/values/lengthMm/plusMinus', 'specs.lengthMm.plusMinus'],
    ['#/values/lengthMm', 'specs.lengthMm.text'],
    ['#/identity/brand', 'identity.brand'],
    ['#/summary', 'summary'],
  ])('at %s stands at %s', (pointer, path) => expect(mapPointer('heater', pointer)).toBe(path))

  it.each([
    ['#/values/chambers/value/1/widthMm', 'specs.chambers.entries.1.widthMm'],
    ['#/values/includedPump/value/flowLph', 'specs.includedPump.entries.0.flowLph'],
    ['#/values/chambers', 'specs.chambers.entries'],
  ])('of a tank at %s stands at %s', (pointer, path) => expect(mapPointer('tank', pointer)).toBe(path))

  it('at what no field stands for is told over the form', () =>
    expect(mapPointer('heater', '#/baseRevision')).toBeNull())
})

describe('notes', () => {
  it('are edited as paragraphs and sent as the markup they are kept in, nothing of it live', () => {
    expect(notesToText('<p>One &amp; two</p><ul><li>three</li></ul>')).toBe('One & two\n\n- three')
    expect(textToNotes('One <b>\ntwo\n\nthree')).toBe('<p>One &#60;b&#62;<br>two</p><p>three</p>')
    expect(textToNotes('  ')).toBeNull()
  })
})
