import { lossAt } from '../heat-budget'
import { lacking, type Candidate, type Judgement, type KindRules, type Say } from '../rule'
import { once, type Scene } from '../scene'
import { thresholds } from '../thresholds'
import type { Value } from '../types'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'
import { readMeasure, readNumber } from '../values'
import { bodyUses, judgeBody, lackWater } from './body-judgement'
import { chooseBasin, tryBody } from './body-space'
import { createRuleMaker } from './build-rule'
import { findPumpBasins } from './pump-flow'
import { hasAreas } from './shape'

const nothing: Value<number> = { value: 0, source: 'measured' }

function judgeSpace(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  const length = readMeasure(specs, 'lengthMm')
  const width = readMeasure(specs, 'widthMm')
  const missing = [...(length ? [] : ['lengthMm']), ...(width ? [] : ['widthMm'])]
  if (!length || !width) return lacking(missing, () => 'Nobody has recorded the size of its sensor.')
  const body = { length, width, height: nothing, depth: nothing, clearanceMm: 0, quantity: candidate.quantity }
  const found = chooseBasin(findPumpBasins(scene, candidate).map((basin) => tryBody(body, basin, scene.others)))
  return found ? judgeBody(found, scene.plan, 'Its sensor') : lackWater(candidate.place)
}

/** Litres that evaporate in a day in the room as it usually is. */
const findEvaporationLpd = ({ plan }: Scene): number =>
  lossAt(plan, plan.goals.temperatureC, plan.room.temperatureC).evaporationLPerDay

function warnReservoir(scene: Scene, reservoirL: number | undefined): readonly Say[] {
  if (reservoirL === undefined || !hasAreas(scene.plan)) return []
  const perDay = once(scene, findEvaporationLpd)
  if (reservoirL >= thresholds.reservoirDays.value * perDay) return []
  return [
    (words) =>
      `Its reservoir of ${words.volume(reservoirL)} lasts less than ${thresholds.reservoirDays.value} days: about ${words.volume(perDay)} evaporates in one.`,
  ]
}

/** Of a tank known by its volume the height follows from the other sides. */
const topRests = ['room.tankTopMm', 'tank.outerHeightMm', 'tank.outerLengthMm', 'tank.outerWidthMm', 'tank.waterLineMm']

function judgeLift(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  const head = readMeasure(specs, 'pumpHeadM')
  if (!head) return lacking(['pumpHeadM'], () => 'Nobody has recorded how high its pump lifts.')
  const basin = findPumpBasins(scene, candidate)[0]
  const isSump = basin?.id === 'sump'
  const liftM = (isSump ? basin.waterDepthMm + thresholds.sumpRimMm.value : scene.plan.room.tankTopMm) / 1000
  return {
    outcome: head.value >= liftM ? 'pass' : 'fail',
    measured: head.value,
    limit: liftM,
    ...beSure(
      (u) => probabilityAtLeast(head.value, liftM, u),
      () => [doubt(head, 'other', 'check how high its pump lifts')],
    ),
    rests: () => [...(isSump ? ['tank.sump.waterDepthMm'] : topRests), 'tank.filtration'],
    cautions: warnReservoir(scene, readNumber(specs, 'reservoirL')),
    say: (words) =>
      `Lifts water ${words.measure(head.value, 'm')}, and the rim of the ${isSump ? 'sump' : 'tank'} is ${words.measure(liftM, 'm')} above the floor.`,
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
      uses: bodyUses,
      failLabel: 'too large for the place',
      judge: judgeSpace,
    }),
    rule('lift', {
      label: 'Lift',
      worst: 'fail',
      unit: 'm',
      limitIs: 'least',
      rule: `Its pump lifts water from the floor over the tank’s rim, or over a sump’s, taken as ${thresholds.sumpRimMm.value} mm above its water; a reservoir for less than ${thresholds.reservoirDays.value} days of evaporation is a caution.`,
      reads: ['pumpHeadM', 'reservoirL'],
      uses: ['room.tankTopMm', 'tank.outerHeightMm', 'tank.sump.waterDepthMm', 'tank.filtration'],
      failLabel: 'too weak to lift water over the rim',
      judge: judgeLift,
    }),
  ],
  feltThrough: ['powerW', 'plugs'],
}
