import { getKind } from '../kinds/index'
import { findRestKnockOns, isConceded, type Bench } from './bench'
import { describeWay, weighKnockOns, type CandidateOptions } from './candidates'
import { getRules } from './checks/index'
import { classify } from './classes'
import type { Judged } from './judge'
import type { Candidate } from './rule'
import { countDifferences } from './swap/differences'
import { countExtraPieces } from './swap/meeting-kinds'
import { codes, isDemand, Table, toCode, wouldSeveralDo } from './table'
import type { Piece, Verdict } from './types'

const verdictOfCode: readonly (Verdict | null)[] = ['fits', 'changes', 'unknown', 'no', null]
/** Instead of a code: not among the candidates. */
const leftOut = 4

export interface SweepOptions extends CandidateOptions {
  /** How many of a piece are judged, where that is not alike for all. */
  readonly countOf?: (piece: Piece) => number
  /** Not to be judged, although it is of the kind: what is gone itself. */
  readonly isLeftOut?: (piece: Piece) => boolean
}

const sizeKeys = ['lengthMm', 'widthMm', 'heightMm', 'diameterMm']

/** Of each piece of a catalogue, as numbers: its verdict, what it asks of the setup, and how near it is to the target. */
export interface Sweep {
  readonly bench: Bench
  /** Null: left out. */
  readonly verdicts: readonly (Verdict | null)[]
  /** Own changes, those that for all that is known are some, and those of the rest of the setup. */
  readonly demands: Int32Array
  /** Pieces that have to be got beside it, by kind; 0 where nothing is gone. */
  readonly extrasOf: (index: number) => number
  readonly targetOf: (index: number) => number
  readonly candidateOf: (index: number) => Candidate
  /** The rules at the quantity that was settled on for the piece. */
  readonly tableOf: (index: number) => Table
  readonly judgedOf: (index: number) => readonly Judged[]
  /** Whether the rule is one of those that make a piece not fit, or unknown. */
  readonly isDecidedBy: (index: number, ruleId: string) => boolean
  /** Pieces that do not fit, by the rules they fail, most first. */
  readonly countFailures: () => readonly { readonly check: string; readonly count: number }[]
}

/** The tables that were needed, and by number which of them each piece is judged by: at first all by the first. */
class Tables {
  readonly all: Table[] = []
  private readonly numbers = new Map<string, number>()
  readonly ofPiece: Uint8Array

  constructor(
    private readonly bench: Bench,
    private readonly pieces: readonly Piece[],
    private readonly options: CandidateOptions,
  ) {
    this.ofPiece = new Uint8Array(pieces.length)
  }

  /** The number of the table for so many of each piece. */
  require(quantity: number, mayMultiply: boolean): number {
    const key = `${quantity} ${mayMultiply}`
    let number = this.numbers.get(key)
    if (number === undefined) {
      const way = describeWay(this.options, quantity, mayMultiply)
      number = this.all.push(new Table(this.bench.scene, getRules(this.bench.kind), this.pieces, way)) - 1
      this.numbers.set(key, number)
    }
    return number
  }

  of(index: number): Table {
    return this.all[this.ofPiece[index]!]!
  }
}

/** Judges every piece by every rule of the bench's kind. See `fit` for what is asked of `pieces`. */
export function sweep(bench: Bench, pieces: readonly Piece[], options: SweepOptions): Sweep {
  const tables = new Tables(bench, pieces, options)
  const start = options.quantity ?? options.there ?? 1
  const first = tables.all[tables.require(start, true)]!
  const { countOf, isLeftOut } = options
  if (countOf)
    pieces.forEach((piece, index) => {
      const count = countOf(piece)
      if (count !== start) tables.ofPiece[index] = tables.require(count, true)
    })
  const own = new Int8Array(pieces.length)
  const demands = new Int32Array(pieces.length)
  const several = addUp(bench, tables, first, own, demands)
  if (options.quantity === undefined) {
    settleSeveral(bench, tables, several, start, own, demands)
    if (start > 1 && !countOf) settleFewer(bench, tables, own, demands)
  }
  if (isLeftOut)
    pieces.forEach((piece, index) => {
      if (isLeftOut(piece)) own[index] = leftOut
    })
  const candidateOf = (index: number): Candidate => ({ piece: pieces[index]!, ...tables.of(index).way })
  const restNeedsOf = addRestDemands(bench, pieces, own, demands, candidateOf)
  return {
    bench,
    demands,
    candidateOf,
    verdicts: Array.from(own, (code) => verdictOfCode[code]!),
    extrasOf: bench.gone ? countExtras(bench, tables, restNeedsOf) : () => 0,
    targetOf: measureTargets(bench, pieces, tables, candidateOf),
    tableOf: (index) => tables.of(index),
    judgedOf: (index) => tables.of(index).judgedOf(index),
    isDecidedBy: (index, ruleId) => {
      if (own[index] !== codes.fail && own[index] !== codes.unknown) return false
      const column = tables.of(index).columns.find(({ rule }) => rule.id === ruleId)
      return column !== undefined && toCode(column.codeOf(index)) === own[index]
    },
    countFailures: () => countFailures(tables, first, own),
  }
}

/** Fills in each piece's worst code and its changes, rule by rule; answers the pieces of which several would do. */
function addUp(bench: Bench, tables: Tables, first: Table, own: Int8Array, demands: Int32Array): readonly number[] {
  const several = new Uint8Array(own.length)
  const isUniform = tables.all.length === 1
  first.columns.forEach((column, at) => {
    const demand = isConceded(bench, column.rule.id) ? 0 : 1
    for (let index = 0; index < own.length; index += 1) {
      const coded = (isUniform ? column : tables.of(index).columns[at]!).codeOf(index)
      const code = toCode(coded)
      if (code > own[index]!) own[index] = code
      if (isDemand(coded)) demands[index]! += demand
      // Of what is gone more would have been better too: its replacement takes its place one for one.
      if (wouldSeveralDo(coded) && demand === 1) several[index] = 1
    }
  })
  const found: number[] = []
  several.forEach((would, index) => {
    if (would === 1 && own[index] !== codes.fail) found.push(index)
  })
  return found
}

function settleOn(bench: Bench, tables: Tables, index: number, number: number, own: Int8Array, demands: Int32Array) {
  tables.ofPiece[index] = number
  const table = tables.all[number]!
  own[index] = table.codeOf(index)
  demands[index] = table.countDemands(index, (ruleId) => isConceded(bench, ruleId))
}

/** Judges so many of a piece as would do; if that fails elsewhere (no room), one of it without that way out. */
function settleSeveral(
  bench: Bench,
  tables: Tables,
  several: readonly number[],
  start: number,
  own: Int8Array,
  demands: Int32Array,
): void {
  for (const index of several) {
    const enough = tables.of(index).findEnough(index) ?? start
    let number = tables.require(enough, true)
    if (tables.all[number]!.codeOf(index) === codes.fail) number = tables.require(start, false)
    settleOn(bench, tables, index, number, own, demands)
  }
}

/** One of a piece where so many as there were do not fit: one strong heater in place of two weak ones. */
function settleFewer(bench: Bench, tables: Tables, own: Int8Array, demands: Int32Array): void {
  const failed = [...own.keys()].filter((index) => own[index] === codes.fail)
  if (failed.length === 0) return
  const single = tables.require(1, true)
  const table = tables.all[single]!
  const better = failed.filter((index) => table.codeOf(index) !== codes.fail)
  for (const index of better) settleOn(bench, tables, index, single, own, demands)
  const several = better.filter((index) => table.findEnough(index) !== undefined)
  settleSeveral(bench, tables, several, 1, own, demands)
}

function countFailures(tables: Tables, first: Table, own: Int8Array) {
  return first.columns
    .map(({ rule }, at) => {
      let count = 0
      for (let index = 0; index < own.length; index += 1)
        if (own[index] === codes.fail && toCode(tables.of(index).columns[at]!.codeOf(index)) === codes.fail) count += 1
      return { check: rule.id, count }
    })
    .filter(({ count }) => count > 0)
    .sort((a, b) => b.count - a.count)
}

/**
 * Adds what each piece makes the rest of the setup ask, found once per class of pieces that the rest cannot tell apart;
 * answers the needs among that.
 */
function addRestDemands(
  bench: Bench,
  pieces: readonly Piece[],
  own: Int8Array,
  demands: Int32Array,
  candidateOf: (index: number) => Candidate,
): (index: number) => readonly string[] {
  if (bench.scene.others.length === 0 && !bench.gone) return () => []
  const { feltThrough } = getRules(bench.kind)
  const all = getKind(bench.kind).attributes.map(({ key }) => key)
  // A piece that was told where to stand takes room from what else stands there.
  const isPlaced = pieces.length > 0 && candidateOf(0).place !== undefined
  const felt = feltThrough && isPlaced ? [...new Set([...feltThrough, ...sizeKeys])] : (feltThrough ?? all)
  const classes = classify(pieces, `${bench.kind} felt${isPlaced ? ' in place' : ''}`, felt)
  const known = new Map<string, { readonly count: number; readonly needs: readonly string[] }>()
  const keyOf = (index: number, { quantity }: Candidate) => `${classes.ofPiece[index]!} ${quantity}`
  for (let index = 0; index < pieces.length; index += 1) {
    if (own[index]! >= codes.fail) continue
    const candidate = candidateOf(index)
    const key = keyOf(index, candidate)
    let felt = known.get(key)
    if (felt === undefined) {
      const found = findRestKnockOns(bench, candidate)
      known.set(key, (felt = { count: found.length, needs: found.flatMap(({ need }) => need ?? []) }))
    }
    demands[index]! += felt.count
    if (weighKnockOns(verdictOfCode[own[index]!]!, felt.count) === 'changes') own[index] = codes.change
  }
  return (index) => known.get(keyOf(index, candidateOf(index)))?.needs ?? []
}

/** What the pieces' own checks ask for, which what is gone did not, and what they make the rest ask for. */
function countExtras(
  bench: Bench,
  tables: Tables,
  restNeedsOf: (index: number) => readonly string[],
): (index: number) => number {
  return (index) => {
    const needs = tables
      .of(index)
      .columns.filter((column) => toCode(column.codeOf(index)) === codes.change && !isConceded(bench, column.rule.id))
      .flatMap((column) => column.judgementOf(index)?.judgement.asks?.need ?? [])
    return countExtraPieces(new Set([...needs, ...restNeedsOf(index)]))
  }
}

/**
 * A piece's distance from the kind's target, found once per class of pieces and quantity; for kinds without one, how many
 * differences there are from what is gone.
 */
function measureTargets(
  bench: Bench,
  pieces: readonly Piece[],
  tables: Tables,
  candidateOf: (index: number) => Candidate,
): (index: number) => number {
  const { target, targetReads = [] } = getRules(bench.kind)
  const { kind, gone } = bench
  if (!target) return gone ? (index) => countDifferences(kind, gone.item.piece.specs, pieces[index]!.specs) : () => 0
  const classes = classify(pieces, `${bench.kind} target`, targetReads)
  const known = new Map<number, number>()
  return (index) => {
    const key = classes.ofPiece[index]! * 256 + tables.ofPiece[index]!
    let distance = known.get(key)
    if (distance === undefined) known.set(key, (distance = target(bench.scene, candidateOf(index)) ?? Number.MAX_VALUE))
    return distance
  }
}
