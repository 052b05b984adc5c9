import { getRules } from './checks/index'
import { countEnough, judgeCandidate, setBench, type Bench, type CandidateOptions } from './candidates'
import { classify, classifyForRule, type Classes } from './classes'
import { judge, type Judged } from './judge'
import type { Rule } from './rule'
import type { Piece, Setup, Verdict } from './types'
import { decideVerdict } from './verdict'
import type { KindKey } from '../kinds/index'

/** Of each piece of a catalogue, without words: its verdict, its own changes, and how near it is to the kind's target. */
export interface Sweep {
  readonly bench: Bench
  readonly verdicts: readonly Verdict[]
  readonly changes: Int32Array
  readonly targets: Float64Array
  readonly quantities: Int32Array
  /** The judgements of one piece, at the quantity that was settled on. */
  readonly judgedOf: (index: number) => readonly Judged[]
}

interface Column {
  readonly rule: Rule
  readonly classes: Classes
  readonly judged: (Judged | null | undefined)[]
}

/** Judges every piece by every rule of its kind, each rule once per class of pieces that are alike to it. */
export function sweep(setup: Setup, kind: KindKey, pieces: readonly Piece[], options: CandidateOptions): Sweep {
  const bench = setBench(setup, kind, options)
  const { scene } = bench
  const kindRules = getRules(kind)
  const quantity = options.quantity ?? 1
  const columns: Column[] = kindRules.rules.map((rule) => ({
    rule,
    classes: classifyForRule(pieces, rule),
    judged: [],
  }))
  const candidateOf = (piece: Piece) => ({
    piece,
    quantity,
    mayMultiply: options.quantity === undefined,
    ...(options.place && { place: options.place }),
  })
  const settled = new Map<number, readonly Judged[]>()

  const collect = (index: number): readonly Judged[] =>
    columns.flatMap(({ rule, classes, judged }) => {
      const id = classes.ofPiece[index]!
      let one = judged[id]
      if (one === undefined) one = judged[id] = judge(scene, rule, candidateOf(pieces[index]!))
      return one ?? []
    })

  const verdicts: Verdict[] = []
  const changes = new Int32Array(pieces.length)
  const quantities = new Int32Array(pieces.length).fill(quantity)
  for (let index = 0; index < pieces.length; index += 1) {
    let judged = collect(index)
    let verdict = decideVerdict(judged)
    if (verdict !== 'no' && countEnough(judged) !== undefined) {
      const several = judgeCandidate(scene, pieces[index]!, options)
      judged = several.judged
      verdict = several.verdict
      quantities[index] = several.candidate.quantity
      settled.set(index, judged)
    }
    verdicts.push(verdict)
    for (const { outcome } of judged) if (outcome === 'change') changes[index]! += 1
  }

  const targets = new Float64Array(pieces.length)
  if (kindRules.target) {
    const classes = classify(pieces, `${kind}.target`, kindRules.targetReads ?? [])
    const cache = new Map<number, number>()
    for (let index = 0; index < pieces.length; index += 1) {
      const id = classes.ofPiece[index]! * 8 + quantities[index]!
      let distance = cache.get(id)
      if (distance === undefined) {
        distance =
          kindRules.target(scene, { ...candidateOf(pieces[index]!), quantity: quantities[index]! }) ?? Number.MAX_VALUE
        cache.set(id, distance)
      }
      targets[index] = distance
    }
  }
  return { bench, verdicts, changes, targets, quantities, judgedOf: (index) => settled.get(index) ?? collect(index) }
}
