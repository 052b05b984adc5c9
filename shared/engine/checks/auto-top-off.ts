import { lossAt } from '../heat-budget'
import { lacking, type Candidate, type Judgement, type KindRules, type Say } from '../rule'
import { once, type Scene } from '../scene'
import { thresholds } from '../thresholds'
import type { Value } from '../types'
import { readMeasure, readNumber } from '../values'
import { chooseBasin, describeBody, listBodySizes, tryBody } from './body-space'
import { createRuleMaker } from './build-rule'
import { findPumpBasins } from './pump-flow'

const nothing: Value<number> = { value: 0, source: 'measured' }

function judgeSpace(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  const length = readMeasure(specs, 'lengthMm')
  const width = readMeasure(specs, 'widthMm')
  const missing = [...(length ? [] : ['lengthMm']), ...(width ? [] : ['widthMm'])]
  if (!length || !width) return lacking(missing, () => 'Nobody has recorded the size of its sensor.')
  const body = { length, width, height: nothing, depth: nothing, clearanceMm: 0, quantity: candidate.quantity }
  const found = chooseBasin(findPumpBasins(scene, candidate).map((basin) => tryBody(body, basin, scene.others)))
  if (!found) return { outcome: 'fail', say: () => 'The setup has no such chamber.' }
  return {
    outcome: found.fits ? 'pass' : 'fail',
    measured: found.measuredMm,
    limit: found.limitMm,
    probability: found.probability,
    rests: () => listBodySizes(found),
    say: (words) => describeBody(found)(words).replace('Stands in', 'Its sensor fits in'),
  }
}

/** Litres that evaporate in a day in the room as it usually is. */
const findEvaporationLpd = ({ plan }: Scene): number =>
  lossAt(plan, plan.goals.temperatureC, plan.room.temperatureC).evaporationLPerDay

function judgeLift(scene: Scene, { piece }: Candidate): Judgement {
  const head = readMeasure(piece.specs, 'pumpHeadM')
  if (!head) return lacking(['pumpHeadM'], () => 'Nobody has recorded how high its pump lifts.')
  const liftM = scene.plan.room.tankTopMm / 1000
  const reservoir = readNumber(piece.specs, 'reservoirL')
  const perDay = once(scene, findEvaporationLpd)
  const isSmall = reservoir !== undefined && reservoir < thresholds.reservoirDays.value * perDay
  const cautions: Say[] = isSmall
    ? [
        (words) =>
          `Its ${words.volume(reservoir)} last less than ${thresholds.reservoirDays.value} days: about ${words.volume(perDay)} evaporate in one.`,
      ]
    : []
  return {
    outcome: head.value >= liftM ? 'pass' : 'fail',
    measured: head.value,
    limit: liftM,
    cautions,
    say: (words) =>
      `Lifts ${words.measure(head.value, 'm')}, and the rim is ${words.measure(liftM, 'm')} above the floor.`,
  }
}

const rule = createRuleMaker('auto-top-off')

export const autoTopOffRules: KindRules = {
  rules: [
    rule('space', {
      label: 'Room for the sensor',
      worst: 'fail',
      unit: 'mm',
      rule: 'Its sensor fits in a chamber with what else is there.',
      reads: ['lengthMm', 'widthMm'],
      uses: [
        'tank.chambers.*.lengthMm',
        'tank.chambers.*.widthMm',
        'tank.sump.lengthMm',
        'tank.sump.widthMm',
        'tank.displayLengthMm',
        'tank.displayWidthMm',
      ],
      failLabel: 'too large for the place',
      judge: judgeSpace,
    }),
    rule('lift', {
      label: 'Lift',
      worst: 'fail',
      unit: 'm',
      limitIs: 'least',
      rule: `Its pump lifts water from the floor over the tank’s rim; a reservoir for less than ${thresholds.reservoirDays.value} days of evaporation is a caution.`,
      reads: ['pumpHeadM', 'reservoirL'],
      uses: ['room.tankTopMm'],
      failLabel: 'too weak to lift water over the rim',
      judge: judgeLift,
    }),
  ],
  feltThrough: ['powerW', 'plugs'],
}
