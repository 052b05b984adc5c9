import { findSetupField } from '../kinds/setup-fields'
import { getAttribute } from '../kinds/index'
import type { Attribute } from '../kinds/types'
import { findLast } from './physics/bisect'
import type { Candidate, Judgement, Rule, Say } from './rule'
import { vary, type Scene } from './scene'
import type { Outcome, Specs } from './types'

/** The assumed value on which an outcome turns, and where it turns. */
export interface Condition {
  readonly path: string
  /** The check is kept from here on, towards `toward`; null for a choice, which has no way. */
  readonly turnsAt: number | string
  readonly toward: 'more' | 'less' | null
  readonly assumed: number | string | boolean
}

/** A rule's finding once assumptions and missing numbers were given their due. */
export interface Judged {
  readonly rule: Rule
  readonly judgement: Judgement
  readonly outcome: Outcome
  readonly assumed: readonly string[]
  /** For no data: the outcome that every usual value of what is missing would give, if they all agree. */
  readonly eitherWay?: Outcome
  readonly condition?: () => Condition
}

const samples = 9

/** Setup paths with their defaults in use that match a rule's `uses`, the most telling first. */
function listAssumed(scene: Scene, uses: readonly string[]): readonly string[] {
  const { assumed } = scene.plan
  return uses.flatMap((path) => {
    if (!path.includes('*')) return assumed.has(path) ? [path] : []
    const [head, tail] = path.split('*') as [string, string]
    return [...assumed.keys()].filter((key) => key.startsWith(head) && key.endsWith(tail))
  })
}

const usualValues = (attribute: Attribute | undefined): readonly (number | string)[] => {
  if (attribute?.type === 'measure') {
    const [low, high] = attribute.usual
    return Array.from({ length: samples }, (_, index) => low + ((high - low) * index) / (samples - 1))
  }
  if (attribute?.type === 'choice')
    return attribute.options.map(({ value }) => (attribute.numeric ? Number(value) : value))
  return []
}

/** What the check would say for every usual value of the missing attributes; undefined where they disagree or cannot be tried. */
function tryMissing(scene: Scene, rule: Rule, candidate: Candidate, missing: readonly string[]): Outcome | undefined {
  if (missing.length === 0 || missing.length > 2) return undefined
  const grid = missing.reduce<Specs[]>(
    (rows, key) =>
      rows.flatMap((row) =>
        usualValues(getAttribute(candidate.piece.kind, key)).map((value) => ({
          ...row,
          [key]: { value, source: 'estimate' as const },
        })),
      ),
    [{}],
  )
  if (grid.length <= 1) return undefined
  let shared: Outcome | undefined
  for (const extra of grid) {
    const piece = { ...candidate.piece, specs: { ...candidate.piece.specs, ...extra } }
    const outcome = rule.judge(scene, { ...candidate, piece })?.outcome
    if (outcome === undefined || outcome === 'nodata' || (shared !== undefined && outcome !== shared)) return undefined
    shared = outcome
  }
  return shared
}

const isKept = (outcome: Outcome | undefined) => outcome === 'pass'

/** The first assumed value whose usual range holds one with which the check would pass. */
function findCondition(
  scene: Scene,
  rule: Rule,
  candidate: Candidate,
  assumed: readonly string[],
): (() => Condition) | undefined {
  const outcomeAt = (path: string, value: number | string) => rule.judge(vary(scene, path, value), candidate)?.outcome
  for (const path of assumed) {
    const used = scene.plan.assumed.get(path)
    const attribute = findSetupField(path)?.attribute
    if (typeof used === 'number' && attribute?.type === 'measure') {
      for (const [index, end] of attribute.usual.entries()) {
        const isBeyond = index === 0 ? end < used : end > used
        if (!isBeyond || !isKept(outcomeAt(path, end))) continue
        return () => {
          const fails = (share: number) =>
            !isKept(
              rule.judge(vary({ ...scene, kept: new Map() }, path, used + share * (end - used)), candidate)?.outcome,
            )
          const share = findLast(fails, 0, 1) ?? 0
          return { path, assumed: used, turnsAt: used + share * (end - used), toward: index === 0 ? 'less' : 'more' }
        }
      }
    }
    if (attribute?.type === 'choice' && (typeof used === 'string' || typeof used === 'number')) {
      const other = usualValues(attribute).find((value) => value !== used && isKept(outcomeAt(path, value)))
      if (other !== undefined) return () => ({ path, assumed: used, turnsAt: other, toward: null })
    }
  }
  return undefined
}

/** Judges one rule for one candidate. Null where the rule does not apply. */
export function judge(scene: Scene, rule: Rule, candidate: Candidate): Judged | null {
  const judgement = rule.judge(scene, candidate)
  if (!judgement) return null
  const assumed = listAssumed(scene, judgement.rests ?? rule.uses)
  const base = { rule, judgement, assumed }
  if (judgement.outcome === 'nodata') {
    const eitherWay = tryMissing(scene, rule, candidate, judgement.missing ?? [])
    return { ...base, outcome: 'nodata', ...(eitherWay && { eitherWay }) }
  }
  if (judgement.outcome !== 'fail' || assumed.length === 0) return { ...base, outcome: judgement.outcome }
  const condition = findCondition(scene, rule, candidate, assumed)
  return condition ? { ...base, outcome: 'change', condition } : { ...base, outcome: 'fail' }
}

/** "Only while the coldest room is at least 20.8 °C; we assumed 18 °C." */
export const describeCondition =
  (condition: Condition): Say =>
  (words) => {
    const attribute = findSetupField(condition.path)?.attribute
    if (!attribute) return ''
    const print = (value: number | string | boolean): string => {
      if (attribute.type === 'measure' && typeof value === 'number') return words.measure(value, attribute.unit)
      if (attribute.type === 'choice')
        return attribute.options.find((option) => option.value === String(value))?.label ?? String(value)
      return String(value)
    }
    const { turnsAt, toward, assumed } = condition
    if (attribute.type === 'measure' && typeof turnsAt === 'number' && typeof assumed === 'number') {
      const [at, was] = words.apart(turnsAt, assumed, attribute.unit)
      return `It works if the ${attribute.label} is ${toward === 'less' ? 'at most' : 'at least'} ${at}; we assumed ${was}.`
    }
    return `It works if the ${attribute.label} is ${print(turnsAt)}; we assumed ${print(assumed)}.`
  }
