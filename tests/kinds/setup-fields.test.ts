import { describe, expect, it } from 'vitest'
import { findSetupField, setupFields } from '#shared/kinds/setup-fields'

describe('the fields of a setup', () => {
  it('have paths of their own that end with the key of what is typed there', () => {
    const paths = setupFields.map(({ path }) => path)
    expect(new Set(paths).size).toBe(paths.length)
    for (const { path, attribute } of setupFields) expect(path.split('.').at(-1)).toBe(attribute.key)
  })

  it.each([
    'name',
    'units',
    'country',
    'tank.outerLengthMm',
    'tank.volumeL',
    'tank.gear',
    'tank.chambers.0.lengthMm',
    'tank.chambers.rear.waterDepthMm',
    'tank.includedPump.flowLph',
    'tank.sump.widthMm',
    'support.kind',
    'room.coldestC',
    'mains.volts',
    'mains.residualCurrentProtected',
    'water.litresPerWeek',
    'goals.temperatureC',
    'goals.coral',
    'goals.turnoverPerHour.1',
  ])('include %s', (path) => {
    expect(findSetupField(path)).toBeDefined()
  })

  it.each([
    '',
    'tank',
    'tank.colour',
    'tank.chambers',
    'tank.chambers.*.lengthMm',
    'tank.chambers.0',
    'tank.chambers..lengthMm',
    'items.0.kind',
    '__proto__',
  ])('do not include %o', (path) => {
    expect(findSetupField(path)).toBeUndefined()
  })

  it('nest the usual range inside the plausible one', () => {
    for (const { path, attribute } of setupFields) {
      if (attribute.type !== 'measure') continue
      const { plausible, usual } = attribute
      expect(
        (plausible[0] <= usual[0] && usual[0] < usual[1] && usual[1] <= plausible[1]) || path.endsWith('plugs'),
        path,
      ).toBe(true)
    }
  })
})
