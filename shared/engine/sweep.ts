import { getKind, type KindKey } from '../kinds/index'
import {
  describeWay,
  findRestKnockOns,
  judgeCandidate,
  setBench,
  weighKnockOns,
  type Bench,
  type CandidateOptions,
} from './candidates'
import { getRules } from './checks/index'
import { classify, classifyForRule, type Classes } from './classes'
import { judge, type Judged } from './judge'
import type { Candidate, Rule } from './rule'
import type { Piece, Setup, Verdict } from './types'

/** What one judgement does to the verdict; the worst of a piece's codes is its verdict. */
export const codes = { nothing: 0, change: 1, unknown: 2, fail: 3 } as const

const verdictOfCode: readonly Verdict[] = ['fits', 'changes', 'unknown', 'no']

/** Of each piece of a catalogue, as numbers: its verdict, what it asks of the setup, and how near it is to the target. */
export interface Sweep {
  readonly bench: Bench
  readonly verdicts: readonly Verdict[]
  /** Own changes and those of the rest of the setup. */
  readonly demands: Int32Array
  readonly targets: Float64Array
  readonly candidateOf: (index: number) => Candidate
  /** The judgements of one piece, at the quantity that was settled on. */
  readonly judgedOf: (index: number) => readonly Judged[]
  /** Whether the rule is one of those that make a piece not fit, or unknown. */
  readonly isDecidedBy: (index: number, ruleId: string) => boolean
  /** Pieces that do not fit, by the rules they fail, most first. */
  readonly countFailures: () => readonly { readonly check: string; readonly count: number }[]
}

interface Column {
  readonly rule: Rule
  readonly classes: Classes
  readonly judged: (Judged | null)[]
  /** Per class: a code plus 8 where several of the piece would do, or −1 before it was asked. */
  readonly codes: Int8Array
}

const severalWouldDo = 8

function encode(judged: Judged | null): number {
  if (!judged) return codes.nothing
  const outcome = judged.eitherWay ?? judged.outcome
  if (outcome === 'fail') return codes.fail
  if (outcome === 'nodata') return judged.rule.worst === 'fail' ? codes.unknown : codes.nothing
  if (outcome === 'change') return codes.change + (judged.judgement.enough === undefined ? 0 : severalWouldDo)
  return codes.nothing
}

/** The rules of a kind over all pieces for one way of judging them; each rule is asked once per class of equal pieces. */
class Table {
  readonly columns: readonly Column[]

  constructor(
    private readonly bench: Bench,
    private readonly pieces: readonly Piece[],
    readonly way: Omit<Candidate, 'piece'>,
  ) {
    this.columns = getRules(bench.kind).rules.map((rule) => {
      const classes = classifyForRule(pieces, rule)
      return { rule, classes, judged: [], codes: new Int8Array(classes.first.length).fill(-1) }
    })
  }

  codeOf(column: Column, index: number): number {
    const id = column.classes.ofPiece[index]!
    const known = column.codes[id]!
    if (known >= 0) return known
    const glance = column.rule.glance?.(this.bench.scene, this.candidateOf(index))
    if (glance) return (column.codes[id] = glance === 'fail' ? codes.fail : codes.nothing)
    return (column.codes[id] = encode(this.judgementOf(column, index)))
  }

  private candidateOf(index: number): Candidate {
    return { piece: this.pieces[index]!, ...this.way }
  }

  private judgementOf(column: Column, index: number): Judged | null {
    const id = column.classes.ofPiece[index]!
    let judged = column.judged[id]
    if (judged === undefined) judged = column.judged[id] = judge(this.bench.scene, column.rule, this.candidateOf(index))
    return judged
  }

  judgedOf(index: number): readonly Judged[] {
    return this.columns.flatMap((column) => this.judgementOf(column, index) ?? [])
  }
}

/** Judges every piece by every rule of its kind. See `fit` for what is asked of `pieces`. */
export function sweep(setup: Setup, kind: KindKey, pieces: readonly Piece[], options: CandidateOptions): Sweep {
  const bench = setBench(setup, kind, options)
  const tables = new Map<string, Table>()
  const tableFor = (way: Omit<Candidate, 'piece'>): Table => {
    const key = `${way.quantity} ${way.mayMultiply}`
    const table = tables.get(key) ?? new Table(bench, pieces, way)
    tables.set(key, table)
    return table
  }
  const first = tableFor(describeWay(options, options.quantity ?? 1))
  const settled = new Map<number, Table>()
  const own = new Int8Array(pieces.length)
  const demands = new Int32Array(pieces.length)

  const settle = (index: number): void => {
    const { candidate } = judgeCandidate(bench.scene, pieces[index]!, options, (way) => tableFor(way).judgedOf(index))
    const table = tableFor(candidate)
    settled.set(index, table)
    if (table !== first) count(table, index)
  }
  const count = (table: Table, index: number): void => {
    let worst: number = codes.nothing
    let changes = 0
    let several = false
    for (const column of table.columns) {
      const coded = table.codeOf(column, index)
      const code = coded & 7
      if (code > worst) worst = code
      if (code === codes.change) changes += 1
      if (coded >= severalWouldDo) several = true
    }
    own[index] = worst
    demands[index] = changes
    if (several && options.quantity === undefined && table === first && worst !== codes.fail) settle(index)
  }
  for (let index = 0; index < pieces.length; index += 1) count(first, index)

  const tableOf = (index: number): Table => settled.get(index) ?? first
  const candidateOf = (index: number): Candidate => ({ piece: pieces[index]!, ...tableOf(index).way })
  addRestDemands(bench, pieces, own, demands, candidateOf)
  return {
    bench,
    demands,
    candidateOf,
    verdicts: Array.from(own, (code) => verdictOfCode[code]!),
    targets: measureTargets(bench, pieces, candidateOf),
    judgedOf: (index) => tableOf(index).judgedOf(index),
    isDecidedBy: (index, ruleId) => {
      if (own[index] !== codes.fail && own[index] !== codes.unknown) return false
      const table = tableOf(index)
      const column = table.columns.find(({ rule }) => rule.id === ruleId)
      return column !== undefined && (table.codeOf(column, index) & 7) === own[index]
    },
    countFailures: () => {
      const counts = new Int32Array(first.columns.length)
      for (let index = 0; index < pieces.length; index += 1) {
        if (own[index] !== codes.fail) continue
        const table = tableOf(index)
        table.columns.forEach((column, at) => {
          if ((table.codeOf(column, index) & 7) === codes.fail) counts[at]! += 1
        })
      }
      return first.columns
        .map(({ rule }, at) => ({ check: rule.id, count: counts[at]! }))
        .filter(({ count }) => count > 0)
        .sort((a, b) => b.count - a.count)
    },
  }
}

/** Adds what each piece makes the rest of the setup ask, found once per class of pieces that the rest cannot tell apart. */
function addRestDemands(
  bench: Bench,
  pieces: readonly Piece[],
  own: Int8Array,
  demands: Int32Array,
  candidateOf: (index: number) => Candidate,
) {
  if (bench.scene.others.length === 0) return
  const { feltThrough } = getRules(bench.kind)
  const all = getKind(bench.kind).attributes.map(({ key }) => key)
  const classes = classify(pieces, `${bench.kind} felt`, feltThrough ?? all)
  const known = new Map<string, number>()
  for (let index = 0; index < pieces.length; index += 1) {
    if (own[index] === codes.fail) continue
    const candidate = candidateOf(index)
    const key = `${classes.ofPiece[index]!} ${candidate.quantity}`
    let count = known.get(key)
    if (count === undefined) known.set(key, (count = findRestKnockOns(bench, candidate).length))
    demands[index]! += count
    if (weighKnockOns(verdictOfCode[own[index]!]!, count) === 'changes') own[index] = codes.change
  }
}

function measureTargets(
  bench: Bench,
  pieces: readonly Piece[],
  candidateOf: (index: number) => Candidate,
): Float64Array {
  const { target, targetReads = [] } = getRules(bench.kind)
  const targets = new Float64Array(pieces.length)
  if (!target) return targets
  const classes = classify(pieces, `${bench.kind} target`, targetReads)
  const known = new Map<number, number>()
  for (let index = 0; index < pieces.length; index += 1) {
    const candidate = candidateOf(index)
    const key = classes.ofPiece[index]! * 16 + candidate.quantity
    let distance = known.get(key)
    if (distance === undefined) known.set(key, (distance = target(bench.scene, candidate) ?? Number.MAX_VALUE))
    targets[index] = distance
  }
  return targets
}
