import { describe, expect, it } from 'vitest'
import { drawHeatDay } from '../../../shared/engine/drawings/heat-day'
import { findHeaterNeed, findStuckOn } from '../../../shared/engine/heat-budget'
import { sceneFor, wholeSetup } from '../build'

describe('a day of water, drawn', () => {
  const scene = sceneFor(wholeSetup(), 'heater')
  const { needW } = findHeaterNeed(scene)

  it('stays at the goal where the heater is strong enough, and runs it for a share of the time', () => {
    const { held, duty, goalC } = drawHeatDay(scene, 2 * needW)
    expect(held).toHaveLength(25)
    expect(new Set(held?.map(({ waterC }) => waterC))).toEqual(new Set([goalC]))
    expect(duty).toBeCloseTo(0.5, 9)
  })

  it('falls where it is too weak, though less than with none', () => {
    const { held, off, goalC } = drawHeatDay(scene, needW / 2)
    const [weak, none] = [held?.at(-1)?.waterC ?? 0, off.at(-1)?.waterC ?? 0]
    expect(weak).toBeLessThan(goalC)
    expect(none).toBeLessThan(weak)
    // Nothing cools below the room by conduction; evaporation takes it a little under.
    expect(none).toBeGreaterThan(18 - 5)
  })

  it('rises towards what a stuck heater comes to', () => {
    const { stuck } = drawHeatDay(scene, 100)
    const { equilibriumC } = findStuckOn(scene, 100)
    expect(stuck?.[0]?.waterC).toBe(25)
    expect(stuck?.at(-1)?.waterC).toBeGreaterThan(28)
    expect(stuck?.at(-1)?.waterC).toBeLessThanOrEqual(equilibriumC)
  })

  it('has no lines for a heater where there is none', () => {
    expect(drawHeatDay(scene, undefined)).toMatchObject({ held: null, stuck: null, duty: null })
  })
})
