import { choosePumpBasin } from '../checks/return-pump'
import { chooseBands, describePlumbing, findPoint, readCurve, type Plumbing } from '../checks/pump-flow'
import { systemHeadM } from '../physics/flow'
import { pumpHeadM, slowPump, type CurvePoint, type OperatingPoint, type PumpCurve } from '../physics/pump'
import { thresholds } from '../thresholds'
import type { Piece, Place, Setup } from '../types'
import { readFlag } from '../values'
import { sceneFor } from './scene'

export interface PumpOptions {
  readonly quantity?: number
  readonly place?: Place
}

/** A pump's curve to be drawn with straight lines, and the points that somebody recorded. */
export interface PumpCurveDrawing {
  readonly curve: readonly CurvePoint[]
  readonly recorded: readonly CurvePoint[]
}

/** A pump at work in a setup. */
export interface PumpDrawing extends PumpCurveDrawing {
  /** What lift and pipe take. */
  readonly system: readonly CurvePoint[]
  /** Where both cross. Flow 0: the pump does not lift the water. */
  readonly point: OperatingPoint
  /** Flows of one pump at which the water is turned over as often as wanted; null where nobody wants anything. */
  readonly wanted: {
    readonly lph: readonly [number, number]
    readonly turnoversPerHour: readonly [number, number]
  } | null
  /** Throttled as far as its speed control goes; null without one. */
  readonly slowest: {
    readonly speedShare: number
    readonly curve: readonly CurvePoint[]
    readonly point: OperatingPoint
  } | null
  readonly staticHeadM: number
  readonly boreMm: number
  /** Its length and fittings were said, not taken as usual. */
  readonly isPipeGiven: boolean
}

const samples = 40

const spread = (toLph: number, headM: (flowLph: number) => number): readonly CurvePoint[] =>
  Array.from({ length: samples + 1 }, (_, step) => (step / samples) * toLph).map((flowLph) => ({
    flowLph,
    headM: headM(flowLph),
  }))

/** Two points make a parabola, more are joined; from no flow on, where the head of the first holds. */
function sample(curve: PumpCurve): readonly CurvePoint[] {
  const [first] = curve
  const last = curve.at(-1)
  if (!first || !last) return []
  if (curve.length === 2) return spread(last.flowLph, (flowLph) => pumpHeadM(curve, flowLph))
  return first.flowLph > 0 ? [{ flowLph: 0, headM: first.headM }, ...curve] : curve
}

/** A pump's curve alone; null where nobody recorded one. */
export function drawPumpCurve({ specs }: Piece): PumpCurveDrawing | null {
  const recorded = readCurve(specs)
  return recorded && { curve: sample(recorded), recorded }
}

/**
 * A return pump's curve and what the setup's lift and pipe take. Null where nobody recorded its curve or the setup has no
 * place for it. RangeError where the tank has neither size nor volume.
 */
export function drawPump(setup: Setup, piece: Piece, options: PumpOptions = {}): PumpDrawing | null {
  const scene = sceneFor(setup, 'return-pump')
  const { quantity = 1, place } = options
  const recorded = readCurve(piece.specs)
  const basin = choosePumpBasin(scene, { piece, quantity, ...(place && { place }) })
  if (!recorded || !basin) return null
  const plumbing = describePlumbing(scene, piece.specs, basin)
  const { pass } = chooseBands(scene)
  const toFlow = (perHour: number) => (perHour * scene.plan.tank.waterL) / quantity
  const speedShare = thresholds.pumpSlowest.value
  const slow = readFlag(piece.specs, 'dcControl') === true ? slowPump(recorded, speedShare) : null
  return {
    ...drawWorking(recorded, plumbing, { lph: [toFlow(pass[0]), toFlow(pass[1])], turnoversPerHour: pass }),
    slowest: slow && { speedShare, curve: sample(slow), point: findPoint(slow, plumbing) },
  }
}

function drawWorking(recorded: PumpCurve, plumbing: Plumbing, wanted: PumpDrawing['wanted']): PumpDrawing {
  const { staticHeadM, pipe } = plumbing
  return {
    curve: sample(recorded),
    recorded,
    system: spread(Math.max(recorded.at(-1)?.flowLph ?? 0, wanted?.lph[1] ?? 0), (flowLph) =>
      systemHeadM(flowLph, staticHeadM, pipe),
    ),
    point: findPoint(recorded, plumbing),
    wanted,
    slowest: null,
    staticHeadM,
    boreMm: pipe.boreMm,
    isPipeGiven: false,
  }
}

/** A pump on a pipe that somebody described, whatever tank it feeds. */
export const drawPumpOnPipe = (recorded: PumpCurve, plumbing: Plumbing): PumpDrawing => ({
  ...drawWorking(recorded, plumbing, null),
  isPipeGiven: true,
})
