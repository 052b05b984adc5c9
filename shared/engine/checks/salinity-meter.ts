import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { naclReading } from '../physics/salinity'
import { thresholds } from '../thresholds'
import { readNumber, readSet } from '../values'
import { createRuleMaker } from './build-rule'

function judgeScale({ plan }: Scene, { piece }: Candidate): Judgement {
  const scales = readSet<string>(piece.specs, 'scales')
  if (scales === undefined) return lacking(['scales'], () => 'Nobody has recorded its scales.')
  const base = { measured: scales }
  if (scales.includes('seawater-ppt') || scales.includes('seawater-sg'))
    return {
      ...base,
      outcome: 'pass',
      cautions: [() => 'Calibrate it with a standard near 35 ppt, not with pure water alone.'],
      say: () => 'Has a seawater scale.',
    }
  const goal = plan.goals.salinityPpt
  if (scales.includes('nacl'))
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `Has a table-salt (NaCl) scale: in water of ${words.measure(goal, 'ppt')} it shows ${words.measure(naclReading(goal), 'ppt')}, and has to be read with that offset.`,
    }
  return {
    ...base,
    outcome: 'fail',
    say: () =>
      scales.includes('brix')
        ? 'Has a sugar (Brix) scale: the whole range that matters is one division of it.'
        : 'Has no scale for sea water.',
  }
}

function judgeRange(_scene: Scene, { piece }: Candidate): Judgement {
  const [low, high] = [thresholds.salinityLowPpt.value, thresholds.salinityHighPpt.value]
  const min = readNumber(piece.specs, 'minPpt')
  const max = readNumber(piece.specs, 'maxPpt')
  if ((min !== undefined && min > low) || (max !== undefined && max < high))
    return {
      outcome: 'fail',
      measured: null,
      limit: [low, high],
      say: (words) => `Does not span ${words.pair([low, high], 'ppt')}.`,
    }
  const missing = [...(min === undefined ? ['minPpt'] : []), ...(max === undefined ? ['maxPpt'] : [])]
  if (min === undefined || max === undefined) return lacking(missing, () => 'Nobody has recorded the range it reads.')
  return {
    outcome: 'pass',
    measured: null,
    limit: [low, high],
    say: (words) => `Reads ${words.pair([min, max], 'ppt')}.`,
  }
}

function judgeResolution(_scene: Scene, { piece }: Candidate): Judgement {
  const step = readNumber(piece.specs, 'resolutionPpt')
  if (step === undefined) return lacking(['resolutionPpt'], () => 'Nobody has recorded its smallest step.')
  const limit = thresholds.salinityStepPpt.value
  return {
    outcome: step <= limit ? 'pass' : 'fail',
    measured: step,
    limit,
    say: (words) =>
      `Reads in steps of ${words.measure(step, 'ppt')}${step <= limit ? '' : `, too coarse: ${words.measure(limit, 'ppt')} at most`}.`,
  }
}

const rule = createRuleMaker('salinity-meter')

export const salinityMeterRules: KindRules = {
  rules: [
    rule('scale', {
      label: 'Scale',
      worst: 'fail',
      unit: null,
      basis: {
        type: 'physics',
        source:
          'Refractive index of sea water: Quan & Fry 1995, Applied Optics 34:3477; of NaCl and sucrose: CRC Handbook and ICUMSA 1974, seen quoted',
      },
      rule: 'A seawater scale passes; a NaCl scale reads high by an offset that is computed; sugar scales and others fail.',
      reads: ['scales'],
      uses: ['goals.salinityPpt'],
      failLabel: 'without a seawater scale',
      judge: judgeScale,
    }),
    rule('range', {
      label: 'Range',
      worst: 'fail',
      unit: 'ppt',
      rule: `Spans ${thresholds.salinityLowPpt.value} to ${thresholds.salinityHighPpt.value} ppt.`,
      reads: ['minPpt', 'maxPpt'],
      failLabel: 'of too short a range',
      judge: judgeRange,
    }),
    rule('resolution', {
      label: 'Steps',
      worst: 'fail',
      unit: 'ppt',
      rule: `Steps of ${thresholds.salinityStepPpt.value} ppt or finer.`,
      reads: ['resolutionPpt'],
      failLabel: 'too coarse',
      judge: judgeResolution,
    }),
  ],
}
