import { countOf, sayFree, sayUncounted } from '../counting'
import { countOutlets, otherLoad, otherPlugs } from '../mains-budget'
import { beSure, doubt } from '../doubt'
import { probabilityAtMost } from '../physics/conformance'
import { findLoadLimits } from '../physics/loads'
import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis, thresholds } from '../thresholds'
import { readNumber } from '../values'

function judgeOutlets(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const outlets = readNumber(piece.specs, 'outlets')
  if (outlets === undefined) return lacking(['outlets'], () => 'Nobody has recorded how many outlets it has.')
  const { used, unknown } = otherPlugs(scene)
  const own = { id: 'candidate', piece, quantity, state: 'planned' as const }
  const capacity = countOutlets(scene.plan, [...scene.others, own])
  const short = used - capacity
  const strips = scene.others.reduce((n, item) => (item.piece.kind === 'power-strip' ? n + item.quantity : n), quantity)
  if (strips > scene.plan.mains.outlets)
    return {
      outcome: 'change',
      measured: outlets * quantity,
      limit: null,
      asks: { need: 'outlets', amount: strips - scene.plan.mains.outlets, unit: 'count' },
      say: () =>
        `Needs a wall outlet of its own, and ${sayFree(scene.plan.mains.outlets)}: a strip never goes on another strip.`,
    }
  return {
    outcome: short > 0 ? 'change' : 'pass',
    measured: outlets * quantity,
    limit: Math.max(0, used - (capacity - outlets * quantity)),
    ...(short > 0 && { asks: { need: 'outlets', amount: short, unit: 'count' as const } }),
    cautions: unknown.length > 0 ? [sayUncounted(unknown.length, 'number of plugs')] : [],
    say: () =>
      short > 0
        ? `${countOf(short, 'more outlet')} needed beside it: a second strip on its own wall outlet.`
        : `${countOf(used, 'plug')} in the setup, ${countOf(capacity, 'outlet')} with this strip and the wall.`,
  }
}

function judgeLoad(scene: Scene, { piece }: Candidate): Judgement {
  const ratedA = readNumber(piece.specs, 'ratedA')
  if (ratedA === undefined) return lacking(['ratedA'], () => 'Nobody has recorded its rated current.')
  const { volts, circuitA, residualCurrentProtected } = scene.plan.mains
  const { continuousW, ratedW } = findLoadLimits(volts, [ratedA, circuitA])
  const { watts, unknown } = otherLoad(scene)
  const cautions = [
    ...(residualCurrentProtected
      ? []
      : [
          () =>
            'Use an outlet with residual-current (ground-fault) protection and a drip loop in every cord; never chain strips. Local electrical codes and a licensed electrician decide.',
        ]),
    ...(unknown.length > 0 ? [sayUncounted(unknown.length, 'power')] : []),
  ]
  return {
    outcome: watts <= continuousW ? 'pass' : watts <= ratedW ? 'change' : 'fail',
    measured: watts,
    limit: continuousW,
    changeLimit: ratedW,
    ...beSure(
      (u) => probabilityAtMost(watts, continuousW, u),
      () => [doubt({ value: watts, source: 'maker' }, 'other', 'add up what the rating plates say')],
    ),
    cautions,
    ...(watts > continuousW && { asks: { need: 'circuit', amount: watts - continuousW, unit: 'W' as const } }),
    say: (words) =>
      watts <= continuousW
        ? `${words.power(watts)} of the ${words.power(continuousW)} that strip and circuit may carry without pause.`
        : watts <= ratedW
          ? `${words.power(watts)} is more than the ${words.power(continuousW)} that strip and circuit may carry without pause: move something to another circuit.`
          : `${words.power(watts)} is more than the ${words.power(ratedW)} that strip and circuit are rated for.`,
  }
}

function judgeRatedVolts({ plan }: Scene, { piece }: Candidate): Judgement {
  const ratedV = readNumber(piece.specs, 'ratedV')
  if (ratedV === undefined) return lacking(['ratedV'], () => 'Nobody has recorded its rated voltage.')
  const { volts } = plan.mains
  return {
    outcome: ratedV >= volts ? 'pass' : 'fail',
    measured: ratedV,
    limit: volts,
    say: () => (ratedV >= volts ? `Rated for ${ratedV} V.` : `Rated for ${ratedV} V, not for ${volts} V mains.`),
  }
}

function judgeSwitched({ plan }: Scene, { piece, quantity }: Candidate): Judgement | null {
  const wanted = plan.goals.switchedOutlets
  if (wanted === 0) return null
  const switched = readNumber(piece.specs, 'switchedOutlets')
  if (switched === undefined)
    return lacking(['switchedOutlets'], () => 'Nobody has recorded how many of its outlets switch.')
  const has = switched * quantity
  return {
    outcome: has >= wanted ? 'pass' : 'change',
    measured: has,
    limit: wanted,
    say: () => `${countOf(has, 'switched outlet')}, ${wanted} wanted.`,
  }
}

const rule = (check: string, parts: Omit<Rule, 'id'>): Rule => ({ id: `power-strip.${check}`, ...parts })

export const powerStripRules: KindRules = {
  rules: [
    rule('outlets', {
      label: 'Outlets',
      worst: 'change',
      unit: 'count',
      limitIs: 'least',
      basis: practiceBasis,
      rule: 'As many outlets as there are plugs, less those on a controller’s own outlets, less the wall’s beyond the one that the strip takes.',
      reads: ['outlets'],
      uses: ['mains.outlets'],
      failLabel: 'with too few outlets',
      judge: judgeOutlets,
    }),
    rule('load', {
      label: 'Load',
      worst: 'fail',
      unit: 'W',
      basis: thresholds.continuousShare.basis,
      rule: 'Everything that runs without pause stays within 80 % of the lower rating of strip and circuit; up to the full rating something must move elsewhere; above it fails.',
      reads: ['ratedA'],
      uses: ['mains.circuitA', 'mains.volts'],
      failLabel: 'rated for too little current',
      judge: judgeLoad,
    }),
    rule('rated-voltage', {
      label: 'Rated voltage',
      worst: 'fail',
      unit: 'V',
      limitIs: 'least',
      basis: { type: 'standard', source: 'Rating plate and household mains (IEC 60038 voltages)' },
      rule: 'Its rated voltage is at least that of the mains.',
      reads: ['ratedV'],
      uses: ['mains.volts'],
      failLabel: 'rated for a lower voltage',
      judge: judgeRatedVolts,
    }),
    rule('switched', {
      label: 'Switched outlets',
      worst: 'change',
      unit: 'count',
      limitIs: 'least',
      basis: practiceBasis,
      rule: 'At least as many outlets that switch by themselves as the setup asks for.',
      reads: ['switchedOutlets'],
      uses: ['goals.switchedOutlets'],
      failLabel: 'with too few switched outlets',
      judge: judgeSwitched,
    }),
  ],
}
