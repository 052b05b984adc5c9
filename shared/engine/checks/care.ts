import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { beSure, doubt, type Doubt } from '../doubt'
import { probabilityAtLeast, probabilityAtMost } from '../physics/conformance'
import type { Plan } from '../setup/plan'
import { isWithinMm, readMeasure } from '../values'
import { createRuleMaker } from './build-rule'
import { findTankSize } from './tank-size'

const doubtHeight = (plan: Plan): Doubt => doubt(findTankSize(plan, 'outerHeightMm'), 'length', 'measure the tank')

function judgeTube({ plan }: Scene, { piece }: Candidate): Judgement {
  const own = readMeasure(piece.specs, 'tubeLengthMm')
  if (!own) return lacking(['tubeLengthMm'], () => 'Nobody has recorded the length of its tube.')
  const neededMm = plan.tank.outerHeightMm - thresholds.siphonDryMm.value
  const tube = own.value
  const reaches = isWithinMm(neededMm, tube)
  return {
    outcome: reaches ? 'pass' : 'change',
    measured: tube,
    limit: neededMm,
    ...beSure(
      (u) => probabilityAtLeast(tube, neededMm, u),
      () => [doubt(own, 'length', 'check the length of its tube'), doubtHeight(plan)],
    ),
    say: (words) =>
      reaches
        ? 'Its tube reaches the sand.'
        : `Its tube is ${words.length(neededMm - tube)} too short to reach the sand with a dry hand.`,
  }
}

function judgeHose({ plan }: Scene, { piece }: Candidate): Judgement {
  const ofTube = readMeasure(piece.specs, 'tubeLengthMm')
  const ofHose = readMeasure(piece.specs, 'hoseLengthMm')
  const missing = [...(ofTube ? [] : ['tubeLengthMm']), ...(ofHose ? [] : ['hoseLengthMm'])]
  if (!ofTube || !ofHose)
    return lacking(missing, () => `Nobody has recorded the length of its ${ofTube ? 'hose' : 'tube'}.`)
  const [tube, hose] = [ofTube.value, ofHose.value]
  const neededMm = plan.room.tankTopMm + plan.tank.outerHeightMm
  const reaches = isWithinMm(neededMm, tube + hose)
  return {
    outcome: reaches ? 'pass' : 'change',
    measured: tube + hose,
    limit: neededMm,
    ...beSure(
      (u) => probabilityAtLeast(tube + hose, neededMm, u),
      () => [
        doubt(ofTube, 'length', 'check the length of its tube'),
        doubt(ofHose, 'length', 'check the length of its hose'),
        doubtHeight(plan),
        doubt(
          { value: plan.room.tankTopMm, source: plan.assumed.has('room.tankTopMm') ? 'estimate' : 'measured' },
          'length',
          'measure how high the tank’s top edge is',
        ),
      ],
    ),
    say: (words) =>
      reaches
        ? 'Tube and hose reach from the sand over the rim to a bucket on the floor.'
        : `Tube and hose are ${words.length(neededMm - tube - hose)} too short to reach a bucket on the floor.`,
  }
}

const siphonRule = createRuleMaker('siphon')

export const siphonRules: KindRules = {
  rules: [
    siphonRule('reach', {
      label: 'Tube',
      worst: 'change',
      unit: 'mm',
      limitIs: 'least',
      rule: `The tube as long as the tank is high, less ${thresholds.siphonDryMm.value} mm.`,
      reads: ['tubeLengthMm'],
      uses: ['tank.outerHeightMm'],
      failLabel: 'too short',
      judge: judgeTube,
    }),
    siphonRule('hose', {
      label: 'Hose',
      worst: 'change',
      unit: 'mm',
      limitIs: 'least',
      rule: 'Tube and hose from the sand over the rim to the floor: the height of the tank’s top edge and of the tank.',
      reads: ['tubeLengthMm', 'hoseLengthMm'],
      uses: ['room.tankTopMm', 'tank.outerHeightMm'],
      failLabel: 'too short',
      judge: judgeHose,
    }),
  ],
  feltThrough: [],
}

function judgeSize({ plan }: Scene, { piece }: Candidate): Judgement {
  const own = readMeasure(piece.specs, 'openingMm')
  if (!own) return lacking(['openingMm'], () => 'Nobody has recorded the size of its opening.')
  const opening = own.value
  const limitMm = plan.tank.displayWidthMm * thresholds.netShare.value
  const fits = isWithinMm(opening, limitMm)
  return {
    outcome: fits ? 'pass' : 'change',
    measured: opening,
    limit: limitMm,
    ...beSure(
      (u) => probabilityAtMost(opening, limitMm, u),
      () => [
        doubt(own, 'length', 'check the size of its opening'),
        doubt(
          { value: plan.tank.displayWidthMm, source: plan.tank.source },
          'length',
          'measure the display',
          thresholds.netShare.value,
        ),
      ],
    ),
    cautions: [() => 'Two or three nets make catching easier on the animals.'],
    say: (words) =>
      fits
        ? 'It can be turned in the display.'
        : `Wider than half the display, which is ${words.length(limitMm)}: hard to turn in it.`,
  }
}

const netRule = createRuleMaker('net')

export const netRules: KindRules = {
  rules: [
    netRule('size', {
      label: 'Opening',
      worst: 'change',
      unit: 'mm',
      rule: 'The opening at most half as wide as the display.',
      reads: ['openingMm'],
      uses: ['tank.displayWidthMm', 'tank.outerWidthMm', 'tank.wallMm', 'tank.chambers.*.widthMm'],
      failLabel: 'too wide',
      judge: judgeSize,
    }),
  ],
  feltThrough: [],
}
