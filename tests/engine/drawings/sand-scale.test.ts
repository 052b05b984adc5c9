import { describe, expect, it } from 'vitest'
import { drawSandScale } from '../../../shared/engine/drawings/sand-scale'

describe('the scale of grains, drawn', () => {
  it('has the classes of Wentworth, each twice as coarse as the one before', () => {
    // Wentworth 1922: medium sand 0.25–0.5 mm, coarse 0.5–1, very coarse 1–2, granules 2–4.
    const { classes } = drawSandScale(undefined, undefined)
    expect(classes).toContainEqual({ name: 'medium sand', fromMm: 0.25, toMm: 0.5 })
    expect(classes).toContainEqual({ name: 'granules', fromMm: 2, toMm: 4 })
    classes.slice(1).forEach(({ fromMm }, at) => expect(fromMm).toBe(classes[at]?.toMm))
  })

  it('places the sand with its middle at the root of smallest times largest', () => {
    expect(drawSandScale(0.5, 2).grains).toEqual({ minMm: 0.5, maxMm: 2, middleMm: 1 })
    expect(drawSandScale(0.5, undefined).grains).toBeNull()
  })

  it('stretches by whole classes for sand beyond it', () => {
    const { fromMm, toMm, classes } = drawSandScale(0.03, 20)
    expect([fromMm, toMm]).toEqual([0.015625, 32])
    expect(classes[0]).toMatchObject({ name: 'silt', fromMm: 0.015625 })
    expect(classes.at(-1)).toMatchObject({ name: 'pebbles', toMm: 32 })
  })
})
