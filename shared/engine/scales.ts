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

interface Reading {
  readonly measured: number
  readonly limit: number | readonly [number, number]
}

const readJudged = (judged: Judged | undefined): Reading | undefined => {
  const { measured, limit } = judged?.judgement ?? {}
  return typeof measured === 'number' && limit !== undefined && limit !== null ? { measured, limit } : undefined
}

const isAlike = (values: readonly number[]) => values.every((value) => Math.abs(value - values[0]!) < 1e-6)

function zonesOf(limit: number | readonly [number, number], isLeast: boolean, miss: Zone['outcome']): readonly Zone[] {
  if (typeof limit !== 'number')
    return [
      { from: 0, to: limit[0], outcome: miss },
      { from: limit[0], to: limit[1], outcome: 'pass' },
      { from: limit[1], to: far, outcome: miss },
    ]
  return isLeast
    ? [
        { from: 0, to: limit, outcome: miss },
        { from: limit, to: far, outcome: 'pass' },
      ]
    : [
        { from: 0, to: limit, outcome: 'pass' },
        { from: limit, to: far, outcome: miss },
      ]
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
      zones: zonesOf(limit, isLeast, miss),
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
