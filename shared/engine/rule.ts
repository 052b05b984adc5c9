import type { Printer } from '../units/print'
import type { CanonicalUnit } from '../units/units'
import type { Basis, Outcome, Piece, Place, Placement, Scale, Specs } from './types'
import type { Scene } from './scene'

/** A sentence, made only where somebody reads it, in the reader's units. */
export type Say = (words: Printer) => string

/** Something a piece asks of the rest of the setup; `needs.ts` says which kinds meet it. */
export interface Ask {
  readonly need: string
  readonly amount: number | null
  readonly unit: CanonicalUnit | null
  /** What exactly is lacking, where the need can be about different things: the stages, the parameters. */
  readonly lacks?: readonly string[]
}

/** What a rule finds before anybody asks for words. Numbers are in the rule's unit. */
export interface Judgement {
  readonly outcome: Outcome
  readonly measured?: number | string | readonly string[] | null
  readonly limit?: number | readonly [number, number] | null
  /** Beyond the limit and up to this it is a change rather than a failure. */
  readonly changeLimit?: number | readonly [number, number]
  /** Signed distance to the limit in the rule's unit, positive = to spare; by default taken from measured and limit. */
  readonly margin?: number | null
  readonly say: Say
  /** Probability that the limit is kept; asked for only where somebody reads it. */
  readonly probability?: () => number
  /** What to measure or check first where that is a close call: "measure the rear chamber". */
  readonly settle?: () => string | undefined
  readonly missing?: readonly string[]
  readonly asks?: Ask
  readonly placement?: Placement
  /** Setup paths that this finding rests on, where they are fewer than the rule's `uses`. */
  readonly rests?: () => readonly string[]
  /** So many of this piece would do where one does not. */
  readonly enough?: number
  /** Things worth knowing that change no verdict; one that says nothing is left out. */
  readonly cautions?: readonly Say[]
}

/** The piece being judged, how many of it, and where it would go. */
export interface Candidate {
  readonly piece: Piece
  readonly quantity: number
  readonly place?: Place
  readonly mountHeightMm?: number
  /** How many were asked about, where more are judged because one does not do. */
  readonly asked?: number
  /** False: do not answer "two of these" again; it was tried and found wanting. */
  readonly mayMultiply?: boolean
}

/** How a piece is judged, the piece itself left out. */
export type Way = Omit<Candidate, 'piece'>

/** Whether more of the piece are judged than were asked about. */
export const isMultiplied = ({ quantity, asked = quantity }: Way): boolean => quantity > asked

/** "Two of these" */
export const countOfThese = (quantity: number): string =>
  `${['One', 'Two', 'Three', 'Four'][quantity - 1] ?? quantity} of these`

/**
 * `pass`: also where a size is missing that makes no difference. `never`: fails, and would whatever else had been said
 * instead of what was assumed. `unknown`: no data, and usual values of what is missing would not all give one outcome.
 */
export type Glance = 'pass' | 'change' | 'fail' | 'never' | 'unknown'

/**
 * The outcome of `judge` without its reasons, where that can be told with next to no work: thousands of pieces are only
 * counted, and need no more. What it goes by is read from the specs once per catalogue.
 */
export interface Glancer {
  readonly read: (specs: Specs) => unknown
  /**
   * How hard the rule is on a piece whose glance fails, among pieces that it asks the same of: where one would still
   * fail whatever else had been said, so would every harder one; where one would not, nor would an easier one.
   */
  readonly rate?: (facts: unknown) => { readonly among: number; readonly hardness: number }
  /** Undefined where it takes `judge` to tell. `facts` is what `read` made of the specs. */
  readonly look: (scene: Scene, facts: unknown, way: Way) => Glance | undefined
}

export const glanceBy = <Facts>(
  read: (specs: Specs) => Facts,
  look: (scene: Scene, facts: Facts, way: Way) => Glance | undefined,
  rate?: (facts: Facts) => { readonly among: number; readonly hardness: number },
): Glancer => ({
  read,
  look: (scene, facts, way) => look(scene, facts as Facts, way),
  ...(rate && { rate: (facts: unknown) => rate(facts as Facts) }),
})

/** One line of the rule table: data for the method page and the API, and the function that judges. */
export interface Rule {
  /** `<kind>.<check>` */
  readonly id: string
  readonly label: string
  readonly worst: 'change' | 'fail'
  readonly basis: Basis
  readonly unit: CanonicalUnit | null
  /** A single limit is the most that `measured` may be, unless it is said to be the least. */
  readonly limitIs?: 'least'
  /** The rule in a sentence or two, for the method page. */
  readonly rule: string
  /** Attribute keys of the piece that it reads. */
  readonly reads: readonly string[]
  /** It also asks which piece this is (a stand made for this very tank), so that equal specs may differ. */
  readonly readsGear?: true
  /** Setup paths that it rests on, the most telling first. */
  readonly uses: readonly string[]
  /** As in "14 too long or too thick for the chamber". */
  readonly failLabel: string
  readonly glance?: Glancer
  /** It takes a model of the whole tank, too much to ask for every usual value of what is missing. */
  readonly isModelled?: true
  /** The candidate as it is asked about in other setups: without looking for what else might do there. */
  readonly asPlain?: (candidate: Candidate) => Candidate
  /** Null: does not apply to this piece in this setup. */
  readonly judge: (scene: Scene, candidate: Candidate) => Judgement | null
}

/** The rules of one kind, and what else is particular to it. */
export interface KindRules {
  readonly rules: readonly Rule[]
  /** Distance from the kind's target, smaller first; see the order of answers. */
  readonly target?: (scene: Scene, candidate: Candidate) => number | null
  readonly targetReads?: readonly string[]
  /** The attributes through which a piece can matter to other pieces' checks and to the setup's needs; by default all. */
  readonly feltThrough?: readonly string[]
  /**
   * For kinds of which several pieces together can do what none does alone: the set attribute in which they add up, and
   * what of it the setup wants.
   */
  readonly joint?: { readonly key: string; readonly findWanted: (scene: Scene) => readonly string[] }
  /** The whole answer in a sentence, where the checks in `covers` pass. */
  readonly summary?: {
    readonly covers: readonly string[]
    readonly write: (scene: Scene, candidate: Candidate, placement: Placement | undefined) => Say
  }
  readonly scales?: (scene: Scene, words: Printer) => readonly Scale[]
}

/** A judgement that cannot be made for lack of the piece's own numbers. */
export const lacking = (missing: readonly string[], say: Say): Judgement => ({ outcome: 'nodata', missing, say })
