import { findColdestHeldC, findHeaterNeed } from '../heat-budget'
import { otherControllers } from '../mains-budget'
import { glanceBy, lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import { once, type Scene } from '../scene'
import { practiceBasis, thresholds } from '../thresholds'
import { readNumber, readText } from '../values'
import { heaterPower, heaterStrength } from './heater-power'
import { ratedVolume } from './heater-rated-volume'
import { scaleHeaters } from './heater-scales'
import { heaterSpace } from './heater-space'

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
