import { describe, expect, it } from 'vitest'
import { drawPump, drawPumpCurve } from '#shared/engine/drawings/pump'
import type { CurvePoint } from '#shared/engine/physics/pump'
import { judge, piece, wholeSetup } from '../build'

// Invented: shut-off head 1 m, free flow 1000 L/h.
const pump = (values: Readonly<Record<string, unknown>> = {}) =>
  piece('return-pump', {
    flowCurve: [
      { headM: 1, flowLph: 0 },
      { headM: 0, flowLph: 1000 },
    ],
    boreMm: 16,
    lengthMm: 60,
    widthMm: 50,
    heightMm: 55,
    ...values,
  })

/** Straight between drawn points, as the eye reads them. */
function readAt(curve: readonly CurvePoint[], flowLph: number): number {
  const at = curve.findIndex((point) => point.flowLph >= flowLph)
  const [left, right] = [curve[at - 1]!, curve[at]!]
  return left.headM + ((right.headM - left.headM) * (flowLph - left.flowLph)) / (right.flowLph - left.flowLph)
}

describe('a return pump at work, drawn', () => {
  const drawn = drawPump(wholeSetup(), pump())!

  it('follows H0 (1 − (Q/Qm)²) where two points are known (the affinity parabola)', () => {
    for (const { flowLph, headM } of drawn.curve) expect(headM).toBeCloseTo(1 - (flowLph / 1000) ** 2, 9)
  })

  it('begins the system at the lift: 350 mm of water in the display over 330 mm in the chamber', () => {
    expect(drawn.staticHeadM).toBeCloseTo(0.02, 9)
    expect(drawn.system[0]).toEqual({ flowLph: 0, headM: drawn.staticHeadM })
  })

  it('marks the point on both curves as they are drawn', () => {
    expect(readAt(drawn.curve, drawn.point.flowLph)).toBeCloseTo(drawn.point.headM, 2)
    expect(readAt(drawn.system, drawn.point.flowLph)).toBeCloseTo(drawn.point.headM, 2)
  })

  it('wants 4 to 12 times 84 L an hour: 336 to 1008 L/h', () => {
    expect(drawn.wanted!.lph[0]).toBeCloseTo(336, 6)
    expect(drawn.wanted!.lph[1]).toBeCloseTo(1008, 6)
    expect(judge(wholeSetup(), pump(), 'return-pump.flow').measured).toBeCloseTo(drawn.point.flowLph / 84, 9)
  })

  it('asks half of each of two pumps', () => {
    expect(drawPump(wholeSetup(), pump(), { quantity: 2 })!.wanted!.lph[0]).toBeCloseTo(168, 6)
  })

  it('throttles by the affinity laws: 40 % of the speed, 40 % of the flow, 16 % of the head', () => {
    expect(drawn.slowest).toBeNull()
    const slowest = drawPump(wholeSetup(), pump({ dcControl: true }))!.slowest!
    expect(slowest.curve[0]!.headM).toBeCloseTo(0.16, 9)
    expect(slowest.curve.at(-1)!.flowLph).toBeCloseTo(400, 9)
    expect(slowest.point.flowLph).toBeLessThan(drawn.point.flowLph)
  })

  it('draws what was recorded as it was, and the head of the first point down to no flow', () => {
    const recorded = [
      { headM: 0.9, flowLph: 200 },
      { headM: 0.5, flowLph: 600 },
      { headM: 0, flowLph: 900 },
    ]
    const curve = drawPumpCurve(pump({ flowCurve: recorded }))!
    expect(curve.recorded).toEqual(recorded)
    expect(curve.curve).toEqual([{ headM: 0.9, flowLph: 0 }, ...recorded])
  })

  it('draws nothing of a pump whose curve is not known', () => {
    expect(drawPumpCurve(pump({ flowCurve: undefined }))).toBeNull()
    expect(drawPump(wholeSetup(), pump({ flowCurve: undefined }))).toBeNull()
  })
})
