import { getAttribute } from '../kinds/index'
import type { Printer } from '../units/print'
import { listAssumptions } from './assumptions'
import { complete, isFrame } from './candidates'
import { getRules } from './checks/index'
import { assessJoint, type Joint } from './joint'
import type { RawKnockOn } from './knock-ons'
import { groupByVerdict, sortGroup, takePage } from './ranking'
import type { Candidate } from './rule'
import type { Sweep } from './sweep'
import type { FitOptions, FitResult, Piece } from './types'
import { decideVerdict, verdictOrder } from './verdict'

/** Among the indexes of pieces: the answer that several of them give together. */
const together = -1

function tally(
  indexes: readonly number[],
  keysOf: (index: number) => readonly string[],
): readonly { key: string; count: number }[] {
  const counts = new Map<string, number>()
  for (const index of indexes) for (const key of new Set(keysOf(index))) counts.set(key, (counts.get(key) ?? 0) + 1)
  return [...counts]
    .map(([key, count]) => ({ key, count }))
    .sort((a, b) => b.count - a.count || (a.key < b.key ? -1 : 1))
}

type Listed = Omit<FitResult, 'answers' | 'scales' | 'marks'>

/** One page of a sweep in the order of answers, and what is told of all the rest. */
export interface AnswerPage extends Listed {
  /** With `pieces` where several give the answer together. */
  readonly found: readonly (Pick<Joint, 'assessed'> & Partial<Joint>)[]
}

/** `findRest`: what a candidate that does not fail changes in the rest of the setup. */
export function listAnswers(
  swept: Sweep,
  pieces: readonly Piece[],
  { verdict: wanted, check, missing, offset, limit }: FitOptions,
  findRest: (candidate: Candidate) => readonly RawKnockOn[],
  words: Printer,
): AnswerPage {
  const { bench } = swept
  const groups = groupByVerdict(swept)
  const joint = assessJoint(swept, pieces, findRest)
  const lists = verdictOrder
    .filter((verdict) => !wanted || verdict === wanted)
    .flatMap((verdict) => {
      const isNarrowed = check !== undefined || missing !== undefined
      const isAsked = (index: number) =>
        (check === undefined || swept.isDecidedBy(index, check)) &&
        (missing === undefined || (verdict === 'unknown' && swept.tableOf(index).missingOf(index).includes(missing)))
      const group = isNarrowed ? groups[verdict].filter(isAsked) : groups[verdict]
      return joint?.assessed.verdict === verdict && !isNarrowed ? [[together], group] : [group]
    })
  const page = takePage(lists, offset, limit, (indexes, needed) =>
    indexes[0] === together ? indexes : sortGroup(indexes, swept, pieces, needed),
  )
  const found = page.indexes.map((index) => {
    if (index === together) return joint!
    const candidate = swept.candidateOf(index)
    const judged = swept.judgedOf(index)
    const own = decideVerdict(judged)
    return {
      assessed: complete(bench, candidate, judged, own, own === 'no' && !isFrame(bench) ? [] : findRest(candidate)),
    }
  })
  const { kind } = bench
  const labels = new Map(getRules(kind).rules.map(({ id, failLabel }) => [id, failLabel]))
  const count = (verdict: keyof typeof groups) => groups[verdict].length + (joint?.assessed.verdict === verdict ? 1 : 0)
  return {
    found,
    counts: { fits: count('fits'), changes: count('changes'), no: count('no'), unknown: count('unknown') },
    failedBy: swept.countFailures().map((one) => ({ ...one, label: labels.get(one.check) ?? one.check })),
    missingBy: tally(groups.unknown, (index) => swept.tableOf(index).missingOf(index)).map((one) => ({
      ...one,
      label: getAttribute(kind, one.key)?.label ?? one.key,
    })),
    assumptions: listAssumptions(bench.scene.plan, words),
    total: page.total,
  }
}
