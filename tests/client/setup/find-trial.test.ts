import { describe, expect, it } from 'vitest'
import type { Turn } from '#shared/engine/types'
import { createPrinter } from '#shared/units/print'
import { findTrial } from '../../../src/components/setup/find-trial'

const turn = (path: string, to = 114.3, unit = 'mm'): Turn => ({
  path,
  from: 101.6,
  to,
  unit,
  verdict: 'fits',
  message: 'It would fit if …',
})
const us = createPrinter('us')

describe('trying what would make a piece fit', () => {
  it('says the number as it would be typed, and leaves the rest as it was', () => {
    const raw = { 'tank.volumeL': '20 gal', 'tank.chambers.0.lengthMm': '4 in' }
    // An inch is 25.4 mm: 114.3 mm are 4.5 in.
    expect(findTrial(turn('tank.chambers.0.lengthMm'), raw, us)).toEqual({
      'tank.volumeL': '20 gal',
      'tank.chambers.0.lengthMm': '4.5 in',
    })
    // 20 °C are 68 °F.
    expect(findTrial(turn('room.coldestC', 20, 'Cel'), raw, us)?.['room.coldestC']).toBe('68 °F')
  })

  it('says no single number of a chamber that the catalogue’s tank has', () => {
    const path = 'tank.chambers.0.lengthMm'
    expect(findTrial(turn(path), { 'tank.gear': 'invented-tank' }, us)).toBeUndefined()
    expect(findTrial(turn(path), { 'tank.gear': 'invented-tank', [path]: '4 in' }, us)?.[path]).toBe('4.5 in')
    expect(findTrial(turn('tank.outerLengthMm'), { 'tank.gear': 'invented-tank' }, us)).toBeDefined()
  })

  it('changes a number of a piece that was typed, and of none that the catalogue has', () => {
    const path = 'items.stand.specs.topLengthMm'
    expect(findTrial(turn(path), { 'items.stand.kind': 'stand', [path]: '4 in' }, us)?.[path]).toBe('4.5 in')
    expect(findTrial(turn(path), { 'items.stand.gear': 'invented-stand' }, us)).toBeUndefined()
  })
})
