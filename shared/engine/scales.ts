import { getRules } from './checks/index'
import type { KindKey } from '../kinds/index'
import type { Printer } from '../units/print'
import type { Judged } from './judge'
import type { Rule } from './rule'
import type { Sweep } from './sweep'
import type { Mark, Piece, Scale, Zone } from './types'
import { readNumber } from './values'

/** Candidates that are drawn; more would hide each other. */
const mostMarks = 400
const mostScales = 3
const far = 1e9

type Limit = number | readonly [number, number]

interface Reading {
  readonly measured: number
  readonly limit: Limit
  readonly changeLimit?: Limit
}

const readJudged = (judged: Judged | undefined): Reading | undefined => {
  const { measured, limit, changeLimit } = judged?.judgement ?? {}
  if (typeof measured !== 'number' || limit === undefined || limit === null) return undefined
  return { measured, limit, ...(changeLimit !== undefined && { changeLimit }) }
}

const isAlike = (values: readonly number[]) => values.every((value) => Math.abs(value - values[0]!) < 1e-6)

const toEnds = (limit: Limit, isLeast: boolean): readonly [number, number] =>
  typeof limit !== 'number' ? limit : isLeast ? [limit, far] : [0, limit]

/** From the limit on what misses it; between, where it is a change first, that. */
function zonesOf(limit: Limit, change: Limit, isLeast: boolean, miss: Zone['outcome']): readonly Zone[] {
  const [low, high] = toEnds(limit, isLeast)
  const [lowest, highest] = toEnds(change, isLeast)
  const zones: readonly Zone[] = [
    { from: 0, to: lowest, outcome: miss },
    { from: lowest, to: low, outcome: 'change' },
    { from: low, to: high, outcome: 'pass' },
    { from: high, to: highest, outcome: 'change' },
    { from: highest, to: far, outcome: miss },
  ]
  return zones.filter(({ from, to }) => to > from)
}

/** The change band that all readings share, else none beyond the limit itself. */
function findChangeLimit(list: readonly Reading[], limit: Limit): Limit {
  const ends = list.map(({ changeLimit }) => (changeLimit === undefined ? [] : [changeLimit].flat()))
  const isShared = [0, 1].every((end) => isAlike(ends.map((pair) => pair[end] ?? 0)))
  return (isShared && list[0]?.changeLimit) || limit
}

/**
 * One rule as a shared scale: where all candidates meet one limit, each stands at what was measured; where one measure of
 * the setup meets each candidate's own limit (a tank on stands), each stands at its limit. Undefined where neither holds.
 */
function deriveScale(
  rule: Rule,
  readings: ReadonlyMap<number, Reading>,
  words: Printer,
): { scale: Scale; values: ReadonlyMap<number, number> } | undefined {
  const list = [...readings.values()]
  const { unit } = rule
  if (unit === null || list.length < 2) return undefined
  const ends = list.map(({ limit }) => (typeof limit === 'number' ? [limit, limit] : limit))
  const hasOneLimit = isAlike(ends.map(([low]) => low)) && isAlike(ends.map(([, high]) => high))
  const hasOneMeasure =
    isAlike(list.map(({ measured }) => measured)) && list.every(({ limit }) => typeof limit === 'number')
  if (!hasOneLimit && !hasOneMeasure) return undefined
  const limit = hasOneLimit ? list[0]!.limit : list[0]!.measured
  const isLeast = (rule.limitIs === 'least') === hasOneLimit
  const miss = rule.worst === 'fail' ? 'fail' : 'change'
  const printed =
    typeof limit === 'number'
      ? `${isLeast ? 'at least' : 'at most'} ${words.measure(limit, unit)}`
      : words.pair(limit, unit)
  const values = new Map(
    [...readings].map(([index, reading]) => [index, hasOneLimit ? reading.measured : (reading.limit as number)]),
  )
  return {
    values,
    scale: {
      key: rule.id,
      check: rule.id,
      label: rule.label,
      unit,
      limitText: printed,
      limits: typeof limit === 'number' ? [limit] : [...limit],
      zones: zonesOf(limit, hasOneLimit ? findChangeLimit(list, limit) : limit, isLeast, miss),
    },
  }
}

/** The deciding checks as shared scales, and every candidate's mark on them: the kind's own, else those its rules lend themselves to. */
export function drawScales(
  kind: KindKey,
  swept: Sweep,
  order: readonly number[],
  pieces: readonly Piece[],
  words: Printer,
): { readonly scales: readonly Scale[]; readonly marks: readonly Mark[] } {
  const { rules, scales } = getRules(kind)
  const drawn = order.slice(0, mostMarks)
  const markAll = (valueOf: (index: number) => Readonly<Record<string, number | null>>): readonly Mark[] =>
    drawn.flatMap((index): Mark[] => {
      const { gear } = pieces[index]!
      return gear ? [{ ...gear, verdict: swept.verdicts[index]!, values: valueOf(index) }] : []
    })
  if (scales) {
    const own = scales(swept.bench.scene, words)
    return {
      scales: own,
      marks: markAll((index) =>
        Object.fromEntries(own.map(({ key }) => [key, readNumber(pieces[index]!.specs, key) ?? null])),
      ),
    }
  }
  const judgedOf = new Map(
    drawn.map((index) => [index, new Map(swept.judgedOf(index).map((one) => [one.rule.id, one]))]),
  )
  const derived = rules
    .flatMap((rule) => {
      const judged = drawn.flatMap((index) => judgedOf.get(index)?.get(rule.id) ?? [])
      // A check that every candidate passes and that fails nobody tells them apart by nothing.
      if (rule.worst === 'change' && judged.every(({ outcome }) => outcome === 'pass')) return []
      const readings = new Map(
        drawn.flatMap((index) => {
          const reading = readJudged(judgedOf.get(index)?.get(rule.id))
          return reading ? [[index, reading] as const] : []
        }),
      )
      return deriveScale(rule, readings, words) ?? []
    })
    .slice(0, mostScales)
  return {
    scales: derived.map(({ scale }) => scale),
    marks: markAll((index) =>
      Object.fromEntries(derived.map(({ scale, values }) => [scale.key, values.get(index) ?? null])),
    ),
  }
}
