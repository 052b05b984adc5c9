import type { Printer } from '../units/print'
import { units } from '../units/units'
import type { Assessment, AssessedItem } from './assess'
import { listAssumptions } from './assumptions'
import { describeCondition } from './conditions'
import type { Judged } from './judge'
import { findMargin } from './margin'
import { isCloseCall } from './physics/conformance'
import type { Check, ItemReport, Need, Report, Verdict } from './types'

/** "A close call, 93 % sure: measure the rear chamber before buying." */
function sayClose(isKept: boolean, probability: number, settle: string): string {
  const percent = Math.round(probability * 100)
  return isKept || probability >= 0.5
    ? ` A close call, ${percent} % sure: ${settle} before buying.`
    : ` A close call: it may keep to the limit all the same, ${percent} % sure; ${settle} before ruling it out.`
}

/** One check in words, in the reader's units. */
export function presentCheck(judged: Judged, words: Printer): Check {
  const { rule, judgement, outcome, condition } = judged
  const { missing } = judgement
  const assumed = judged.assumed()
  const probability = outcome === 'nodata' ? undefined : judgement.probability?.()
  const settle = probability !== undefined && isCloseCall(probability) ? (judgement.settle?.() ?? 'measure') : undefined
  const message = [
    judgement.say(words),
    condition ? ` ${describeCondition(condition())(words)}` : '',
    probability !== undefined && settle !== undefined ? sayClose(outcome === 'pass', probability, settle) : '',
  ]
  return {
    id: rule.id,
    label: rule.label,
    outcome,
    measured: judgement.measured ?? null,
    limit: judgement.limit ?? null,
    unit: rule.unit ? units[rule.unit].ucum : null,
    margin: findMargin(rule, judgement),
    message: message.join(''),
    basis: rule.basis,
    ...(missing && missing.length > 0 && { missing }),
    ...(assumed.length > 0 && { assumed }),
    ...(probability !== undefined && { probability }),
    ...(settle !== undefined && { closeCall: settle }),
  }
}

/** The cautions of all checks, each once; one that turns out to have nothing to say is left out. */
export const presentCautions = (judged: readonly Judged[], words: Printer): readonly string[] => [
  ...new Set(
    judged
      .flatMap(({ judgement }) => judgement.cautions ?? [])
      .map((say) => say(words))
      .filter((caution) => caution !== ''),
  ),
]

function presentItem({ item, judged, verdict, placement }: AssessedItem, words: Printer): ItemReport {
  return {
    id: item.id,
    kind: item.piece.kind,
    gear: item.piece.gear ?? null,
    specs: item.piece.specs,
    quantity: item.quantity,
    verdict,
    checks: judged.map((one) => presentCheck(one, words)),
    cautions: presentCautions(judged, words),
    ...(placement && { place: placement }),
  }
}

/** Needs of the setup, then what single pieces ask for and do not find. */
function presentNeeds({ essentials, items }: Assessment, words: Printer): readonly Need[] {
  const whole = essentials.map((essential): Need => ({
    need: essential.need,
    amount: essential.amount,
    unit: essential.unit && units[essential.unit].ucum,
    neededBy: ['setup'],
    metBy: essential.isMet ? essential.metBy : [],
    message: (essential.isMet ? essential.sayMet : essential.say)(words),
  }))
  const asked = items.flatMap(({ item, judged }) =>
    judged.flatMap(({ judgement }): Need[] =>
      judgement.asks
        ? [
            {
              need: judgement.asks.need,
              amount: judgement.asks.amount,
              unit: judgement.asks.unit && units[judgement.asks.unit].ucum,
              neededBy: [item.id],
              metBy: [],
              message: judgement.say(words),
            },
          ]
        : [],
    ),
  )
  return [...whole, ...asked]
}

function sumVerdict({ items, essentials }: Assessment): Verdict {
  const verdicts = items.map(({ verdict }) => verdict)
  if (verdicts.includes('no')) return 'no'
  if (verdicts.includes('unknown')) return 'unknown'
  return verdicts.includes('changes') || essentials.some(({ isMet }) => !isMet) ? 'changes' : 'fits'
}

/** A whole assessment in words, in the reader's units. */
export function presentReport(assessment: Assessment, words: Printer): Report {
  const { items, essentials, budgets, plan } = assessment
  return {
    verdict: sumVerdict(assessment),
    items: items.map((item) => presentItem(item, words)),
    missing: essentials.filter(({ isMet }) => !isMet).map(({ need, say }) => ({ need, message: say(words) })),
    needs: presentNeeds(assessment, words),
    budgets: Object.fromEntries(
      Object.entries(budgets).map(([key, { used, limit, unit, say }]) => [
        key,
        { used, limit, unit: units[unit].ucum, message: say(words) },
      ]),
    ),
    cautions: [...new Set(items.flatMap(({ judged }) => presentCautions(judged, words)))],
    assumptions: listAssumptions(plan, words),
  }
}
