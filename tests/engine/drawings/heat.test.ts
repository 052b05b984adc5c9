import { describe, expect, it } from 'vitest'
import { drawHeat } from '#shared/engine/drawings/heat'
import { report } from '#shared/engine/report'
import { heater, item, piece, wholeSetup } from '../build'

describe('the heat that a setup takes, drawn from cold to warm', () => {
  it('begins at the need that the report states for the coldest room, and falls as the room warms', () => {
    const setup = wholeSetup({}, { items: [item('rod', heater({ powerW: 100 }))] })
    const { points, heaterW, heldC, coldestC, stuckOnC, goalC } = drawHeat(setup)!
    expect(points[0]!.roomC).toBe(coldestC)
    expect(points[0]!.needUpperW).toBeCloseTo(report(setup).budgets.heatW!.used, 9)
    points.slice(1).forEach(({ needW, needUpperW }, at) => {
      expect(needW).toBeLessThanOrEqual(points[at]!.needW)
      expect(needUpperW).toBeGreaterThanOrEqual(needW)
    })
    expect(heaterW).toBe(100)
    expect(heldC).not.toBeNull()
    expect(stuckOnC).toBeGreaterThan(goalC)
  })

  it('has no held room and nothing to stick without a heater, and warms with a pump in the water', () => {
    const bare = drawHeat(wholeSetup())!
    expect([bare.heaterW, bare.heldC, bare.stuckOnC]).toEqual([0, null, null])
    const pumped = drawHeat(wholeSetup({}, { items: [item('pump', piece('return-pump', { powerW: 40 }))] }))!
    expect(pumped.gainW).toBe(40)
    expect(pumped.unheatedC).toBeGreaterThan(bare.unheatedC)
  })
})
