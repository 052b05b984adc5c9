import { conductivityWMK, surfaceResistanceM2KW, evaporationShareUnder } from '../physics/heat'
import { ashraeEvaporationKgM2H } from '../physics/evaporation'
import { latentHeatKJKg, saturationPressureKPa } from '../physics/vapour'
import type { TankHeatLoss } from '../physics/heat'
import type { Plan } from '../setup/plan'
import { put } from './quantities'
import type { Step } from './types'

interface Terms {
  readonly plan: Plan
  readonly loss: TankHeatLoss
}

const isoFilms = 'Surface resistances: ISO 6946; conductivities: EN 572-1 and ISO 10456'

/** Where the heat goes at the goal in the coldest room, wall by wall. */
export function listLossSteps({ plan, loss }: Terms): readonly Step[] {
  const { tank, goals, room } = plan
  const [main, ...others] = tank.boxes
  if (main === undefined) return []
  const liftK = goals.temperatureC - room.coldestC
  const floorM2 = (main.insideLengthMm * main.insideWidthMm) / 1e6
  const sidesM2 = (2 * (main.insideLengthMm + main.insideWidthMm) * main.waterDepthMm) / 1e6
  const surfaceM2 = tank.boxes.reduce((sum, box) => sum + (box.insideLengthMm * box.insideWidthMm) / 1e6, 0)
  const wall = (mm: number) => `${put(mm / 1000)} ÷ ${put(conductivityWMK[main.material])}`
  const andSump = others.length > 0 ? ', and the same for the sump' : ''
  const evaporation = ashraeEvaporationKgM2H({
    waterC: goals.temperatureC,
    roomC: room.coldestC,
    relativeHumidity: room.relativeHumidity,
  })
  const [pw, pa] = [
    saturationPressureKPa(goals.temperatureC),
    room.relativeHumidity * saturationPressureKPa(room.coldestC),
  ]
  const latent = latentHeatKJKg(goals.temperatureC)
  // A lid lies on the tank alone: a sump is open.
  const sump = others.length > 0 ? ` + ${put(surfaceM2 - floorM2)} m²` : ''
  const evaporating =
    tank.lid === 'solid' ? `(${put(evaporationShareUnder.solid)} × ${put(floorM2)} m²${sump})` : `${put(surfaceM2)} m²`
  return [
    {
      title: 'Through the sides',
      formula: 'wetted area × ΔT ÷ (0.13 + wall ÷ λ)',
      text: `${put(sidesM2)} m² × ${put(liftK)} K ÷ (${surfaceResistanceM2KW.sides} + ${wall(main.wallMm)}) m²K/W${andSump}`,
      value: loss.sidesW,
      unit: 'W',
      source: isoFilms,
    },
    {
      title: 'Through the bottom',
      formula: 'floor × ΔT ÷ (0.17 + bottom ÷ λ)',
      text: `${put(floorM2)} m² × ${put(liftK)} K ÷ (${surfaceResistanceM2KW.bottom} + ${wall(main.bottomMm)}) m²K/W${andSump}`,
      value: loss.bottomW,
      unit: 'W',
      source: isoFilms,
    },
    {
      title: 'From the surface, dry',
      formula: 'surface × ΔT ÷ 0.10',
      text: `${put(surfaceM2)} m² × ${put(liftK)} K ÷ ${surfaceResistanceM2KW.surface} m²K/W`,
      value: loss.surfaceW,
      unit: 'W',
      source: isoFilms,
    },
    {
      title: 'Water that evaporates, per square metre',
      formula: '0.5 (pw − pa) × 0.089 ÷ Y, × 3600',
      text: `0.5 × (${put(pw)} − ${put(pa)}) kPa × 0.089 ÷ ${put(latent)} kJ/kg × 3600 s/h`,
      value: evaporation,
      unit: 'kg/(m2.h)',
      source: 'ASHRAE Handbook, HVAC Applications, activity factor 0.5, still air',
    },
    {
      title: 'From the surface, by evaporation',
      formula: 'water per hour × heat of evaporation ÷ 3.6',
      text: `${evaporating} × ${put(evaporation)} kg/(m² h) × ${put(latent)} kJ/kg ÷ 3.6`,
      value: loss.evaporationW,
      unit: 'W',
    },
    {
      title: 'Heat lost',
      formula: 'sides + bottom + surface + evaporation',
      text: [loss.sidesW, loss.bottomW, loss.surfaceW, loss.evaporationW].map((watts) => `${put(watts)} W`).join(' + '),
      value: loss.totalW,
      unit: 'W',
    },
    {
      title: 'Heat lost, upper figure',
      formula: 'the same with evaporation by Shah',
      text: `${put(loss.totalW - loss.evaporationW)} W + ${put(loss.evaporationUpperW)} W`,
      value: loss.totalUpperW,
      unit: 'W',
      source: 'Shah 2014, ASHRAE Transactions 120(2)',
    },
  ]
}
