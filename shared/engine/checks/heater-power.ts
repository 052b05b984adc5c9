import { findColdestHeldC, findHeaterNeed, findStuckOn, findUnheatedC } from '../heat-budget'
import { otherControllers } from '../mains-budget'
import { probabilityAtLeast, probabilityAtMost, standardUncertainty } from '../physics/conformance'
import { countOfThese, isMultiplied, lacking, type Candidate, type Judgement, type Rule, type Say } from '../rule'
import { once, type Scene } from '../scene'
import { hasAreas, noAreas } from './shape'
import { thresholds } from '../thresholds'
import type { Value } from '../types'
import { readMeasure, readText } from '../values'

const heatUses = [
  'room.coldestC',
  'room.temperatureC',
  'goals.temperatureC',
  'room.relativeHumidity',
  'tank.lid',
  'tank.material',
  'tank.wallMm',
  'tank.bottomMm',
  'tank.waterLineMm',
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.outerHeightMm',
  'tank.filtration',
  'tank.sump.lengthMm',
  'tank.sump.widthMm',
  'tank.sump.waterDepthMm',
  'tank.shape',
]

const noPower = lacking(['powerW'], () => 'Nobody has recorded its power yet.')

const uncertaintyW = (power: Value<number>, quantity: number) =>
  quantity * standardUncertainty(power.value, power.source, power.plusMinus, 'other')

function judgePower(scene: Scene, candidate: Candidate): Judgement {
  const { piece, quantity, mayMultiply } = candidate
  const power = readMeasure(piece.specs, 'powerW')
  if (!power) return noPower
  const { plan } = scene
  if (!hasAreas(plan)) return noAreas(plan)
  const { needW, needUpperW, usualNeedW, otherHeatersW } = once(scene, findHeaterNeed)
  const totalW = power.value * quantity + otherHeatersW
  const goalC = plan.goals.temperatureC
  const coldestC = plan.room.coldestC
  const probability = () => probabilityAtLeast(totalW, needUpperW, uncertaintyW(power, quantity))
  const base = { measured: totalW, limit: needUpperW, probability }
  if (needUpperW === 0) return { ...base, outcome: 'pass', say: () => 'No heater is needed at these temperatures.' }
  const holdsTo = (figure: 'totalW' | 'totalUpperW') => findColdestHeldC(scene, totalW, figure)
  if (totalW >= needUpperW && isMultiplied(candidate))
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `${countOfThese(quantity)}: one alone gives ${words.power(power.value)} of the ${words.pair([needW, needUpperW], 'W')} that hold ${words.temperature(goalC)}.`,
    }
  if (totalW >= needUpperW)
    return {
      ...base,
      outcome: 'pass',
      say: (words) =>
        `Holds ${words.temperature(goalC)} with the room down to ${words.temperature(holdsTo('totalUpperW'))}.`,
    }
  if (totalW >= needW)
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `${isMultiplied(candidate) ? `${countOfThese(quantity)} just hold` : 'Just holds'} ${words.temperature(goalC)} with the room at ${words.temperature(coldestC)}: no reserve on the coldest night (${words.power(totalW)} against ${words.pair([needW, needUpperW], 'W')}).`,
    }
  const both = totalW + power.value * quantity
  if (mayMultiply !== false && quantity === 1 && both >= needW)
    return {
      ...base,
      outcome: 'change',
      enough: 2,
      say: (words) =>
        `${countOfThese(2)}: one gives ${words.power(totalW)} of the ${words.pair([needW, needUpperW], 'W')} needed.`,
    }
  if (totalW >= usualNeedW)
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `Holds ${words.temperature(goalC)} only while the room stays above ${words.temperature(holdsTo('totalW'))}.`,
    }
  return {
    ...base,
    outcome: 'fail',
    say: (words) =>
      `Too weak: ${words.power(totalW)}, and with the room at ${words.temperature(coldestC)} it takes ${words.pair([needW, needUpperW], 'W')} to hold ${words.temperature(goalC)}.`,
  }
}

export const heaterPower: Rule = {
  id: 'heater.power',
  label: 'Power',
  worst: 'fail',
  unit: 'W',
  limitIs: 'least',
  basis: {
    type: 'physics',
    source:
      'ISO 6946 surface resistances, EN 572-1 and ISO 10456 conductivities; evaporation by ASHRAE (HVAC Applications, activity 0.5) and Shah 2014, ASHRAE Transactions 120(2)',
  },
  rule: 'All heaters together must replace the heat lost at the goal in the coldest room, less what other gear gives the water. At or above Shah’s figure: passes. Between ASHRAE’s and Shah’s: no reserve. Below: two of them, or only while the room stays warmer, where that helps.',
  reads: ['powerW'],
  uses: heatUses,
  failLabel: 'too weak for the coldest room',
  judge: judgePower,
}

/** Upper ends, W, of what passes and of what needs a second cut-off. */
export function findStrengthLimits(scene: Scene): { passW: number; changeW: number } {
  const { needW } = once(scene, findHeaterNeed)
  const litres = scene.plan.tank.waterL
  return {
    passW: Math.max(thresholds.heaterPassNeeds.value * needW, thresholds.heaterPassWPerL.value * litres),
    changeW: Math.max(thresholds.heaterChangeNeeds.value * needW, thresholds.heaterChangeWPerL.value * litres),
  }
}

/** The caution that every heater carries: what happens when it does not switch off. */
const warnStuckOn =
  (scene: Scene, totalW: number, isAlone: boolean): Say =>
  (words) => {
    const { equilibriumC, hoursTo30C, hoursTo34C } = findStuckOn(scene, totalW)
    const room = words.temperature(scene.plan.room.warmestC)
    const past = (limitC: number, hours: number | null) =>
      hours === null || hours === 0 ? [] : [`past ${words.temperature(limitC)} after ${words.measure(hours, 'h')}`]
    const steps = [...past(30, hoursTo30C), ...past(34, hoursTo34C)]
    const passing = steps.length > 0 ? `, ${steps.join(' and ')}` : ''
    return `If ${isAlone ? 'it sticks' : 'all heaters stick'} on with the room at ${room}, the water goes to ${words.temperature(equilibriumC)}${passing}. A second, independent cut-off is advised.`
  }

/** Said only where the water gets warm by itself; told by whoever reads the cautions, since it takes a search. */
const warnHot =
  (scene: Scene): Say =>
  (words) => {
    const hotC = once(scene, findUnheatedC)
    if (hotC <= thresholds.chillerFromC.value) return ''
    return `With the room at ${words.temperature(scene.plan.room.warmestC)} the water settles near ${words.temperature(hotC)} without any heater: it needs a fan or a chiller.`
  }

function judgeStrength(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const power = readMeasure(piece.specs, 'powerW')
  if (!power) return noPower
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  const totalW = power.value * quantity + once(scene, findHeaterNeed).otherHeatersW
  const { passW, changeW } = once(scene, findStrengthLimits)
  const thermostat = readText(piece.specs, 'thermostat')
  // A controller that is the heater's only thermostat is no second cut-off.
  const spoken = thermostat === 'built-in' || thermostat === 'external-included' ? 0 : 1
  const hasCutOff = otherControllers(scene).count > spoken
  const limit = hasCutOff ? changeW : passW
  const outcome = totalW <= limit ? 'pass' : totalW <= changeW ? 'change' : 'fail'
  return {
    outcome,
    measured: totalW,
    limit,
    probability: () => probabilityAtMost(totalW, limit, uncertaintyW(power, quantity)),
    ...(outcome === 'change' && { asks: { need: 'second-cut-off', amount: null, unit: null } }),
    cautions: [warnStuckOn(scene, totalW, totalW === power.value), warnHot(scene)],
    say: (words) =>
      outcome === 'pass'
        ? `Not too strong for ${words.volume(scene.plan.tank.waterL)}.`
        : outcome === 'change'
          ? `Strong for ${words.volume(scene.plan.tank.waterL)}: add a second, independent cut-off, such as a separate temperature controller.`
          : `Far too strong for ${words.volume(scene.plan.tank.waterL)}: ${words.power(totalW)}, where ${words.power(changeW)} would be the most.`,
  }
}

export const heaterStrength: Rule = {
  id: 'heater.not-too-strong',
  label: 'Not too strong',
  worst: 'fail',
  unit: 'W',
  basis: thresholds.heaterPassWPerL.basis,
  rule: `All heaters together pass up to ${thresholds.heaterPassNeeds.value} × the heat needed or ${thresholds.heaterPassWPerL.value} W per litre, whichever is more; up to ${thresholds.heaterChangeNeeds.value} × or ${thresholds.heaterChangeWPerL.value} W per litre with a second, independent cut-off. The caution gives the temperature the water would reach if they stuck on in the warmest room.`,
  reads: ['powerW', 'thermostat'],
  uses: ['room.coldestC', ...heatUses.slice(2)],
  failLabel: 'far too strong for this much water',
  judge: judgeStrength,
}
