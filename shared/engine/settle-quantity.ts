import type { Bench } from './bench'
import { describeWay, type CandidateOptions } from './candidates'
import { getRules } from './checks/index'
import { codes, Table } from './table'
import type { Piece } from './types'

/** The tables that were needed, and by number which of them each piece is judged by: at first all by the first. */
export class Tables {
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
      const { scene, kind, gone } = this.bench
      number = this.all.push(new Table(scene, getRules(kind), this.pieces, way, gone?.byRule)) - 1
      this.numbers.set(key, number)
    }
    return number
  }

  of(index: number): Table {
    return this.all[this.ofPiece[index]!]!
  }
}

/** By piece: its worst code and what it asks, for as many of it as were settled on. */
export interface Tally {
  readonly own: Int8Array
  readonly demands: Int32Array
}

/** How many demands a piece, judged by a table, makes on the rest of the setup. */
export type CountRest = (index: number, table: Table) => number

function settleOn(tables: Tables, index: number, number: number, { own, demands }: Tally): void {
  tables.ofPiece[index] = number
  const table = tables.all[number]!
  own[index] = table.codeOf(index)
  demands[index] = table.countDemands(index)
}

/** Judges so many of a piece as would do; if that fails elsewhere (no room), one of it without that way out. */
export function settleSeveral(tables: Tables, several: readonly number[], start: number, tally: Tally): void {
  for (const index of several) {
    const enough = tables.of(index).findEnough(index) ?? start
    let number = tables.require(enough, true)
    if (tables.all[number]!.codeOf(index) === codes.fail) number = tables.require(start, false)
    settleOn(tables, index, number, tally)
  }
}

/** Each count takes a table of its own: of many, those that are likeliest to be all it takes. */
const mostTried = 8

/** Verdict, then demands, what the piece asks of the rest included. */
function weigh(code: number, demands: number, rest: number): readonly [number, number] {
  return [rest > 0 ? Math.max(code, codes.change) : code, demands + rest]
}

/** Fewer demands make better only what can be judged and fits: an unknown piece stays as many as there were. */
const isBetter = ([code, demands]: readonly [number, number], than: readonly [number, number]): boolean =>
  code < than[0] || (code === than[0] && code === codes.change && demands < than[1])

/** Fewer of a piece where so many as there were do not simply fit: one strong heater in place of two weak ones. */
export function settleFewer(tables: Tables, start: number, tally: Tally, countRest: CountRest): void {
  const { own, demands } = tally
  const weighNow = (index: number) =>
    weigh(own[index]!, demands[index]!, own[index] === codes.fail ? 0 : countRest(index, tables.of(index)))
  const best = new Map<number, readonly [number, number]>()
  own.forEach((_, index) => {
    const now = weighNow(index)
    if (now[0] > codes.nothing) best.set(index, now)
  })
  for (let quantity = Math.min(start - 1, mostTried); quantity >= 1 && best.size > 0; quantity -= 1) {
    const number = tables.require(quantity, true)
    const table = tables.all[number]!
    for (const [index, found] of best) {
      const code = table.codeOf(index)
      // Where more of it would do, so many are not enough.
      if (code === codes.fail || code > found[0] || table.findEnough(index) !== undefined) continue
      const tried = weigh(code, table.countDemands(index), countRest(index, table))
      if (!isBetter(tried, found)) continue
      best.set(index, tried)
      settleOn(tables, index, number, tally)
    }
  }
  settleFailed(tables, tally)
}

/** What fails in every number that might be enough: one of it, with what more of it would do. */
function settleFailed(tables: Tables, tally: Tally): void {
  const failed = [...tally.own.keys()].filter((index) => tally.own[index] === codes.fail)
  if (failed.length === 0) return
  const single = tables.require(1, true)
  const table = tables.all[single]!
  const better = failed.filter((index) => table.codeOf(index) !== codes.fail)
  for (const index of better) settleOn(tables, index, single, tally)
  const several = better.filter((index) => table.findEnough(index) !== undefined)
  settleSeveral(tables, several, 1, tally)
}
