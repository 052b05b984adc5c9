import { findLast } from './bisect'
import { requireFinite } from './finite'

export interface CurvePoint {
  readonly headM: number
  readonly flowLph: number
}

/** Sorted by flow, no head above that of a lesser flow. */
export type PumpCurve = readonly CurvePoint[]

export interface OperatingPoint {
  readonly flowLph: number
  readonly headM: number
}

/** Closer together than this two points are one, L/h. */
const sameFlowLph = 1e-6

/**
 * Puts a pump's points in order. Where a point claims more head than one at a lesser flow it is brought down to that, so
 * that a slip in one number cannot give a pump two operating points. Null with fewer than two flows. RangeError for NaN.
 */
export function readPumpCurve(points: readonly CurvePoint[]): PumpCurve | null {
  let ceiling = Number.POSITIVE_INFINITY
  let flow = Number.NEGATIVE_INFINITY
  const curve: CurvePoint[] = []
  for (const { headM, flowLph } of points.toSorted((a, b) => a.flowLph - b.flowLph || b.headM - a.headM)) {
    requireFinite({ headM, flowLph })
    if (flowLph - flow < sameFlowLph) continue
    ceiling = Math.min(ceiling, headM)
    flow = flowLph
    curve.push({ headM: ceiling, flowLph })
  }
  return curve.length >= 2 ? curve : null
}

/**
 * Head of a pump at a flow, m: straight between its points, or with two points only the parabola H₀ − k Q² through them
 * (H₀(1 − (Q/Qm)²) where they are shut-off and free flow). Below the least flow of the curve the head stays, above the
 * greatest it is −∞: nobody has said that the pump delivers more. RangeError for NaN.
 */
export function pumpHeadM(curve: PumpCurve, flowLph: number): number {
  requireFinite({ flowLph })
  const first = curve[0]
  const last = curve.at(-1)
  if (!first || !last || flowLph > last.flowLph) return Number.NEGATIVE_INFINITY
  if (curve.length === 2) {
    const k = (first.headM - last.headM) / (last.flowLph ** 2 - first.flowLph ** 2)
    return first.headM + k * (first.flowLph ** 2 - Math.max(flowLph, first.flowLph) ** 2)
  }
  const upper = curve.findIndex((point) => point.flowLph >= flowLph)
  const right = curve[upper] ?? last
  const left = curve[upper - 1]
  if (!left) return first.headM
  return left.headM + ((right.headM - left.headM) * (flowLph - left.flowLph)) / (right.flowLph - left.flowLph)
}

/**
 * Where the pump's head meets what the system takes, found by bisection: one falls, the other rises. A pump that cannot
 * lift the water at all delivers 0. RangeError for NaN.
 */
export function findOperatingPoint(curve: PumpCurve, systemHeadM: (flowLph: number) => number): OperatingPoint {
  const most = curve.at(-1)?.flowLph ?? 0
  const lifts = (flowLph: number) => pumpHeadM(curve, flowLph) >= systemHeadM(flowLph)
  const flowLph = findLast(lifts, 0, most) ?? 0
  return { flowLph, headM: flowLph > 0 ? systemHeadM(flowLph) : pumpHeadM(curve, 0) }
}

/**
 * A pump's curve at a share of its full speed: flow in proportion, head with its square (affinity laws for a constant
 * impeller). RangeError for NaN.
 */
export function slowPump(curve: PumpCurve, speedShare: number): PumpCurve {
  requireFinite({ speedShare })
  return curve.map(({ headM, flowLph }) => ({ headM: headM * speedShare ** 2, flowLph: flowLph * speedShare }))
}

/** Power at a share of full speed, W: with its cube (affinity laws). RangeError for NaN. */
export function slowPumpPowerW(powerW: number, speedShare: number): number {
  requireFinite({ powerW, speedShare })
  return powerW * speedShare ** 3
}
