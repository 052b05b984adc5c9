import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { countPacks } from '../physics/salt'
import { thresholds } from '../thresholds'
import type { Item } from '../types'
import { readNumber, readText } from '../values'
import { createRuleMaker } from './build-rule'
import { countOf, sayUncounted } from '../counting'
import { hasAreas, noAreas, waterUses } from './shape'

const rocksOf = (items: readonly Item[]) => items.filter((item) => item.piece.kind === 'rock')

const massOf = ({ piece, quantity }: Item): number => quantity * (readNumber(piece.specs, 'packKg') ?? 0)
const sumMass = (items: readonly Item[]): number => items.reduce((sum, item) => sum + massOf(item), 0)

const isLive = ({ piece }: Item, kind: 'rock' | 'sand') =>
  piece.kind === kind && readText(piece.specs, 'state') === 'live'

/** Whether live rock or sand was meant, by what the setup lists or listed, and none of it stays. */
export const isLiveLost = ({ plan, others }: Scene, kind: 'rock' | 'sand'): boolean =>
  plan.setup.items.some((item) => isLive(item, kind)) && !others.some((item) => isLive(item, kind))

function judgeAmount(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const packKg = readNumber(piece.specs, 'packKg')
  if (packKg === undefined) return lacking(['packKg'], () => 'Nobody has recorded how much is in a pack.')
  const { plan } = scene
  if (plan.assumed.has('goals.rockKg') && !hasAreas(plan)) return noAreas(plan)
  const goalKg = plan.goals.rockKg
  const baseGoalKg = thresholds.rockBaseShare.value * goalKg
  const rocks = rocksOf(scene.others)
  const leftKg = Math.max(0, goalKg - sumMass(rocks))
  const packs = countPacks(leftKg / packKg)
  const form = readText(piece.specs, 'form')
  const baseKg = sumMass(rocks.filter((item) => readText(item.piece.specs, 'form') === 'base'))
  const isShort = form !== 'base' && baseKg < baseGoalKg
  if (isShort && form === undefined) return lacking(['form'], () => 'Nobody has recorded whether it is base rock.')
  const unknown = rocks.filter((item) => readNumber(item.piece.specs, 'packKg') === undefined).length
  const cautions = [
    () =>
      'Never use rock collected outdoors: it can carry pollution and pests, and taking it is often against the law.',
    ...(unknown > 0 ? [sayUncounted(unknown, 'mass')] : []),
  ]
  return {
    outcome: isShort ? 'change' : 'pass',
    measured: packKg * quantity,
    limit: null,
    cautions,
    ...(isShort && { asks: { need: 'base-rock', amount: baseGoalKg - baseKg, unit: 'kg' as const } }),
    say: (words) => {
      const amount =
        leftKg === 0
          ? 'The rock in the setup already reaches the goal'
          : `${countOf(packs, 'pack')} of ${words.mass(packKg)} for the ${words.mass(leftKg)} still wanted`
      return isShort ? `${amount}; at least half of all rock should be base rock, and this is not.` : `${amount}.`
    },
  }
}

function judgeState(scene: Scene, { piece }: Candidate): Judgement {
  const state = readText(piece.specs, 'state')
  if (state === undefined) return lacking(['state'], () => 'Nobody has recorded whether it is live or dry.')
  const isSlower = state !== 'live' && isLiveLost(scene, 'rock')
  const name = state === 'artificial' ? 'Artificial' : 'Dry'
  return {
    outcome: isSlower ? 'change' : 'pass',
    measured: state,
    say: () =>
      isSlower
        ? `${name} where live was planned: the cycle takes longer.`
        : state === 'live'
          ? 'Live rock: quarantine it, and look for what came with it.'
          : `${name} rock: the tank has to cycle before animals go in.`,
  }
}

const rule = createRuleMaker('rock')

export const rockRules: KindRules = {
  rules: [
    rule('amount', {
      label: 'Amount and form',
      worst: 'change',
      unit: 'kg',
      rule: 'Packs for what is still wanted of the goal; at least half of the goal is base rock.',
      reads: ['packKg', 'form'],
      uses: ['goals.rockKg', ...waterUses],
      failLabel: 'of another form',
      judge: judgeAmount,
    }),
    rule('state', {
      label: 'Live or dry',
      worst: 'change',
      unit: null,
      rule: 'Dry or artificial where live was planned: a longer cycle.',
      reads: ['state'],
      failLabel: 'dry',
      judge: judgeState,
    }),
  ],
}
