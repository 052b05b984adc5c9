import { findCurveFaults } from '../../kinds/consistency-lists'
import { fittingsK, systemHeadM, type Pipe } from '../physics/flow'
import {
  findOperatingPoint,
  readPumpCurve,
  slowPump,
  type CurvePoint,
  type OperatingPoint,
  type PumpCurve,
} from '../physics/pump'
import type { Candidate } from '../rule'
import { once, type Scene } from '../scene'
import { defaults } from '../setup/defaults'
import { findBasins, type Basin } from '../setup/places'
import { thresholds } from '../thresholds'
import type { Specs } from '../types'
import { readGroups, readNumber } from '../values'

const elbows = 2
const chamberPipeMm = 600
const sumpPipeMm = 1800
const overflowMm = 100

/** What the water is pushed against: the lift in m and the pipe. */
export interface Plumbing {
  readonly staticHeadM: number
  readonly pipe: Pipe
}

/** The smaller of the tank's return and the pump's outlet; where neither is known, what tanks of the size have, mm. */
export function chooseBoreMm({ plan: { tank } }: Scene, specs: Specs): number {
  const known = [tank.returnBoreMm, readNumber(specs, 'boreMm')].filter((boreMm) => boreMm !== undefined)
  return known.length > 0 ? Math.min(...known) : tank.grossL <= 100 ? defaults.boreSmallMm : defaults.boreLargeMm
}

/** The lift from a sump's water to the return under the tank's rim, or from a chamber's level to the display's, m. */
export function findStaticHeadM({ plan }: Scene, basin: Basin): number {
  const { tank, room } = plan
  if (basin.id !== 'sump') return Math.max(0, tank.waterLineMm - basin.waterDepthMm) / 1000
  const bottomMm = room.tankTopMm - tank.outerHeightMm + tank.bottomMm
  return Math.max(0, bottomMm + tank.waterLineMm - overflowMm - basin.waterDepthMm) / 1000
}

export function describePlumbing(scene: Scene, specs: Specs, basin: Basin): Plumbing {
  const boreMm = chooseBoreMm(scene, specs)
  const lengthMm = basin.id === 'sump' ? sumpPipeMm : chamberPipeMm
  return {
    staticHeadM: findStaticHeadM(scene, basin),
    pipe: { boreMm, lengthMm, fittingsK: fittingsK(elbows, boreMm) },
  }
}

/** What is wrong with the curve that was recorded; undefined where nothing is, or nobody recorded one. */
export const findCurveFault = (specs: Specs): string | undefined =>
  findCurveFaults({ flowCurve: readGroups<CurvePoint>(specs, 'flowCurve') })[0]?.detail

/** Null where nobody recorded a curve, or one that no pump has. */
export const readCurve = (specs: Specs): PumpCurve | null => {
  const points = readGroups<CurvePoint>(specs, 'flowCurve')
  return points && findCurveFault(specs) === undefined ? readPumpCurve(points) : null
}

export const findPoint = (curve: PumpCurve, { staticHeadM, pipe }: Plumbing): OperatingPoint =>
  findOperatingPoint(curve, (flowLph) => systemHeadM(flowLph, staticHeadM, pipe))

export interface Turnover {
  readonly perHour: number
  readonly slowestPerHour: number
  readonly point: OperatingPoint
}

/** Turnovers an hour at full speed, and throttled as far as a pump with speed control goes. */
export function findTurnover(
  scene: Scene,
  { piece, quantity }: Candidate,
  basin: Basin,
  isControlled: boolean,
): Turnover | null {
  const curve = readCurve(piece.specs)
  if (!curve) return null
  const plumbing = describePlumbing(scene, piece.specs, basin)
  const point = findPoint(curve, plumbing)
  const slow = isControlled ? findPoint(slowPump(curve, thresholds.pumpSlowest.value), plumbing) : point
  const perHour = (flowLph: number) => (flowLph * quantity) / scene.plan.tank.waterL
  return { perHour: perHour(point.flowLph), slowestPerHour: perHour(slow.flowLph), point }
}

/** Turnovers an hour that pass, and that pass with a change. A goal that was given takes the place of the usual band. */
export function chooseBands({ plan }: Scene): { pass: readonly [number, number]; change: readonly [number, number] } {
  const given = plan.setup.goals?.turnoverPerHour
  if (given) return { pass: given, change: [0.75 * given[0], 1.33 * given[1]] }
  return { pass: plan.goals.turnoverPerHour, change: defaults.turnoverChangePerHour[plan.tank.filtration] }
}

const findUsual = ({ plan }: Scene) => findBasins(plan, undefined)

export const findPumpBasins = (scene: Scene, { place }: Candidate): readonly Basin[] =>
  place ? findBasins(scene.plan, place) : once(scene, findUsual)
