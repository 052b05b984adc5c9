import { getKind } from '../kinds/index'
import { findRestKnockOns, type Bench } from './bench'
import { weighKnockOns, type CandidateOptions } from './candidates'
import { getRules } from './checks/index'
import { classify } from './classes'
import type { Judged } from './judge'
import type { Candidate } from './rule'
import { countDifferences } from './swap/differences'
import { countExtraPieces } from './swap/meeting-kinds'
import { settleFewer, settleSeveral, Tables } from './settle-quantity'
import { codes, toCode, wouldSeveralDo, type Table } from './table'
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
  const several = addUp(tables, first, own, demands)
  const restOf = createRest(bench, pieces, first)
  if (options.quantity === undefined) {
    const tally = { own, demands }
    settleSeveral(tables, several, start, tally)
    if (start > 1 && !countOf) settleFewer(tables, start, tally, (index, table) => restOf(index, table).count)
  }
  if (isLeftOut)
    pieces.forEach((piece, index) => {
      if (isLeftOut(piece)) own[index] = leftOut
    })
  const candidateOf = (index: number): Candidate => ({ piece: pieces[index]!, ...tables.of(index).way })
  for (let index = 0; index < pieces.length; index += 1) {
    if (own[index]! >= codes.fail) continue
    const { count } = restOf(index, tables.of(index))
    demands[index]! += count
    if (weighKnockOns(verdictOfCode[own[index]!]!, count) === 'changes') own[index] = codes.change
  }
  const restNeedsOf = (index: number) => (own[index]! >= codes.fail ? [] : restOf(index, tables.of(index)).needs)
  return {
    bench,
    demands,
    candidateOf,
    verdicts: Array.from(own, (code) => verdictOfCode[code]!),
    extrasOf: bench.gone ? countExtras(tables, restNeedsOf) : () => 0,
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
function addUp(tables: Tables, first: Table, own: Int8Array, demands: Int32Array): readonly number[] {
  const several = new Uint8Array(own.length)
  const isUniform = tables.all.length === 1
  first.columns.forEach((column, at) => {
    for (let index = 0; index < own.length; index += 1) {
      const asked = isUniform ? column : tables.of(index).columns[at]!
      const coded = asked.codeOf(index)
      const code = toCode(coded)
      if (code > own[index]!) own[index] = code
      if (!asked.isCharged(index)) continue
      demands[index]! += 1
      // Where of what is gone more would have been better too, its replacement takes its place one for one.
      if (wouldSeveralDo(coded)) several[index] = 1
    }
  })
  const found: number[] = []
  several.forEach((would, index) => {
    if (would === 1 && own[index] !== codes.fail) found.push(index)
  })
  return found
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

interface Rest {
  readonly count: number
  readonly needs: readonly string[]
}

const nothing: Rest = { count: 0, needs: [] }

/**
 * What a piece makes the rest of the setup ask, and the needs among that: found once per class of pieces that the rest
 * cannot tell apart.
 */
function createRest(bench: Bench, pieces: readonly Piece[], { way }: Table): (index: number, table: Table) => Rest {
  if (bench.scene.others.length === 0 && !bench.gone) return () => nothing
  const { feltThrough } = getRules(bench.kind)
  const all = getKind(bench.kind).attributes.map(({ key }) => key)
  // A piece that was told where to stand takes room from what else stands there.
  const isPlaced = way.place !== undefined
  const felt = feltThrough && isPlaced ? [...new Set([...feltThrough, ...sizeKeys])] : (feltThrough ?? all)
  const classes = classify(pieces, `${bench.kind} felt${isPlaced ? ' in place' : ''}`, felt)
  const known = new Map<string, Rest>()
  return (index, table) => {
    const key = `${classes.ofPiece[index]!} ${table.way.quantity}`
    let rest = known.get(key)
    if (rest === undefined) {
      const found = findRestKnockOns(bench, { piece: pieces[index]!, ...table.way })
      known.set(key, (rest = { count: found.length, needs: found.flatMap(({ need }) => need ?? []) }))
    }
    return rest
  }
}

/** What the pieces' own checks ask for, which what is gone did not, and what they make the rest ask for. */
function countExtras(tables: Tables, restNeedsOf: (index: number) => readonly string[]): (index: number) => number {
  return (index) => {
    const needs = tables
      .of(index)
      .columns.filter((column) => toCode(column.codeOf(index)) === codes.change && column.isCharged(index))
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
