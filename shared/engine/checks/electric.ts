import type { KindKey } from '../../kinds/index'
import { beSure, doubt } from '../doubt'
import { probabilityAtMost } from '../physics/conformance'
import { continuousShare } from '../physics/loads'
import { otherControllers, otherLimits, otherLoad, otherPlugs } from '../mains-budget'
import { countOf, sayFree, sayUncounted } from '../counting'
import { lacking, type Candidate, type Judgement, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis, thresholds } from '../thresholds'
import { readMeasure, readNumber, readSet, readText } from '../values'

/** The rules that every kind with a plug shares; the id carries the kind. */
export const createElectricRules = (kind: KindKey): readonly Rule[] => [
  {
    id: `${kind}.mains`,
    label: 'Mains',
    worst: 'fail',
    unit: 'V',
    basis: { type: 'standard', source: 'Rating plate and household mains (IEC 60038 voltages)' },
    rule: 'The setup’s mains voltage is among those it is made for; another plug type needs an adaptor, which its maker should be asked about first.',
    reads: ['volts', 'plugType'],
    uses: ['mains.volts', 'mains.plugType'],
    failLabel: 'made for another mains voltage',
    judge: judgeMains,
  },
  {
    id: `${kind}.plugs`,
    label: 'Outlets',
    worst: 'change',
    unit: 'count',
    basis: practiceBasis,
    rule: 'An outlet is free for each of its plugs after all others: strips, plus the wall’s beyond those the strips take, plus a temperature controller’s own for heaters.',
    reads: kind === 'temperature-controller' ? ['plugs', 'outlets'] : ['plugs'],
    uses: ['mains.outlets'],
    failLabel: 'no outlet free',
    judge: judgePlugs,
  },
  {
    id: `${kind}.load`,
    label: 'Load on the circuit',
    worst: 'change',
    unit: 'W',
    basis: thresholds.continuousShare.basis,
    rule: `With everything else at full power it stays within ${continuousShare * 100} % of the lower rating of strip and circuit.`,
    reads: ['powerW'],
    uses: ['mains.circuitA', 'mains.volts'],
    failLabel: 'too much load',
    judge: judgeLoad,
  },
]

function judgeMains({ plan }: Scene, { piece }: Candidate): Judgement {
  const volts = readSet<number>(piece.specs, 'volts')
  if (volts === undefined || volts.length === 0)
    return lacking(['volts'], () => 'Nobody has recorded the mains voltage it is made for.')
  const { mains } = plan
  const list = volts.join(' or ')
  if (!volts.includes(mains.volts))
    return { outcome: 'fail', measured: volts.map(String), say: () => `Made for ${list} V, not for ${mains.volts} V.` }
  const plugType = readText(piece.specs, 'plugType')
  if (plugType !== undefined && plugType !== mains.plugType)
    return {
      outcome: 'change',
      measured: volts.map(String),
      asks: { need: 'plug-adaptor', amount: null, unit: null, lacks: [plugType] },
      say: () => {
        const plug = plugType === 'other' ? 'a plug of another type' : `a type ${plugType} plug`
        const other = mains.plugType === 'other' ? 'of another type' : mains.plugType
        const outlets = plan.assumed.has('mains.plugType') ? `we assumed ${other} outlets` : `your outlets are ${other}`
        return `Has ${plug}, and ${outlets}: ask its maker before using an adaptor.`
      },
    }
  return { outcome: 'pass', measured: volts.map(String), say: () => `Made for ${mains.volts} V.` }
}

/** Outlets that it takes, or as a negative number frees: heaters sit on a controller's own. */
function countPlugsNeeded(scene: Scene, { piece, quantity }: Candidate, plugs: number): number {
  const { outlets, pluggedIn } = otherControllers(scene)
  if (piece.kind === 'heater') return Math.max(0, plugs * quantity - Math.max(0, outlets - pluggedIn))
  if (piece.kind !== 'temperature-controller') return plugs * quantity
  const heatersLeft = Math.max(0, pluggedIn - outlets)
  return plugs * quantity - Math.min((readNumber(piece.specs, 'outlets') ?? 0) * quantity, heatersLeft)
}

function judgePlugs(scene: Scene, candidate: Candidate): Judgement {
  const plugs = readNumber(candidate.piece.specs, 'plugs')
  if (plugs === undefined) return lacking(['plugs'], () => 'Nobody has recorded how many plugs it has.')
  const needed = countPlugsNeeded(scene, candidate, plugs)
  const { used, capacity, unknown } = otherPlugs(scene)
  const free = Math.max(0, capacity - used)
  const short = Math.max(0, needed) - free
  return {
    outcome: short > 0 ? 'change' : 'pass',
    measured: Math.max(0, needed),
    limit: free,
    ...(short > 0 && { asks: { need: 'outlets', amount: short, unit: 'count' as const } }),
    cautions: unknown.length > 0 ? [sayUncounted(unknown.length, 'number of plugs')] : [],
    say: () => {
      if (short > 0)
        return `Needs ${countOf(needed, 'outlet')}, and ${sayFree(free)}. A strip goes on its own wall outlet.`
      if (plugs === 0) return 'Takes no outlet.'
      if (needed > 0) return `Takes ${countOf(needed, 'outlet')} of the ${free} that ${free === 1 ? 'is' : 'are'} free.`
      return candidate.piece.kind === 'heater'
        ? 'Plugs into the temperature controller.'
        : 'Takes no outlet beyond those of the heaters that it feeds.'
    },
  }
}

function judgeLoad(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const power = readMeasure(piece.specs, 'powerW')
  if (!power) return lacking(['powerW'], () => 'Nobody has recorded its power yet.')
  const { watts, unknown } = otherLoad(scene)
  const { continuousW, ratedW } = otherLimits(scene)
  const totalW = watts + power.value * quantity
  const cautions = [
    ...(scene.plan.mains.residualCurrentProtected
      ? []
      : [
          () =>
            'Plug it into an outlet with residual-current (ground-fault) protection, with a drip loop in the cord; local electrical codes and a licensed electrician decide.',
        ]),
    ...(unknown.length > 0 ? [sayUncounted(unknown.length, 'power')] : []),
  ]
  return {
    outcome: totalW <= continuousW ? 'pass' : 'change',
    measured: totalW,
    limit: continuousW,
    ...beSure(
      (u) => probabilityAtMost(totalW, continuousW, u),
      () => [doubt(power, 'other', 'check the power on its rating plate', quantity)],
    ),
    cautions,
    ...(totalW > continuousW && { asks: { need: 'circuit', amount: totalW - continuousW, unit: 'W' as const } }),
    say: (words) =>
      totalW <= continuousW
        ? `${words.power(totalW)} in all, of ${words.power(continuousW)} that may run without pause.`
        : totalW <= ratedW
          ? `${words.power(totalW)} in all, more than the ${words.power(continuousW)} that may run without pause: move something to another circuit.`
          : `${words.power(totalW)} in all, more than the ${words.power(ratedW)} that the circuit carries: it needs a circuit of its own.`,
  }
}
