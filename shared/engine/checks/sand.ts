import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { countPacks } from '../physics/salt'
import { middleGrainMm, sandBedKg } from '../physics/sand'
import { defaults } from '../setup/defaults'
import { thresholds } from '../thresholds'
import { beSure, doubt } from '../doubt'
import { probabilityWithin } from '../physics/conformance'
import { readFlag, readMeasure, readNumber, readSet, readText } from '../values'
import { createRuleMaker } from './build-rule'
import { countOf } from '../counting'
import { isLiveLost } from './rock'
import { displayUses, hasAreas, noAreas } from './shape'

function judgeMineral(_scene: Scene, { piece }: Candidate): Judgement {
  const mineral = readText(piece.specs, 'mineral')
  if (mineral === undefined) return lacking(['mineral'], () => 'Nobody has recorded what it is made of.')
  const uses = readSet<string>(piece.specs, 'madeFor')
  const beach = () => 'Never use sand from a beach: it can carry contaminants, and taking it is often against the law.'
  const base = { measured: mineral, cautions: [beach] }
  if (mineral === 'aragonite' || mineral === 'calcite')
    return {
      ...base,
      outcome: 'pass',
      say: () => `${mineral === 'aragonite' ? 'Aragonite' : 'Calcite'}: a carbonate sand, as reefs have.`,
    }
  if (mineral === 'volcanic')
    return {
      ...base,
      outcome: 'pass',
      cautions: [beach, () => 'Volcanic sand does not buffer the water and may hold magnetic grains.'],
      say: () => 'Volcanic sand.',
    }
  if (uses === undefined)
    return lacking(['madeFor'], () => 'Silica, and nobody has recorded whether it is made for salt water.')
  return uses.includes('reef') || uses.includes('marine-fish')
    ? {
        ...base,
        outcome: 'change',
        say: () => 'Silica made for salt water: it does not buffer the water, and can feed a diatom bloom.',
      }
    : { ...base, outcome: 'fail', say: () => 'Silica that is not made for salt water.' }
}

function judgeMagnetic({ others }: Scene, { piece }: Candidate): Judgement | null {
  const forms = others.filter((item) => item.piece.kind === 'scraper').map((item) => readText(item.piece.specs, 'form'))
  const hasMagnet = forms.includes('magnet')
  if (!hasMagnet && !forms.includes(undefined)) return null
  const isMagnetic = readFlag(piece.specs, 'magneticGrains')
  if (isMagnetic === undefined)
    return lacking(['magneticGrains'], () => 'Nobody has recorded whether a magnet picks up its grains.')
  if (isMagnetic && !hasMagnet)
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded whether the scraper is a magnet.' }
  return {
    outcome: isMagnetic ? 'change' : 'pass',
    measured: isMagnetic ? 'magnetic' : 'not magnetic',
    say: () =>
      isMagnetic
        ? 'The magnet scraper in the setup picks up its grains and will scratch the pane.'
        : 'A magnet does not pick up its grains.',
  }
}

function judgeGrain(_scene: Scene, { piece }: Candidate): Judgement {
  const min = readMeasure(piece.specs, 'grainMinMm')
  const max = readMeasure(piece.specs, 'grainMaxMm')
  const missing = [...(min ? [] : ['grainMinMm']), ...(max ? [] : ['grainMaxMm'])]
  if (!min || !max) return lacking(missing, () => 'Nobody has recorded its grain size yet.')
  const middle = middleGrainMm(min.value, max.value)
  const [low, high] = [thresholds.grainLowMm.value, thresholds.grainHighMm.value]
  return {
    outcome: middle < low || middle > high ? 'change' : 'pass',
    measured: middle,
    limit: [low, high],
    ...beSure(
      (u) => probabilityWithin(middle, low, high, u),
      // Of the root of two numbers half of either's share counts.
      () =>
        [min, max].map((end) =>
          doubt(end, 'other', 'look at its grains beside a ruler', middle / (2 * end.value || 1)),
        ),
    ),
    say: (words) =>
      middle < low
        ? `Grains around ${words.measure(middle, 'mm')}: they blow about in strong flow.`
        : middle > high
          ? `Grains around ${words.measure(middle, 'mm')}: waste gets caught between them.`
          : `Grains around ${words.measure(middle, 'mm')}.`,
  }
}

function judgeAmount({ plan }: Scene, { piece }: Candidate): Judgement {
  if (!hasAreas(plan)) return noAreas(plan)
  const packKg = readNumber(piece.specs, 'packKg')
  if (packKg === undefined) return lacking(['packKg'], () => 'Nobody has recorded how much is in a bag.')
  const depthMm = plan.goals.sandDepthMm
  if (depthMm === 0)
    return {
      outcome: 'pass',
      measured: 0,
      cautions: [() => 'A bare bottom is less stable: less surface for what keeps the water clean.'],
      say: () => 'No sand is wanted.',
    }
  const density = readNumber(piece.specs, 'bulkDensityKgL') ?? defaults.sandBulkDensityKgL
  const { displayLengthMm, displayWidthMm } = plan.tank
  const massKg = sandBedKg(displayLengthMm, displayWidthMm, depthMm, density)
  const packs = countPacks(massKg / packKg)
  return {
    outcome: 'pass',
    measured: massKg,
    limit: null,
    say: (words) =>
      `${words.mass(massKg)} for a bed ${words.length(depthMm)} deep: ${countOf(packs, 'bag')} of ${words.mass(packKg)}.`,
  }
}

function judgeState(scene: Scene, { piece }: Candidate): Judgement {
  const state = readText(piece.specs, 'state')
  if (state === undefined) return lacking(['state'], () => 'Nobody has recorded whether it is live or dry.')
  const isSlower = state === 'dry' && isLiveLost(scene, 'sand')
  return {
    outcome: isSlower ? 'change' : 'pass',
    measured: state,
    say: () =>
      isSlower
        ? 'Dry where live was planned: rinse it, and the cycle takes longer.'
        : state === 'live'
          ? 'Live sand: do not rinse it.'
          : 'Dry sand: rinse it first.',
  }
}

const rule = createRuleMaker('sand')

export const sandRules: KindRules = {
  rules: [
    rule('mineral', {
      label: 'Mineral',
      worst: 'fail',
      unit: null,
      rule: 'Aragonite and calcite pass; silica only where it is made for marine use, as a change; volcanic sand is a caution.',
      reads: ['mineral', 'madeFor'],
      failLabel: 'of the wrong mineral',
      judge: judgeMineral,
    }),
    rule('grain', {
      label: 'Grain',
      worst: 'fail',
      unit: 'mm',
      rule: `Middle of its grain sizes, the root of smallest times largest, from ${thresholds.grainLowMm.value} to ${thresholds.grainHighMm.value} mm; finer blows about, coarser traps waste.`,
      reads: ['grainMinMm', 'grainMaxMm'],
      failLabel: 'too fine or too coarse',
      judge: judgeGrain,
    }),
    rule('amount', {
      label: 'Amount',
      worst: 'change',
      unit: 'kg',
      basis: {
        type: 'physics',
        source: 'Area × depth × bulk density; 2.8 kg/L grains with 45 % pores where none is stated',
      },
      rule: 'The mass of a bed of the depth that is wanted over the display, in whole bags.',
      reads: ['packKg', 'bulkDensityKgL'],
      uses: ['goals.sandDepthMm', ...displayUses],
      failLabel: 'too little',
      judge: judgeAmount,
    }),
    rule('magnetic', {
      label: 'Magnetic grains',
      worst: 'change',
      unit: null,
      rule: 'Magnetic grains and a magnet scraper in one setup scratch.',
      reads: ['magneticGrains'],
      failLabel: 'magnetic',
      judge: judgeMagnetic,
    }),
    rule('state', {
      label: 'Live or dry',
      worst: 'change',
      unit: null,
      rule: 'Dry where live was planned: rinse it, and a longer cycle.',
      reads: ['state'],
      failLabel: 'dry',
      judge: judgeState,
    }),
  ],
  feltThrough: ['grainMinMm', 'packKg'],
}
