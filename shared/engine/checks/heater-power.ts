import { findColdestHeldC, findHeaterNeed, findStuckOn, findUnheatedC } from '../heat-budget'
import { otherControllers } from '../mains-budget'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast, probabilityAtMost } from '../physics/conformance'
import {
  countOfThese,
  isMultiplied,
  lacking,
  glanceBy,
  type Candidate,
  type Judgement,
  type Rule,
  type Say,
  type Way,
} from '../rule'
import { once, type Scene } from '../scene'
import { hasAreas, noAreas } from './shape'
import { thresholds } from '../thresholds'
import type { Specs, Value } from '../types'
import { readMeasure, readNumber, readText } from '../values'

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

const strengthUses = heatUses.filter((path) => path !== 'room.temperatureC')

/** The bed of sand lies in the display; it counts where rock and sand were both given. */
const sandUses = ['tank.displayLengthMm', 'tank.displayWidthMm']

const noPower = lacking(['powerW'], () => 'Nobody has recorded its power yet.')

const doubtPower = (power: Value<number>, quantity: number) => [
  doubt(power, 'other', 'check the power on its rating plate', quantity),
]

/** What all heaters together do: from more than is needed down to too little; `pair`: a second one like it would do. */
type PowerGrade = 'unneeded' | 'holds' | 'several' | 'barely' | 'pair' | 'usually' | 'weak'

const outcomeOf: Readonly<Record<PowerGrade, 'pass' | 'change' | 'fail'>> = {
  unneeded: 'pass',
  holds: 'pass',
  several: 'change',
  barely: 'change',
  pair: 'change',
  usually: 'change',
  weak: 'fail',
}

function gradePower(scene: Scene, way: Way, powerW: number): PowerGrade {
  const { needW, needUpperW, usualNeedW, otherHeatersW } = once(scene, findHeaterNeed)
  const { quantity, mayMultiply } = way
  const totalW = powerW * quantity + otherHeatersW
  if (needUpperW === 0) return 'unneeded'
  if (totalW >= needUpperW) return isMultiplied(way) ? 'several' : 'holds'
  if (totalW >= needW) return 'barely'
  if (mayMultiply !== false && quantity === 1 && totalW + powerW >= needW) return 'pair'
  return totalW >= usualNeedW ? 'usually' : 'weak'
}

const glanceAtPower = glanceBy(
  (specs) => readNumber(specs, 'powerW'),
  (scene, powerW, way) => {
    if (powerW === undefined) return undefined
    if (!hasAreas(scene.plan)) return 'unknown'
    const grade = gradePower(scene, way, powerW)
    // That two would do is more than an outcome.
    return grade === 'pair' ? undefined : outcomeOf[grade]
  },
  (powerW = 0) => ({ among: 0, hardness: -powerW }),
)

function judgePower(scene: Scene, candidate: Candidate): Judgement {
  const { piece, quantity } = candidate
  const power = readMeasure(piece.specs, 'powerW')
  if (!power) return noPower
  const { plan } = scene
  if (!hasAreas(plan)) return noAreas(plan)
  const { needW, needUpperW, otherHeatersW } = once(scene, findHeaterNeed)
  const totalW = power.value * quantity + otherHeatersW
  const goalC = plan.goals.temperatureC
  const coldestC = plan.room.coldestC
  const grade = gradePower(scene, candidate, power.value)
  return {
    outcome: outcomeOf[grade],
    measured: totalW,
    limit: needUpperW,
    ...beSure(
      (u) => probabilityAtLeast(totalW, needUpperW, u),
      () => doubtPower(power, quantity),
    ),
    ...(grade === 'pair' && { enough: 2 }),
    say: (words) => {
      const goal = words.temperature(goalC)
      const needed = () => words.pair([needW, needUpperW], 'W')
      const coldest = () => words.temperature(coldestC)
      const holdsTo = (figure: 'totalW' | 'totalUpperW') => words.temperature(findColdestHeldC(scene, totalW, figure))
      switch (grade) {
        case 'unneeded':
          return 'No heater is needed at these temperatures.'
        case 'holds':
          return `Holds ${goal} with the room down to ${holdsTo('totalUpperW')}.`
        case 'several':
          return `${countOfThese(quantity)}: one alone gives ${words.power(power.value)} of the ${needed()} that hold ${goal}.`
        case 'barely':
          return `${isMultiplied(candidate) ? `${countOfThese(quantity)} just hold` : 'Just holds'} ${goal} with the room at ${coldest()}: no reserve on the coldest night (${words.power(totalW)} against ${needed()}).`
        case 'pair':
          return `${countOfThese(2)}: one gives ${words.power(totalW)} of the ${needed()} needed.`
        case 'usually':
          return `Holds ${goal} only while the room stays above ${holdsTo('totalW')}.`
        case 'weak':
          return `Too weak: ${words.power(totalW)}, and with the room at ${coldest()} it takes ${needed()} to hold ${goal}.`
      }
    },
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
  glance: glanceAtPower,
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

const readStrength = (specs: Specs) => ({
  powerW: readNumber(specs, 'powerW'),
  // A controller that is the heater's only thermostat is no second cut-off.
  spoken: ['built-in', 'external-included'].includes(readText(specs, 'thermostat') ?? '') ? 0 : 1,
})

function gradeStrength(scene: Scene, { quantity }: Way, powerW: number, spoken: number) {
  const totalW = powerW * quantity + once(scene, findHeaterNeed).otherHeatersW
  const { passW, changeW } = once(scene, findStrengthLimits)
  const hasCutOff = otherControllers(scene).count > spoken
  const limit = hasCutOff ? changeW : passW
  const outcome: 'pass' | 'change' | 'fail' = totalW <= limit ? 'pass' : totalW <= changeW ? 'change' : 'fail'
  return { outcome, totalW, limit, changeW }
}

const glanceAtStrength = glanceBy(
  readStrength,
  (scene, { powerW, spoken }, way) => {
    if (powerW === undefined) return undefined
    return hasAreas(scene.plan) ? gradeStrength(scene, way, powerW, spoken).outcome : 'unknown'
  },
  ({ powerW = 0, spoken }) => ({ among: spoken, hardness: powerW }),
)

function judgeStrength(scene: Scene, candidate: Candidate): Judgement {
  const { piece, quantity } = candidate
  const power = readMeasure(piece.specs, 'powerW')
  if (!power) return noPower
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  const { outcome, totalW, limit, changeW } = gradeStrength(
    scene,
    candidate,
    power.value,
    readStrength(piece.specs).spoken,
  )
  return {
    outcome,
    measured: totalW,
    limit,
    ...beSure(
      (u) => probabilityAtMost(totalW, limit, u),
      () => doubtPower(power, quantity),
    ),
    ...(outcome === 'change' && { asks: { need: 'second-cut-off', amount: null, unit: null } }),
    rests: () => (scene.plan.tank.waterL < scene.plan.tank.grossL ? [...strengthUses, ...sandUses] : strengthUses),
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
  uses: [...strengthUses, ...sandUses],
  failLabel: 'far too strong for this much water',
  glance: glanceAtStrength,
  judge: judgeStrength,
}
