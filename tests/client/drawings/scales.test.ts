import { expect, it } from 'vitest'
import { assignLanes } from '../../../src/components/drawings/assign-lanes'
import { nearestLimit, zonesFromLimit } from '../../../src/components/drawings/gauge-zones'
import { pickMark, stepMark } from '../../../src/components/drawings/pick-mark'
import { fitDomain, placePercent, placeZone } from '../../../src/components/drawings/scale-domain'
import { findScaleUnit } from '../../../src/components/drawings/scale-unit'

it('hatches above an upper limit and below a lower one', () => {
  // 269 mm of 305 mm with something to spare: the limit is upper. 62 W of 75 W and falling short: it is lower.
  expect(zonesFromLimit(269, 305, 0.118, 'pass')).toEqual([{ from: 305, to: Infinity, outcome: 'fail' }])
  expect(zonesFromLimit(318, 305, -0.04, 'fail')).toEqual([{ from: 305, to: Infinity, outcome: 'fail' }])
  expect(zonesFromLimit(62, 75, -0.17, 'change')).toEqual([{ from: -Infinity, to: 75, outcome: 'change' }])
  expect(zonesFromLimit(90, 75, 0.2, 'pass')).toEqual([{ from: -Infinity, to: 75, outcome: 'fail' }])
  expect(zonesFromLimit(90, [75, 150], 0.2, 'pass')).toHaveLength(2)
  expect(zonesFromLimit(null, 75, null, 'nodata')).toEqual([])
})

it('measures the margin of an interval to its nearer end', () => {
  expect(nearestLimit(90, [75, 150])).toBe(75)
  expect(nearestLimit(400, [75, 150])).toBe(150)
})

it('keeps every value and limit on the scale, and nothing below zero that cannot be', () => {
  const domain = fitDomain([2, 300, 86])
  expect(domain[0]).toBe(0)
  expect(domain[1]).toBeGreaterThan(300)
  expect(placePercent(1e9, domain)).toBe(100)
  expect(placeZone({ from: -Infinity, to: 50, outcome: 'fail' }, [0, 100])).toEqual({ x: '0%', width: '50%' })
  expect(placeZone({ from: 200, to: 300, outcome: 'fail' }, [0, 100])).toBeUndefined()
})

it('stands neighbours on different lanes until the lanes run out', () => {
  expect(assignLanes([0, 3, 20, 22, 24], 9, 2)).toEqual([0, 1, 0, 1, 0])
})

const pile = [
  { slug: 'a', xPx: 100, yPx: 50 },
  { slug: 'b', xPx: 101, yPx: 50 },
  { slug: 'c', xPx: 100, yPx: 51 },
  { slug: 'far', xPx: 130, yPx: 50 },
]

it('picks the nearest mark, and every mark of a pile in turn', () => {
  expect(pickMark(pile, 128, 50, null)).toBe('far')
  const seen = new Set<string>()
  let selected: string | null = null
  for (let press = 0; press < 3; press++) {
    selected = pickMark(pile, 100, 50, selected) ?? null
    seen.add(selected ?? '')
  }
  expect([...seen].sort()).toEqual(['a', 'b', 'c'])
})

it('picks nothing where no mark is near', () => {
  expect(pickMark(pile, 300, 50, null)).toBeUndefined()
})

it('walks the marks by arrow keys, Home and End, and leaves other keys alone', () => {
  const slugs = ['a', 'b', 'c']
  expect(stepMark(slugs, null, 'ArrowRight')).toBe('a')
  expect(stepMark(slugs, 'a', 'ArrowRight')).toBe('b')
  expect(stepMark(slugs, 'c', 'ArrowRight')).toBe('c')
  expect(stepMark(slugs, null, 'ArrowLeft')).toBe('c')
  expect(stepMark(slugs, 'b', 'Home')).toBe('a')
  expect(stepMark(slugs, 'b', 'End')).toBe('c')
  expect(stepMark(slugs, 'b', 'Tab')).toBeUndefined()
})

it('knows the unit of a scale by its own name or its UCUM code', () => {
  // UCUM 2.2: Cel for degree Celsius, [ppth] for parts per thousand.
  expect(findScaleUnit('mm')).toBe('mm')
  expect(findScaleUnit('Cel')).toBe('C')
  expect(findScaleUnit('[ppth]')).toBe('ppt')
  expect(findScaleUnit(null)).toBe('count')
})
