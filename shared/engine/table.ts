import { classifyForRule, type Classes } from './classes'
import { isConcededBy, outcomeOf } from './concession'
import { judge, type Judged } from './judge'
import type { Glance, KindRules, Rule, Way } from './rule'
import type { Scene } from './scene'
import type { Piece } from './types'
import { isCloseJudgement } from './verdict'

/** What one judgement does to the verdict; the worst of a piece's codes is its verdict. */
export const codes = { nothing: 0, change: 1, unknown: 2, fail: 3 } as const

/** Beside the code: several of the piece would do; the rule does not apply to it; for want of a number it may be a change. */
const severalWouldDo = 8
const doesNotApply = 16
const mayBeChange = 32
const notAsked = -1

export const toCode = (coded: number): number => coded & 7
/** A change, or for all that is known one: what is certain to need nothing comes first. */
export const isDemand = (coded: number): boolean => toCode(coded) === codes.change || (coded & mayBeChange) !== 0
export const wouldSeveralDo = (coded: number): boolean => (coded & severalWouldDo) !== 0

const codeOfGlance: Readonly<Record<Exclude<Glance, 'fail'>, number>> = {
  pass: codes.nothing,
  change: codes.change,
  never: codes.fail,
  unknown: codes.unknown,
}

function encode(judged: Judged | null): number {
  if (!judged) return codes.nothing | doesNotApply
  const outcome = outcomeOf(judged)
  if (outcome === 'fail') return codes.fail
  if (outcome === 'nodata') return judged.rule.worst === 'fail' ? codes.unknown : codes.nothing | mayBeChange
  if (outcome === 'change') return codes.change | (judged.judgement.enough === undefined ? 0 : severalWouldDo)
  return codes.nothing
}

/** One rule's answers, each asked for once per class of pieces that it cannot tell apart. */
export class Column {
  readonly classes: Classes
  private readonly coded: Int8Array
  private readonly judged = new Map<number, Judged | null>()
  private readonly conceded = new Map<number, boolean>()
  private readonly close = new Map<number, boolean>()
  private readonly missing = new Map<number, readonly string[]>()
  private readonly hardness = new Map<number, { kept: number; hopeless: number }>()

  constructor(
    readonly rule: Rule,
    private readonly scene: Scene,
    private readonly pieces: readonly Piece[],
    private readonly way: Way,
    /** How what is gone was judged by the rule. */
    private readonly was: Judged | undefined,
  ) {
    this.classes = classifyForRule(pieces, rule)
    this.coded = new Int8Array(this.classes.first.length).fill(notAsked)
  }

  codeOf(index: number): number {
    const id = this.classes.ofPiece[index]!
    const known = this.coded[id]!
    return known === notAsked ? (this.coded[id] = this.ask(index)) : known
  }

  private ask(index: number): number {
    const facts = this.classes.facts[this.classes.ofPiece[index]!]
    const glance = this.rule.glance?.look(this.scene, facts, this.way)
    if (glance && glance !== 'fail') return codeOfGlance[glance]
    // A failure may rest on something assumed, which takes a judgement to tell.
    return glance ? this.askAmong(index, facts) : encode(this.judgementOf(index))
  }

  /** A failure at a glance: told by how harder and easier pieces fared, as far as that goes. */
  private askAmong(index: number, facts: unknown): number {
    const rated = this.rule.glance?.rate?.(facts)
    if (!rated) return encode(this.judgementOf(index))
    const { among, hardness } = rated
    let known = this.hardness.get(among)
    if (!known) this.hardness.set(among, (known = { kept: -Infinity, hopeless: Infinity }))
    if (hardness >= known.hopeless) return codes.fail
    if (hardness <= known.kept) return codes.change
    const coded = encode(this.judgementOf(index))
    if (coded === codes.fail) known.hopeless = hardness
    else if (coded === codes.change) known.kept = hardness
    return coded
  }

  judgementOf(index: number): Judged | null {
    const id = this.classes.ofPiece[index]!
    let judged = this.judged.get(id)
    if (judged === undefined) {
      judged = judge(this.scene, this.rule, { piece: this.pieces[index]!, ...this.way })
      this.judged.set(id, judged)
    }
    return judged
  }

  /** Attributes without which the rule leaves the piece unjudged. */
  missingOf(index: number): readonly string[] {
    if (toCode(this.codeOf(index)) !== codes.unknown) return []
    const id = this.classes.ofPiece[index]!
    let missing = this.missing.get(id)
    if (!missing) {
      // Asked of the rule itself: what the usual values of the missing would give is known by now.
      const judgement = this.rule.judge(this.scene, { piece: this.pieces[index]!, ...this.way })
      this.missing.set(id, (missing = judgement?.missing ?? []))
    }
    return missing
  }

  /** A change, or for all that is known one, that what is gone did not ask for. */
  isCharged(index: number): boolean {
    const coded = this.codeOf(index)
    return isDemand(coded) && !(toCode(coded) === codes.change && this.isConceded(index))
  }

  private isConceded(index: number): boolean {
    if (!this.was || outcomeOf(this.was) !== 'change') return false
    const id = this.classes.ofPiece[index]!
    let isConceded = this.conceded.get(id)
    if (isConceded === undefined) {
      const judged = this.judgementOf(index)
      this.conceded.set(id, (isConceded = judged !== null && isConcededBy(this.was, judged)))
    }
    return isConceded
  }

  isCloseCall(index: number): boolean {
    const id = this.classes.ofPiece[index]!
    let isClose = this.close.get(id)
    if (isClose === undefined) {
      const judged = this.judgementOf(index)
      this.close.set(id, (isClose = judged !== null && isCloseJudgement(judged)))
    }
    return isClose
  }

  /** Bits of the sources of what the rule read, 0 where it does not apply. */
  sourcesOf(index: number): number {
    return this.codeOf(index) & doesNotApply ? 0 : this.classes.sources[this.classes.ofPiece[index]!]!
  }
}

/** The rules of a kind over all pieces, for one way of judging them: so many of each. */
export class Table {
  readonly columns: readonly Column[]

  constructor(
    scene: Scene,
    { rules }: KindRules,
    pieces: readonly Piece[],
    readonly way: Way,
    byRule?: ReadonlyMap<string, Judged>,
  ) {
    this.columns = rules.map((rule) => new Column(rule, scene, pieces, way, byRule?.get(rule.id)))
  }

  judgedOf(index: number): readonly Judged[] {
    return this.columns.flatMap((column) => column.judgementOf(index) ?? [])
  }

  codeOf(index: number): number {
    let worst: number = codes.nothing
    for (const column of this.columns) worst = Math.max(worst, toCode(column.codeOf(index)))
    return worst
  }

  countDemands(index: number): number {
    let count = 0
    for (const column of this.columns) if (column.isCharged(index)) count += 1
    return count
  }

  /** How many of the piece would do, where one does not. */
  findEnough(index: number): number | undefined {
    for (const column of this.columns)
      if (wouldSeveralDo(column.codeOf(index))) return column.judgementOf(index)?.judgement.enough
    return undefined
  }

  countCloseCalls(index: number): number {
    return this.columns.filter((column) => column.isCloseCall(index)).length
  }

  sourcesOf(index: number): number {
    return this.columns.reduce((bits, column) => bits | column.sourcesOf(index), 0)
  }

  /** Missing attributes that leave the piece unjudged. */
  missingOf(index: number): readonly string[] {
    return this.columns.flatMap((column) => column.missingOf(index))
  }
}
