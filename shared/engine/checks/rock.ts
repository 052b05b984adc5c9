import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { countPacks } from '../physics/salt'
import { thresholds } from '../thresholds'
import type { Item } from '../types'
import { readNumber, readText } from '../values'
import { createRuleMaker } from './build-rule'
import { countOf } from '../counting'

const rocksOf = (items: readonly Item[]) => items.filter((item) => item.piece.kind === 'rock')

const massOf = ({ piece, quantity }: Item): number => quantity * (readNumber(piece.specs, 'packKg') ?? 0)

/** Whether live rock or sand was meant, by what the setup lists or listed. */
export const wasLivePlanned = ({ plan }: Scene, kind: 'rock' | 'sand'): boolean =>
  plan.setup.items.some((item) => item.piece.kind === kind && readText(item.piece.specs, 'state') === 'live')

function judgeAmount(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const packKg = readNumber(piece.specs, 'packKg')
  if (packKg === undefined) return lacking(['packKg'], () => 'Nobody has recorded how much is in a pack.')
  const goalKg = scene.plan.goals.rockKg
  const rocks = rocksOf(scene.others)
  const leftKg = Math.max(0, goalKg - rocks.reduce((sum, item) => sum + massOf(item), 0))
  const isBase = (specs: Item['piece']['specs']) => readText(specs, 'form') === 'base'
  const packs = countPacks(leftKg / packKg)
  const form = readText(piece.specs, 'form')
  const baseKg = rocks.filter((item) => isBase(item.piece.specs)).reduce((sum, item) => sum + massOf(item), 0)
  const needsBase = form !== undefined && form !== 'base' && baseKg < thresholds.rockBaseShare.value * goalKg
  const cautions = [
    () =>
      'Never use rock collected outdoors: it can carry pollution and pests, and taking it is often against the law.',
  ]
  return {
    outcome: needsBase ? 'change' : 'pass',
    measured: packKg * quantity,
    limit: null,
    cautions,
    ...(needsBase && {
      asks: { need: 'base-rock', amount: thresholds.rockBaseShare.value * goalKg - baseKg, unit: 'kg' as const },
    }),
    say: (words) => {
      const amount =
        leftKg === 0
          ? 'The rock in the setup already reaches the goal'
          : `${countOf(packs, 'pack')} of ${words.mass(packKg)} for the ${words.mass(leftKg)} still wanted`
      return needsBase ? `${amount}; at least half of it should be base rock, which this is not.` : `${amount}.`
    },
  }
}

function judgeState(scene: Scene, { piece }: Candidate): Judgement {
  const state = readText(piece.specs, 'state')
  if (state === undefined) return lacking(['state'], () => 'Nobody has recorded whether it is live or dry.')
  const isSlower = state !== 'live' && wasLivePlanned(scene, 'rock')
  return {
    outcome: isSlower ? 'change' : 'pass',
    measured: state,
    say: () =>
      isSlower
        ? 'Dry where live was planned: the cycle takes longer.'
        : state === 'live'
          ? 'Live rock: quarantine it, and look for what came with it.'
          : 'Dry rock: the cycle takes its time.',
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
      uses: ['goals.rockKg'],
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
