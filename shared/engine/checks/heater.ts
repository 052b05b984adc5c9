import { findColdestHeldC, findHeaterNeed } from '../heat-budget'
import { otherControllers } from '../mains-budget'
import { glanceBy, lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import { once, type Scene } from '../scene'
import { beSure } from '../doubt'
import { probabilityAtLeast, probabilityAtMost } from '../physics/conformance'
import { practiceBasis, thresholds } from '../thresholds'
import type { Specs } from '../types'
import { readNumber, readText } from '../values'
import { doubtRated, grossUses, hasRatedVolume, isVolumeStated, noAreas } from './shape'
import { heaterPower, heaterStrength } from './heater-power'
import { scaleHeaters } from './heater-scales'
import { heaterSpace } from './heater-space'

const readRating = (specs: Specs) => ({
  min: readNumber(specs, 'ratedVolumeMinL'),
  max: readNumber(specs, 'ratedVolumeMaxL'),
})

type Rating = ReturnType<typeof readRating>

/** The volumes that pass: its maker's rating and a little to either side, since a watt heats alike in any tube. */
function widenRating({ min, max }: Rating): Rating {
  const slack = thresholds.ratedVolumeSlack.value
  return {
    min: min === undefined ? undefined : min * (1 - slack),
    max: max === undefined ? undefined : max * (1 + slack),
  }
}

const isBelow = (ratedL: number, { min }: Rating) => min !== undefined && ratedL < min
const isAbove = (ratedL: number, { max }: Rating) => max !== undefined && ratedL > max
const isOutside = (ratedL: number, rating: Rating) => isBelow(ratedL, rating) || isAbove(ratedL, rating)

const glanceAtRatedVolume = glanceBy(readRating, ({ plan }, rating) => {
  if ((rating.min === undefined && rating.max === undefined) || !hasRatedVolume(plan)) return undefined
  return isOutside(plan.tank.ratedL, widenRating(rating)) ? 'change' : 'pass'
})

function judgeRatedVolume({ plan }: Scene, { piece }: Candidate): Judgement {
  const rating = readRating(piece.specs)
  const { min, max } = rating
  if (min === undefined && max === undefined)
    return lacking(['ratedVolumeMaxL'], () => 'Nobody has recorded the volumes its maker rates it for.')
  const { ratedL } = plan.tank
  if (!hasRatedVolume(plan)) return noAreas(plan)
  // Outcome, limit, margin and probability all go by the widened rating: what passes has something to spare.
  const passes = widenRating(rating)
  const isFar = isOutside(ratedL, passes)
  const isBarelyOutside = !isFar && isOutside(ratedL, rating)
  return {
    outcome: isFar ? 'change' : 'pass',
    measured: ratedL,
    limit:
      passes.min !== undefined && passes.max !== undefined
        ? [passes.min, passes.max]
        : (passes.max ?? passes.min ?? null),
    margin: measureMargin(ratedL, passes),
    ...beSure(
      (u) =>
        Math.min(
          probabilityAtLeast(ratedL, passes.min ?? 0, u),
          passes.max === undefined ? 1 : probabilityAtMost(ratedL, passes.max, u),
        ),
      () => doubtRated(plan),
    ),
    cautions: isBarelyOutside
      ? [
          (words) =>
            `Its maker’s rating ${isBelow(ratedL, rating) ? 'starts just above' : 'stops just short of'} this tank’s ${words.volume(ratedL)}.`,
        ]
      : [],
    rests: () => (isVolumeStated(plan) ? [] : grossUses),
    say: (words) => {
      const range =
        min !== undefined && max !== undefined
          ? words.pair([min, max], 'L')
          : max !== undefined
            ? `up to ${words.volume(max)}`
            : `from ${words.volume(min ?? 0)}`
      if (isFar) return `Its maker rates it for a ${isBelow(ratedL, rating) ? 'larger' : 'smaller'} tank: ${range}.`
      if (isBarelyOutside) return `Its maker rates it for ${range}, and this tank is only a little off that.`
      return `Its maker rates it for ${range}.`
    },
  }
}

function measureMargin(value: number, { min, max }: Rating): number | null {
  if (min !== undefined && max !== undefined) return max > min ? Math.min(value - min, max - value) / (max - min) : null
  if (max !== undefined) return max === 0 ? null : (max - value) / max
  return min ? (value - min) / min : null
}

const ratedVolume: Rule = {
  id: 'heater.rated-volume',
  label: 'Rated volume',
  worst: 'change',
  unit: 'L',
  basis: practiceBasis,
  rule: `The tank’s nominal volume passes within its maker’s rating and ${100 * thresholds.ratedVolumeSlack.value} % to either side of it, outside of the rating itself with a caution; further is a change. Makers’ ratings differ between tube types though a watt heats alike in any.`,
  reads: ['ratedVolumeMinL', 'ratedVolumeMaxL'],
  uses: grossUses,
  failLabel: 'rated for another size of tank',
  glance: glanceAtRatedVolume,
  judge: judgeRatedVolume,
}

function judgeThermostat(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const thermostat = readText(piece.specs, 'thermostat')
  if (thermostat === undefined)
    return lacking(['thermostat'], () => 'Nobody has recorded whether it has its own thermostat.')
  if (thermostat !== 'external-needed')
    return {
      outcome: 'pass',
      measured: thermostat,
      say: () => (thermostat === 'built-in' ? 'Has its own thermostat.' : 'Comes with its controller.'),
    }
  const powerW = readNumber(piece.specs, 'powerW')
  const plugs = readNumber(piece.specs, 'plugs')
  const controllers = otherControllers(scene)
  if (controllers.count > 0) {
    const missing = [...(powerW === undefined ? ['powerW'] : []), ...(plugs === undefined ? ['plugs'] : [])]
    if (powerW === undefined || plugs === undefined)
      return lacking(
        missing,
        () => 'Nobody has recorded the power and plugs that the temperature controller would have to switch.',
      )
    const loadLeftW = controllers.maxLoadW - controllers.loadedW
    const outletsLeft = controllers.outlets - controllers.pluggedIn
    const canSwitch =
      controllers.strongestW >= powerW && loadLeftW >= powerW * quantity && outletsLeft >= plugs * quantity
    if (controllers.isUnsure)
      return lacking(
        [],
        () => 'Nobody has recorded all that the temperature controller in the setup carries and can carry.',
      )
    if (canSwitch)
      return {
        outcome: 'pass',
        measured: thermostat,
        say: () => 'The temperature controller in the setup can switch it.',
      }
  }
  const amount = powerW === undefined ? null : powerW * quantity
  return {
    outcome: 'change',
    measured: thermostat,
    asks: { need: 'temperature-control', amount, unit: 'W' },
    say: (words) => {
      const load = amount === null ? '' : ` for ${words.power(amount)}`
      const more =
        controllers.count > 0 ? 'another temperature controller, or a larger one,' : 'a temperature controller'
      return `Has no thermostat: needs ${more}${load}.`
    },
  }
}

/** Most heaters have their own: then nothing else matters. */
const glanceAtThermostat = glanceBy(
  (specs) => readText(specs, 'thermostat'),
  (_scene, found) => (found === undefined || found === 'external-needed' ? undefined : 'pass'),
)

const thermostat: Rule = {
  id: 'heater.thermostat',
  label: 'Thermostat',
  worst: 'change',
  unit: null,
  basis: practiceBasis,
  rule: 'Built in or included passes; otherwise a temperature controller in the setup with load and an outlet to spare.',
  reads: ['thermostat', 'powerW', 'plugs'],
  uses: [],
  failLabel: 'without a thermostat',
  glance: glanceAtThermostat,
  judge: judgeThermostat,
}

/** Share of the time that the heaters would run in the coldest room: need over power, 0 to 1 and beyond. */
function findDuty(scene: Scene, { piece, quantity }: Candidate): number | null {
  const powerW = readNumber(piece.specs, 'powerW')
  const { needW, otherHeatersW } = once(scene, findHeaterNeed)
  return powerW === undefined ? null : needW / (powerW * quantity + otherHeatersW)
}

const verbs = { upright: 'Stands', leaning: 'Leans', flat: 'Lies' } as const

export const heaterRules: KindRules = {
  rules: [heaterSpace, heaterPower, heaterStrength, ratedVolume, thermostat],
  targetReads: ['powerW'],
  feltThrough: ['powerW', 'plugs', 'thermostat'],
  target: (scene, candidate) => {
    const duty = findDuty(scene, candidate)
    return duty === null ? null : Math.abs(duty - thresholds.heaterTargetDuty.value)
  },
  summary: {
    covers: ['heater.space', 'heater.power'],
    write: (scene, candidate, placement) => (words) => {
      const powerW =
        (readNumber(candidate.piece.specs, 'powerW') ?? 0) * candidate.quantity +
        once(scene, findHeaterNeed).otherHeatersW
      const held = findColdestHeldC(scene, powerW, 'totalUpperW')
      const basin = scene.plan.tank.chambers.find(({ id }) => id === placement?.chamber)?.name ?? placement?.chamber
      const stands = placement ? `${verbs[placement.position]} in the ${basin} and holds` : 'Holds'
      return `${stands} ${words.temperature(scene.plan.goals.temperatureC)} with the room down to ${words.temperature(held)}.`
    },
  },
  scales: scaleHeaters,
}
