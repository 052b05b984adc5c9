import { getAttribute, type KindKey } from '../kinds/index'
import { findCondition } from './conditions'
import type { Candidate, Judgement, Rule } from './rule'
import { listAssumed, type Scene } from './scene'
import type { Outcome, Specs } from './types'
import { listUsual } from './usual'
import type { Asked, Condition } from './ways'

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

const grids = new Map<string, readonly Specs[]>()

/** Every combination of the usual values of some attributes, the ends first: they are the likeliest to disagree. */
function gridOf(kind: KindKey, keys: readonly string[]): readonly Specs[] {
  const name = `${kind} ${keys.join(' ')}`
  let grid = grids.get(name)
  if (!grid) {
    const all = keys.reduce<Specs[]>(
      (rows, key) =>
        rows.flatMap((row) =>
          listUsual(getAttribute(kind, key)).map((value) => ({
            ...row,
            [key]: { value, source: 'estimate' as const },
          })),
        ),
      [{}],
    )
    grid = [...all.slice(-1), ...all.slice(0, -1)]
    grids.set(name, grid)
  }
  return grid
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
  assumed: () => readonly string[],
): Outcome | undefined {
  if (rule.worst !== 'fail' || rule.isModelled || missing.length === 0 || missing.length > 2) return undefined
  const grid = gridOf(candidate.piece.kind, missing)
  if (grid.length <= 1) return undefined
  let shared: Outcome | undefined
  for (const extra of grid) {
    const piece = { ...candidate.piece, specs: { ...candidate.piece.specs, ...extra } }
    const outcome = findOutcome(scene, rule, { ...candidate, piece })
    if (outcome === undefined || outcome === 'nodata' || (shared !== undefined && outcome !== shared)) return undefined
    shared = outcome
  }
  return shared === 'fail' && assumed().length > 0 ? undefined : shared
}

/** The bare outcome, assumptions not given their due; undefined where the rule does not apply. */
export function findOutcome(scene: Scene, rule: Rule, candidate: Candidate): Outcome | undefined {
  const glance = rule.glance?.look(scene, rule.glance.read(candidate.piece.specs), candidate)
  if (glance === 'never') return 'fail'
  if (glance === 'unknown') return 'nodata'
  return glance ?? rule.judge(scene, candidate)?.outcome
}

/** Judges one rule for one candidate. Null where the rule does not apply. */
export function judge(scene: Scene, rule: Rule, candidate: Candidate): Judged | null {
  const judgement = rule.judge(scene, candidate)
  if (!judgement) return null
  const assumed = () => listAssumed(scene, judgement.rests?.() ?? rule.uses)
  const base = { rule, judgement, assumed }
  if (judgement.outcome === 'nodata') {
    const eitherWay = tryMissing(scene, rule, candidate, judgement.missing ?? [], assumed)
    return { ...base, outcome: 'nodata', ...(eitherWay && { eitherWay }) }
  }
  if (judgement.outcome !== 'fail') return { ...base, outcome: judgement.outcome }
  const plain = rule.asPlain?.(candidate) ?? candidate
  const asked: Asked = {
    isKept: (varied) => findOutcome(varied, rule, plain) === 'pass',
    look: (varied) => rule.judge(varied, candidate),
    rule,
    judgement,
  }
  const condition = findCondition(scene, assumed(), asked)
  return condition ? { ...base, outcome: 'change', condition } : { ...base, outcome: 'fail' }
}
