import { describe, expect, it } from 'vitest'
import { findSetupField } from '#shared/kinds/setup-fields'
import type { MeasureAttribute } from '#shared/kinds/types'
import { changeRaw, countChambers, removeChamber, spellOut } from '../../../src/components/setup/edit-raw'

const measure = (path: string) => findSetupField(path)?.attribute as MeasureAttribute

describe('editing the setup as typed', () => {
  it('clears a field with an empty text and leaves the others', () => {
    expect(changeRaw({ 'tank.volumeL': '20 gal', 'tank.lid': 'mesh' }, { 'tank.volumeL': ' ' })).toEqual({
      'tank.lid': 'mesh',
    })
  })

  it('moves later chambers up when one is taken out', () => {
    const raw = {
      'tank.chambers.0.lengthMm': '3 in',
      'tank.chambers.1.lengthMm': '4 in',
      'tank.chambers.2.lengthMm': '5 in',
      'tank.lid': 'mesh',
    }
    expect(countChambers(raw)).toBe(3)
    expect(removeChamber(raw, 1)).toEqual({
      'tank.chambers.0.lengthMm': '3 in',
      'tank.chambers.1.lengthMm': '5 in',
      'tank.lid': 'mesh',
    })
  })

  it('writes the unit that was meant beside a bare number, and no other', () => {
    expect(spellOut('8 1/2', measure('tank.outerLengthMm'), 'us')).toBe('8 1/2 in')
    expect(spellOut('220', measure('tank.outerLengthMm'), 'metric')).toBe('220 mm')
    expect(spellOut('22 cm', measure('tank.outerLengthMm'), 'us')).toBe('22 cm')
    expect(spellOut('three', measure('tank.outerLengthMm'), 'us')).toBe('three')
  })
})
