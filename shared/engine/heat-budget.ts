import { findIncludedPump } from './mains-budget'
import { findLast } from './physics/bisect'
import { tankHeatLoss, tankLossW, type TankHeatLoss } from './physics/heat'
import { heatCapacityJK } from './physics/seawater'
import { findEquilibriumC, stuckOn, type StuckOn } from './physics/stuck-on'
import { once, onceFor, type Scene } from './scene'
import type { Plan } from './setup/plan'
import type { Item } from './types'
import { readFlag, readNumber } from './values'

/** Kinds whose motor stands in the water and gives its heat to it. */
const inWater: ReadonlySet<string> = new Set(['return-pump', 'wavemaker', 'skimmer'])

/** Of a DC pump's rated power, what reaches the water: they are seldom run at full speed (common practice). */
const dcShare = 0.5

/** Heat in W that the gear in the water gives it, heaters left out; what states no power counts nothing and is not guessed. */
export function sumGainW(plan: Plan, items: readonly Item[]): number {
  const included = findIncludedPump(plan, items)?.powerW ?? 0
  return items.reduce((sum, { piece, quantity }) => {
    if (!inWater.has(piece.kind)) return sum
    const share = readFlag(piece.specs, 'dcControl') ? dcShare : 1
    return sum + share * quantity * (readNumber(piece.specs, 'powerW') ?? 0)
  }, included)
}

const toHeatInput = ({ tank: { boxes, lid }, room }: Plan, waterC: number, roomC: number) => ({
  boxes,
  lid,
  waterC,
  roomC,
  relativeHumidity: room.relativeHumidity,
})

/** Heat loss of the setup's water at a water and a room temperature, °C. */
export const lossAt = (plan: Plan, waterC: number, roomC: number): TankHeatLoss =>
  tankHeatLoss(toHeatInput(plan, waterC, roomC))

/** The same, W by ASHRAE's evaporation alone. */
export const lossWAt = (plan: Plan, waterC: number, roomC: number): number =>
  tankLossW(toHeatInput(plan, waterC, roomC))

export interface HeaterNeed {
  /** Loss at the goal in the coldest room less the heat gained, floor 0, W: by ASHRAE's evaporation, and by Shah's. */
  readonly needW: number
  readonly needUpperW: number
  /** The same in the room as it usually is. */
  readonly usualNeedW: number
  readonly gainW: number
  /** Of heaters that count beside the one judged. */
  readonly otherHeatersW: number
}

/** Rated power in W of all heaters among the items; those without a stated power count nothing. */
export const sumHeaterW = (items: readonly Item[]): number =>
  items.reduce(
    (sum, { piece, quantity }) =>
      piece.kind === 'heater' ? sum + quantity * (readNumber(piece.specs, 'powerW') ?? 0) : sum,
    0,
  )

export function findHeaterNeed({ plan, others }: Scene): HeaterNeed {
  const gainW = sumGainW(plan, others)
  const cold = lossAt(plan, plan.goals.temperatureC, plan.room.coldestC)
  const usualW = lossWAt(plan, plan.goals.temperatureC, plan.room.temperatureC)
  return {
    needW: Math.max(0, cold.totalW - gainW),
    needUpperW: Math.max(0, cold.totalUpperW - gainW),
    usualNeedW: Math.max(0, usualW - gainW),
    gainW,
    otherHeatersW: sumHeaterW(others),
  }
}

function searchColdestC(scene: Scene, heaterW: number, figure: 'totalW' | 'totalUpperW'): number {
  const { plan } = scene
  const { gainW } = once(scene, findHeaterNeed)
  const goalC = plan.goals.temperatureC
  const lossW = (roomC: number) =>
    figure === 'totalW' ? lossWAt(plan, goalC, roomC) : lossAt(plan, goalC, roomC).totalUpperW
  const fallsShort = (roomC: number) => lossW(roomC) > heaterW + gainW
  return findLast(fallsShort, -20, goalC + 20) ?? -20
}

const searchColdestUsual = (scene: Scene, heaterW: number) => searchColdestC(scene, heaterW, 'totalW')
const searchColdestUpper = (scene: Scene, heaterW: number) => searchColdestC(scene, heaterW, 'totalUpperW')

/** The coldest room, °C, in which `heaterW` still holds the goal, by the upper (Shah) or the usual figure; down to −20. */
export const findColdestHeldC = (scene: Scene, heaterW: number, figure: 'totalW' | 'totalUpperW'): number =>
  onceFor(scene, figure === 'totalW' ? searchColdestUsual : searchColdestUpper, heaterW)

function integrateStuckOn(scene: Scene, heaterW: number): StuckOn {
  const { plan } = scene
  const { gainW } = once(scene, findHeaterNeed)
  const { temperatureC, salinityPpt } = plan.goals
  const lossW = (waterC: number) => lossWAt(plan, waterC, plan.room.warmestC)
  return stuckOn(
    { heatCapacityJK: heatCapacityJK(plan.tank.waterL, salinityPpt, temperatureC), inputW: heaterW + gainW, lossW },
    temperatureC,
  )
}

/** What happens if heaters of `heaterW` in all never switch off in the warmest room. */
export const findStuckOn = (scene: Scene, heaterW: number): StuckOn => onceFor(scene, integrateStuckOn, heaterW)

/** Where the water settles in the warmest room with no heater on, °C. */
export function findUnheatedC({ plan, others }: Scene): number {
  const lossW = (waterC: number) => lossWAt(plan, waterC, plan.room.warmestC)
  return findEquilibriumC({ inputW: sumGainW(plan, others), lossW })
}
