import { getAttribute } from '../kinds/index'
import { findCondition, type Condition } from './conditions'
import type { Candidate, Judgement, Rule } from './rule'
import type { Scene } from './scene'
import type { Outcome, Specs } from './types'
import { listUsual } from './usual'

/** A rule's finding once assumptions and missing numbers were given their due. */
export interface Judged {
  readonly rule: Rule
  readonly judgement: Judgement
  readonly outcome: Outcome
  readonly assumed: () => readonly string[]
  /** For no data: the outcome that every usual value of what is missing would give, if they all agree. */
  readonly eitherWay?: Outcome
  readonly condition?: () => Condition
}

/** Setup paths with their defaults in use that match a rule's `uses`, the most telling first. */
function listAssumed(scene: Scene, uses: readonly string[]): readonly string[] {
  const { assumed } = scene.plan
  return uses.flatMap((path) => {
    if (!path.includes('*')) return assumed.has(path) ? [path] : []
    const [head, tail] = path.split('*') as [string, string]
    return [...assumed.keys()].filter((key) => key.startsWith(head) && key.endsWith(tail))
  })
}

/**
 * What the check would say for every usual value of the missing attributes; undefined where they disagree, cannot be
 * tried, or would condemn the piece on an assumed value.
 */
function tryMissing(
  scene: Scene,
  rule: Rule,
  candidate: Candidate,
  missing: readonly string[],
  isAssumed: boolean,
): Outcome | undefined {
  if (rule.worst !== 'fail' || missing.length === 0 || missing.length > 2) return undefined
  const grid = missing.reduce<Specs[]>(
    (rows, key) =>
      rows.flatMap((row) =>
        listUsual(getAttribute(candidate.piece.kind, key)).map((value) => ({
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
  return shared === 'fail' && isAssumed ? undefined : shared
}

/** Judges one rule for one candidate. Null where the rule does not apply. */
export function judge(scene: Scene, rule: Rule, candidate: Candidate): Judged | null {
  const judgement = rule.judge(scene, candidate)
  if (!judgement) return null
  const assumed = () => listAssumed(scene, judgement.rests?.() ?? rule.uses)
  const base = { rule, judgement, assumed }
  if (judgement.outcome === 'nodata') {
    const eitherWay = tryMissing(scene, rule, candidate, judgement.missing ?? [], assumed().length > 0)
    return { ...base, outcome: 'nodata', ...(eitherWay && { eitherWay }) }
  }
  if (judgement.outcome !== 'fail') return { ...base, outcome: judgement.outcome }
  const condition = findCondition(scene, assumed(), (varied) => rule.judge(varied, candidate)?.outcome === 'pass')
  return condition ? { ...base, outcome: 'change', condition } : { ...base, outcome: 'fail' }
}
