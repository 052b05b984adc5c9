import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findInconsistencies } from '#shared/kinds/consistency'
import { kindKeys } from '#shared/kinds/index'
import type { BareSpecs } from '#shared/kinds/types'
import type { KindKey } from '#shared/kinds/index'

const pathsOf = (kind: KindKey, specs: BareSpecs) => findInconsistencies(kind, specs).map(({ path }) => path)

const sizes = { outerLengthMm: 600, outerWidthMm: 400, outerHeightMm: 400, wallMm: 8, bottomMm: 8 }
const chamber = { id: 'rear', lengthMm: 200, widthMm: 100, waterDepthMm: 300 }

describe('a tank', () => {
  it('that makes sense has no inconsistency', () => {
    const specs = { ...sizes, waterLineMm: 370, displayLengthMm: 584, displayWidthMm: 270, chambers: [chamber] }
    expect(pathsOf('tank', specs)).toEqual([])
  })

  it('cannot have walls as thick as half of it', () => {
    expect(pathsOf('tank', { ...sizes, wallMm: 200 })).toEqual(['wallMm'])
    expect(pathsOf('tank', { ...sizes, bottomMm: 400 })).toEqual(['bottomMm'])
  })

  it('cannot hold water, a display or a chamber larger than its inside', () => {
    expect(pathsOf('tank', { ...sizes, waterLineMm: 395 })).toEqual(['waterLineMm'])
    expect(pathsOf('tank', { ...sizes, displayLengthMm: 600 })).toEqual(['displayLengthMm'])
    expect(pathsOf('tank', { ...sizes, chambers: [chamber, { ...chamber, id: 'b', widthMm: 390 }] })).toEqual([
      'chambers.1.widthMm',
    ])
    expect(pathsOf('tank', { ...sizes, chambers: [{ ...chamber, waterDepthMm: 400 }] })).toEqual([
      'chambers.0.waterDepthMm',
    ])
  })

  it('cannot have a display and chambers that together cover more than its floor', () => {
    // The floor is 584 × 384 mm = 224 256 mm²; a display of 584 × 355 leaves 16 936 mm², a chamber takes 20 000.
    const specs = { ...sizes, displayLengthMm: 584, displayWidthMm: 355, chambers: [chamber] }
    expect(pathsOf('tank', specs)).toEqual(['chambers'])
    expect(pathsOf('tank', { ...specs, displayWidthMm: 284 })).toEqual([])
  })

  it('cannot name two chambers alike, nor an opening wider than its chamber', () => {
    expect(pathsOf('tank', { chambers: [chamber, chamber] })).toEqual(['chambers.1.id'])
    expect(pathsOf('tank', { chambers: [{ ...chamber, openingLengthMm: 202 }] })).toEqual([
      'chambers.0.openingLengthMm',
    ])
  })

  it('is not judged on what nobody has measured', () => {
    expect(pathsOf('tank', { outerLengthMm: 600, chambers: [{ id: 'rear' }] })).toEqual([])
  })
})

describe('a flow curve', () => {
  const curve = (...points: [number, number][]) => ({
    flowCurve: points.map(([headM, flowLph]) => ({ headM, flowLph })),
  })

  it('falls, whatever the order of its points', () => {
    expect(pathsOf('return-pump', curve([0, 2000], [1, 1200], [2, 0]))).toEqual([])
    expect(pathsOf('return-pump', curve([2, 0], [0, 2000], [1, 1200]))).toEqual([])
    expect(pathsOf('return-pump', curve([0, 2000], [1, 2000]))).toEqual(['flowCurve.1.flowLph'])
    expect(pathsOf('return-pump', curve([1, 2100], [0, 2000]))).toEqual(['flowCurve.0.flowLph'])
  })

  it('has at least two points at different heads', () => {
    expect(pathsOf('return-pump', curve([0, 2000]))).toEqual(['flowCurve'])
    expect(pathsOf('return-pump', curve([1, 2000], [1, 1000]))).toEqual(['flowCurve.1.headM'])
  })
})

describe('a spectrum', () => {
  const bands = (...rows: [number, number, number][]) => ({
    bands: rows.map(([fromNm, toNm, share]) => ({ fromNm, toNm, share })),
  })

  it('has bands beside each other whose shares reach at most 1', () => {
    expect(pathsOf('light', bands([400, 500, 0.6], [500, 600, 0.3], [600, 700, 0.1]))).toEqual([])
    expect(pathsOf('light', bands([400, 500, 0.6], [490, 600, 0.3]))).toEqual(['bands.1.fromNm'])
    expect(pathsOf('light', bands([500, 400, 0.6]))).toEqual(['bands.0.fromNm'])
    expect(pathsOf('light', bands([400, 500, 0.7], [500, 600, 0.4]))).toEqual(['bands'])
  })

  it('cannot be dimmed on a light that is only on or off', () => {
    expect(pathsOf('light', { control: 'on-off', dimmable: true })).toEqual(['dimmable'])
  })
})

describe('other kinds', () => {
  it.each<[KindKey, BareSpecs, string]>([
    ['heater', { ratedVolumeMinL: 100, ratedVolumeMaxL: 60 }, 'ratedVolumeMinL'],
    ['heater', { minImmersionMm: 310, lengthMm: 300 }, 'minImmersionMm'],
    ['sand', { grainMinMm: 2, grainMaxMm: 1 }, 'grainMinMm'],
    ['sand', { bulkDensityKgL: 2.9, solidDensityKgL: 2.8 }, 'bulkDensityKgL'],
    ['scraper', { form: 'handheld', wallMaxMm: 10 }, 'wallMaxMm'],
    ['scraper', { blades: ['steel'], acrylicSafe: true }, 'acrylicSafe'],
    ['ro-unit', { stages: ['sediment'], membraneLpd: 284 }, 'membraneLpd'],
    ['power-strip', { outlets: 6, switchedOutlets: 8 }, 'switchedOutlets'],
  ])('%s with %o contradicts itself', (kind, specs, path) => {
    expect(pathsOf(kind, specs)).toEqual([path])
  })

  it('say what is wrong by the labels that people read', () => {
    expect(findInconsistencies('sand', { grainMinMm: 2, grainMaxMm: 1 })[0]?.detail).toBe(
      'smallest grain must not be above largest grain',
    )
  })

  it('never throw, whatever the values are', () => {
    const anything = fc.dictionary(
      fc.constantFrom('chambers', 'flowCurve', 'bands', 'wallMm', 'outerLengthMm', 'stages', 'blades', 'sump'),
      fc.anything(),
    )
    fc.assert(
      fc.property(fc.constantFrom(...kindKeys), anything, (kind, specs) => {
        expect(Array.isArray(findInconsistencies(kind, specs))).toBe(true)
      }),
    )
  })
})
