import { requireFinite } from './finite'
import { dryAirDensityKgM3, humidityRatio, latentHeatKJKg, saturationPressureKPa } from './vapour'

/** Water surface and the air of the room. Humidity runs from 0 to 1. */
export interface SurfaceAir {
  readonly waterC: number
  readonly roomC: number
  readonly relativeHumidity: number
}

/** Of ASHRAE's table of activity factors the lowest, for a quiet surface. */
const activityFactor = 0.5

function readPressures({ waterC, roomC, relativeHumidity }: SurfaceAir) {
  if (!Number.isFinite(waterC + roomC + relativeHumidity)) requireFinite({ waterC, roomC, relativeHumidity })
  const humidity = Math.min(1, Math.max(0, relativeHumidity))
  return { water: saturationPressureKPa(waterC), room: humidity * saturationPressureKPa(roomC) }
}

/**
 * Evaporation from a quiet surface in still air, kg/(m² h), never below 0 (condensation is left out).
 * Source: ASHRAE Handbook, HVAC Applications, wp = A Fa (pw − pa)(0.089 + 0.0782 V)/Y with V = 0 and Fa = 0.5; the SI
 * constants are quoted from memory and agree with the inch-pound form of the 1998 abstract. RangeError for NaN.
 */
export function ashraeEvaporationKgM2H(air: SurfaceAir): number {
  const { water, room } = readPressures(air)
  return (Math.max(0, activityFactor * (water - room) * 0.089) / latentHeatKJKg(air.waterC)) * 3600
}

/**
 * Evaporation from an undisturbed surface, kg/(m² h), never below 0. Source: M. M. Shah 2014, ASHRAE Transactions
 * 120(2): the larger of 35 ρw (ρr − ρw)^⅓ (Ww − Wr) and 5e-5 (pw − pr), p in Pa and ρ in kg of dry air per m³. The first
 * is natural convection and vanishes where the room's air is lighter than the air at the surface. RangeError for NaN.
 */
export function shahEvaporationKgM2H(air: SurfaceAir): number {
  const { water, room } = readPressures(air)
  const densityWater = dryAirDensityKgM3(air.waterC, water)
  const lift = Math.max(0, dryAirDensityKgM3(air.roomC, room) - densityWater)
  const natural = 35 * densityWater * Math.cbrt(lift) * (humidityRatio(water) - humidityRatio(room))
  const forced = 5e-5 * (water - room) * 1000
  return Math.max(0, natural, forced)
}

/** Heat carried off by evaporation, W, at `kgPerHour` from water at `waterC`. RangeError for NaN. */
export function evaporationHeatW(kgPerHour: number, waterC: number): number {
  if (!Number.isFinite(kgPerHour)) requireFinite({ kgPerHour })
  return (kgPerHour * latentHeatKJKg(waterC)) / 3.6
}
