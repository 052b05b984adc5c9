import { describe, expect, it } from 'vitest'
import { identityAttributes } from '#shared/kinds/common'
import { getAttribute, getKind, isKindKey, kindKeys, kinds } from '#shared/kinds/index'
import { units } from '#shared/units/units'
import type { Attribute, FieldAttribute } from '#shared/kinds/types'

/** How a key spells its unit; measures of unity end with what they count or share. */
const endings: Readonly<Record<string, RegExp>> = {
  mm: /Mm$/,
  m: /M$/,
  L: /L$/,
  W: /W$/,
  'L/h': /Lph$/,
  'L/d': /Lpd$/,
  C: /C$/,
  kg: /Kg$/,
  'kg/L': /KgL$/,
  kPa: /KPa$/,
  ppt: /Ppt$/,
  ppm: /Ppm$/,
  dKH: /Dkh$/,
  'umol/m2/s': /Umol$/,
  'umol/s': /UmolS$/,
  V: /V$/,
  A: /A$/,
  deg: /Deg$/,
  nm: /Nm$/,
  count: /(plugs|outlets|channels|testsEach)$/i,
  fraction: /(Fraction|share)$/,
  ratio: /Ratio$/,
}

const listFields = (attributes: readonly Attribute[]): FieldAttribute[] =>
  attributes.flatMap((attribute) => (attribute.type === 'group' ? listFields(attribute.fields) : [attribute]))

const everyField = kindKeys.flatMap((kind) =>
  listFields(getKind(kind).attributes).map((attribute) => ({ kind, key: attribute.key, attribute })),
)

describe('kinds', () => {
  it('number 22, each under its own key', () => {
    expect(kindKeys).toHaveLength(22)
    expect(Object.keys(kinds)).toEqual([...kindKeys])
    for (const key of kindKeys) expect(kinds[key].key).toBe(key)
  })

  it('tell their keys from other words, those of every object included', () => {
    expect(isKindKey('heater')).toBe(true)
    for (const word of ['heaters', '', 'toString', '__proto__']) expect(isKindKey(word)).toBe(false)
  })

  it.each(kindKeys)('give each attribute of %s a key of its own', (key) => {
    const keys = [...identityAttributes, ...getKind(key).attributes].map((attribute) => attribute.key)
    expect(new Set(keys).size).toBe(keys.length)
  })

  it('find an attribute by its key', () => {
    expect(getAttribute('heater', 'powerW')?.type).toBe('measure')
    expect(getAttribute('heater', 'flowCurve')).toBeUndefined()
  })

  it('name a plug, a voltage and a cord for everything that goes into the wall', () => {
    for (const key of kindKeys) {
      const has = ['plugs', 'volts', 'plugType', 'cordMm'].map((name) => getAttribute(key, name) !== undefined)
      expect(new Set(has), key).toEqual(new Set([getKind(key).electric]))
    }
  })
})

describe('attributes', () => {
  it.each(everyField)('$kind $key has a label, and a measure a guide and nested ranges', ({ attribute }) => {
    expect(attribute.label).not.toBe('')
    if (attribute.type !== 'measure') return
    const [low, high] = attribute.plausible
    const [usualLow, usualHigh] = attribute.usual
    expect(attribute.guide).toMatch(/^[A-Z].*\.$/)
    expect(low).toBeLessThanOrEqual(usualLow)
    expect(usualLow).toBeLessThanOrEqual(usualHigh)
    expect(usualHigh).toBeLessThanOrEqual(high)
    expect(low).toBeLessThan(high)
  })

  it.each(everyField.filter(({ attribute }) => attribute.type === 'measure'))(
    '$kind $key ends with its canonical unit',
    ({ key, attribute }) => {
      if (attribute.type !== 'measure') return
      expect(units[attribute.unit]).toBeDefined()
      expect(key).toMatch(endings[attribute.unit] ?? /^$/)
    },
  )

  it('offer each option once, and only numbers where they are stored as numbers', () => {
    for (const { kind, key, attribute } of everyField) {
      if (attribute.type !== 'choice' && attribute.type !== 'set') continue
      const values = attribute.options.map((option) => option.value)
      expect(new Set(values).size, `${kind} ${key}`).toBe(values.length)
      if (attribute.numeric) expect(values.map(Number).every(Number.isInteger)).toBe(true)
    }
  })
})
