import { getKind } from '../kinds/index'
import type { Printer } from '../units/print'
import type { Assessment, AssessedItem } from './assess'
import { isConcededBy, isCovered, isOpen, outcomeOf } from './concession'
import { describeCondition } from './conditions'
import type { Judged } from './judge'
import { lackOf } from './needs'
import type { Say } from './rule'
import type { Item, KnockOn, Outcome } from './types'

/** A knock-on before anybody asks for words. */
export interface RawKnockOn extends Omit<KnockOn, 'message'> {
  readonly say: Say
  /** What is asked for, where something that can be got would do. */
  readonly need?: string
}

/** Of no data only what leaves a piece unjudged becomes a knock-on. */
const severity: Readonly<Record<Outcome, number>> = { pass: 0, change: 1, nodata: 2, fail: 3 }

const weigh = (judged: Judged): number =>
  outcomeOf(judged) === 'nodata' && !isOpen(judged) ? severity.pass : severity[outcomeOf(judged)]

/** What could not be judged and now needs a change is no worse a verdict, but something to be done. */
const isWorse = (was: Judged | undefined, now: Judged): boolean =>
  weigh(now) > (was ? weigh(was) : severity.pass) || (was !== undefined && isOpen(was) && outcomeOf(now) === 'change')

const sayOf = ({ judgement, condition }: Judged): Say =>
  condition ? (words) => `${judgement.say(words)} ${describeCondition(condition())(words)}` : judgement.say

const mapByRule = (judged: readonly Judged[]): ReadonlyMap<string, Judged> =>
  new Map(judged.map((one) => [one.rule.id, one]))

export const nameOf = ({ piece }: Item): string => {
  const { gear, kind } = piece
  const { label } = getKind(kind)
  return gear ? `${gear.brand} ${gear.model}` : `${label[0]?.toUpperCase()}${label.slice(1)}`
}

/** What a piece that is new in the setup asks of the rest: its own checks that did not simply pass. */
export function listDemands(judged: readonly Judged[]): readonly RawKnockOn[] {
  return judged.flatMap((one): RawKnockOn[] => {
    if (one.outcome !== 'change' && one.outcome !== 'fail') return []
    const { asks } = one.judgement
    return [
      {
        kind: asks ? 'need' : 'check',
        subject: asks?.need ?? one.rule.id,
        from: null,
        to: one.outcome,
        say: sayOf(one),
        ...(asks && { need: asks.need }),
      },
    ]
  })
}

/** A piece that was judged and no longer can be, with all that is now missing for it, each once. */
function openedKnockOns(before: ReadonlyMap<string, Judged>, { item, judged }: AssessedItem): RawKnockOn[] {
  const opened = judged.filter((one) => isOpen(one) && isWorse(before.get(one.rule.id), one))
  const [first] = opened
  if (!first) return []
  const was = before.get(first.rule.id)
  const listWhy: Say = (words) => [...new Set(opened.map(({ judgement }) => judgement.say(words)))].join(' ')
  return [
    {
      kind: 'check',
      subject: item.id,
      from: was ? outcomeOf(was) : 'pass',
      to: 'nodata',
      say: (words) => `${nameOf(item)}: can no longer be judged. ${listWhy(words)}`,
    },
  ]
}

/**
 * Checks of a piece that stayed and that got worse. Too few outlets and too much load are every piece's trouble alike:
 * the setup's own need for outlets says the one, the first piece that finds it the other.
 */
function worsenedKnockOns({ judged }: AssessedItem, after: AssessedItem, said: Set<string>): RawKnockOn[] {
  const before = mapByRule(judged)
  const worsened = after.judged.flatMap((one): RawKnockOn[] => {
    const was = before.get(one.rule.id)
    if (isOpen(one) || !isWorse(was, one)) return []
    const need = one.judgement.asks?.need
    if (need === 'outlets' || (need === 'circuit' && said.has(need))) return []
    if (need) said.add(need)
    const say = sayOf(one)
    return [
      {
        kind: 'check',
        subject: after.item.id,
        from: was ? outcomeOf(was) : 'pass',
        to: outcomeOf(one),
        say: (words) => `${nameOf(after.item)}: ${say(words)}`,
        ...(need !== undefined && { need }),
      },
    ]
  })
  return [...worsened, ...openedKnockOns(before, after)]
}

function budgetKnockOns(before: Assessment, after: Assessment): RawKnockOn[] {
  return Object.entries(after.budgets).flatMap(([key, now]): RawKnockOn[] => {
    const was = before.budgets[key]
    if (!was || Math.abs(was.used - now.used) < 1e-9) return []
    const isFreed = key === 'plugs' && now.used < was.used
    return [{ kind: isFreed ? 'freed' : 'budget', subject: key, from: was.used, to: now.used, say: now.say }]
  })
}

/**
 * What changes elsewhere between two assessments of a setup, worst first: needs that are new, checks that got worse,
 * essentials that went missing, budgets that moved, and what is freed. The difference of a setup with itself is empty.
 */
export function diff(before: Assessment, after: Assessment): readonly RawKnockOn[] {
  const stayed = new Map(before.items.map((one) => [one.item.id, one]))
  const said = new Set<string>()
  const items = after.items.flatMap((one) => {
    const was = stayed.get(one.item.id)
    return was?.item.piece === one.item.piece
      ? worsenedKnockOns(was, one, said)
      : was
        ? replacedKnockOns(was, one)
        : listDemands(one.judged)
  })
  const known = new Map(before.essentials.map((essential) => [essential.need, essential]))
  const essentials = after.essentials.flatMap((essential): RawKnockOn[] => {
    const was = known.get(essential.need)
    if (essential.isMet ? (was?.isMet ?? true) : was && !was.isMet && isCovered(lackOf(essential), lackOf(was)))
      return []
    const kind = essential.isMet ? 'freed' : 'missing'
    const { need, isMet, say, sayMet } = essential
    return [{ kind, subject: need, from: null, to: null, ...(isMet ? { say: sayMet } : { say, need }) }]
  })
  const all = [...items, ...essentials, ...budgetKnockOns(before, after)]
  return all.sort((a, b) => weight[a.kind] - weight[b.kind] || rankOf(b) - rankOf(a))
}

/** Worst first. */
const weight: Readonly<Record<KnockOn['kind'], number>> = { need: 0, check: 1, missing: 2, budget: 3, freed: 4 }

const rankOf = ({ to }: RawKnockOn): number => (typeof to === 'string' ? severity[to] : 0)

/** A piece in the place of another of its id: only what it asks beyond what that one asked. */
function replacedKnockOns({ judged }: AssessedItem, after: AssessedItem): readonly RawKnockOn[] {
  const before = mapByRule(judged)
  const asked = listDemands(after.judged.filter((one) => !isConcededBy(before.get(one.rule.id), one)))
  return [...asked, ...openedKnockOns(before, after)]
}

/** Knock-ons that ask something to be done, as against what merely moves or is freed. */
export const isDemand = ({ kind }: RawKnockOn): boolean => kind === 'need' || kind === 'check' || kind === 'missing'

export const presentKnockOns = (knockOns: readonly RawKnockOn[], words: Printer): readonly KnockOn[] =>
  knockOns.map(({ say, need: _, ...rest }) => ({ ...rest, message: say(words) }))
