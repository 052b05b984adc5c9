import { findHeaterNeed, findStuckOn, lossWAt } from '../heat-budget'
import { heatCapacityJK } from '../physics/seawater'
import { stuckOn } from '../physics/stuck-on'
import { once, type Scene } from '../scene'
import { readHourly, type HourlyPoint } from '../worksheets/hourly'

/** The water over a day from the goal on: as it should be, with the heater off, and with it stuck on. */
export interface HeatDayDrawing {
  readonly goalC: number
  readonly coldestC: number
  readonly warmestC: number
  /** In the coldest room, the heater working: at the goal, or falling where it is too weak. Null without a heater. */
  readonly held: readonly HourlyPoint[] | null
  /** Share of the time that it runs then; above 1 it is too weak. */
  readonly duty: number | null
  /** In the coldest room, with no heat but that of other gear. */
  readonly off: readonly HourlyPoint[]
  /** In the warmest room, the heater never switching off. Null without a heater. */
  readonly stuck: readonly HourlyPoint[] | null
}

/** A day of a setup's water with `heaterW` of heaters in all; undefined: none. */
export function drawHeatDay(scene: Scene, heaterW: number | undefined): HeatDayDrawing {
  const { plan } = scene
  const { gainW, needW } = once(scene, findHeaterNeed)
  const { temperatureC: goalC, salinityPpt } = plan.goals
  const { coldestC, warmestC } = plan.room
  const capacityJK = heatCapacityJK(plan.tank.waterL, salinityPpt, goalC)
  const follow = (inputW: number, roomC: number): readonly HourlyPoint[] => {
    const lossW = (waterC: number) => lossWAt(plan, waterC, roomC)
    return readHourly(stuckOn({ heatCapacityJK: capacityJK, inputW, lossW }, goalC).series)
  }
  const off = follow(gainW, coldestC)
  const flat = off.map(({ hour }) => ({ hour, waterC: goalC }))
  if (heaterW === undefined) return { goalC, coldestC, warmestC, held: null, duty: null, off, stuck: null }
  return {
    goalC,
    coldestC,
    warmestC,
    held: heaterW >= needW ? flat : follow(heaterW + gainW, coldestC),
    duty: needW / heaterW,
    off,
    stuck: readHourly(findStuckOn(scene, heaterW).series),
  }
}
