import type { KindKey } from '../kinds/index'
import type { UcumCode } from '../units/units'
import type { UnitSystem } from '../units/systems'

/** Where a number comes from; each has its own default uncertainty (see `physics/conformance.ts`). */
export type Source = 'measured' | 'maker' | 'estimate'

/** A value as the engine reads it, in the canonical unit that its key names. `plusMinus` is in the same unit. */
export interface Value<T = unknown> {
  readonly value: T
  readonly source: Source
  readonly plusMinus?: number
}

/** Specs by attribute key. A key that is absent is unknown: never zero, false or empty. */
export type Specs = Readonly<Record<string, Value | undefined>>

export interface GearRef {
  readonly slug: string
  readonly brand: string
  readonly model: string
}

/** One catalogue entry, or specs that somebody typed, as the engine reads it. */
export interface Piece {
  readonly kind: KindKey
  readonly specs: Specs
  readonly gear?: GearRef
}

export type ItemState = 'have' | 'planned' | 'gone'
export type Place = { readonly chamber: string } | { readonly in: 'display' | 'cabinet' | 'hang-on' | 'outside' }

export interface Item {
  readonly id: string
  readonly piece: Piece
  readonly quantity: number
  readonly state: ItemState
  readonly place?: Place
  /** Lens of a light to the water surface. */
  readonly mountHeightMm?: number
}

export interface ChamberInput {
  readonly id: string
  readonly name?: string
  readonly lengthMm?: number
  readonly widthMm?: number
  readonly waterDepthMm?: number
  readonly heightMm?: number
  readonly openingLengthMm?: number
  readonly openingWidthMm?: number
}

/** What somebody says of their tank: specs by key (see kinds/tank.ts); or a volume alone. */
export interface TankInput {
  readonly specs: Specs
  readonly gear?: GearRef
  readonly volumeL?: number
}

/** A setup as given: every part optional, every number canonical. What is missing is assumed by `resolve`. */
export interface Setup {
  readonly name?: string
  readonly units: UnitSystem
  /** ISO 3166-1 alpha-2, for mains defaults. */
  readonly country?: string
  readonly tank: TankInput
  readonly support?: { readonly kind: 'stand' | 'furniture'; readonly lengthMm?: number; readonly widthMm?: number }
  readonly room?: Partial<Room>
  readonly mains?: Partial<Mains>
  readonly water?: Partial<Water>
  readonly goals?: Partial<Goals>
  readonly items: readonly Item[]
}

export interface Room {
  readonly temperatureC: number
  readonly coldestC: number
  readonly warmestC: number
  /** 0 to 1 */
  readonly relativeHumidity: number
  readonly ceilingMm: number
  /** Floor to the top edge of the tank. */
  readonly tankTopMm: number
}

export interface Mains {
  readonly volts: 100 | 120 | 230
  readonly circuitA: number
  readonly plugType: string
  /** Free wall outlets. */
  readonly outlets: number
  readonly residualCurrentProtected: boolean
}

export interface Water {
  readonly feedKPa: number
  readonly feedTempC: number
  readonly feedTdsPpm: number
  readonly litresPerWeek: number
}

export type Coral = 'soft' | 'lps' | 'sps'

export interface Goals {
  readonly temperatureC: number
  readonly salinityPpt: number
  /** Empty: fish only. */
  readonly coral: readonly Coral[]
  readonly sandDepthMm: number
  readonly rockKg: number
  readonly turnoverPerHour: readonly [number, number]
  readonly appControl: boolean
  readonly switchedOutlets: number
}

export type Outcome = 'pass' | 'change' | 'fail' | 'nodata'
export type Verdict = 'fits' | 'changes' | 'no' | 'unknown'

/** P, S and C of the rules: computed from physics, a named standard or code, or common practice without a published source. */
export interface Basis {
  readonly type: 'physics' | 'standard' | 'practice'
  readonly source: string
}

/** A default that stood in for something the person did not say. */
export interface Assumption {
  /** Dotted setup path, such as `room.coldestC`. */
  readonly key: string
  readonly value: number | string | boolean | readonly string[] | readonly number[]
  readonly message: string
}

/** One check's answer as the API gives it. */
export interface Check {
  /** `<kind>.<check>`; never changes. */
  readonly id: string
  readonly label: string
  readonly outcome: Outcome
  readonly measured: number | string | readonly string[] | null
  readonly limit: number | readonly [number, number] | null
  readonly unit: UcumCode | null
  /** Signed, positive = to spare: distance to the limit over |limit|, or to the nearer end of an interval over its width. */
  readonly margin: number | null
  readonly message: string
  readonly basis: Basis
  /** Attribute keys of the piece without which the check cannot be done. */
  readonly missing?: readonly string[]
  /** Setup paths whose defaults this outcome rests on. */
  readonly assumed?: readonly string[]
  /** Probability that the limit is kept, from the sources' ± (JCGM 106). */
  readonly probability?: number
  /** Where it could as well go the other way (5 to 95 %): what to do first, as in "measure the rear chamber". */
  readonly closeCall?: string
}

export interface KnockOn {
  readonly kind: 'need' | 'check' | 'budget' | 'freed' | 'missing'
  /** An item's id, or the key of a need, check or budget. */
  readonly subject: string
  readonly from: Outcome | number | null
  readonly to: Outcome | number | null
  readonly message: string
}

export interface Confidence {
  readonly level: Source | 'mixed'
  readonly closeCalls: number
}

/** Where a rod or body ended up, for the answer and its drawing. */
export interface Placement {
  /** A chamber's id, or `display`. */
  readonly chamber: string
  readonly position: 'upright' | 'leaning' | 'flat'
  /** Of the rod above the floor. */
  readonly angleDeg: number
}

/** The smallest change to one number of the setup that would turn a verdict. */
export interface Turn {
  /** Dotted path as in links: `tank.chambers.0.lengthMm`, `items.stand.specs.loadRatingKg`. */
  readonly path: string
  readonly from: number
  readonly to: number
  readonly unit: UcumCode
  /** What the piece would then do. */
  readonly verdict: 'fits' | 'changes'
  /** "It would fit if the rear chamber were 12 mm longer." */
  readonly message: string
}

export interface Answer {
  readonly gear: GearRef | null
  readonly kind: KindKey
  readonly specs: Specs
  readonly pieces: readonly { readonly gear: GearRef | null; readonly quantity: number }[]
  readonly verdict: Verdict
  /** The answer in one sentence. */
  readonly summary: string
  readonly checks: readonly Check[]
  readonly knockOns: readonly KnockOn[]
  readonly cautions: readonly string[]
  readonly confidence: Confidence
  readonly place?: Placement
  readonly turnsBy?: Turn
}

export interface Need {
  readonly need: string
  readonly amount: number | null
  readonly unit: UcumCode | null
  readonly neededBy: readonly string[]
  readonly metBy: readonly string[]
  readonly message: string
}

export interface Budget {
  readonly used: number
  readonly limit: number | null
  readonly unit: UcumCode
  readonly message: string
}

export interface ItemReport {
  readonly id: string
  readonly kind: KindKey
  readonly gear: GearRef | null
  readonly specs: Specs
  readonly quantity: number
  readonly verdict: Verdict
  readonly checks: readonly Check[]
  readonly cautions: readonly string[]
  readonly place?: Placement
}

export interface Report {
  readonly verdict: Verdict
  readonly items: readonly ItemReport[]
  readonly missing: readonly { readonly need: string; readonly message: string }[]
  readonly needs: readonly Need[]
  readonly budgets: Readonly<Record<string, Budget>>
  readonly cautions: readonly string[]
  readonly assumptions: readonly Assumption[]
}

/** A stretch of a shared scale and what a value standing there means. */
export interface Zone {
  readonly from: number
  readonly to: number
  readonly outcome: Outcome
}

/** One deciding check as a tick scale on which every candidate stands. */
export interface Scale {
  /** The attribute whose values are marked. */
  readonly key: string
  readonly check: string
  readonly label: string
  readonly unit: string
  /** "limit 12 in, the depth of the chamber" */
  readonly limitText: string
  readonly limits: readonly number[]
  readonly zones: readonly Zone[]
}

/** A candidate on the scales: its verdict and its value per scale key (null: unknown). */
export interface Mark extends GearRef {
  readonly verdict: Verdict
  readonly values: Readonly<Record<string, number | null>>
}

export interface FitOptions {
  readonly limit: number
  /** Answers to skip. */
  readonly offset: number
  /**
   * Only answers with this verdict; `check`: only those that fail it, or lack data for it; `missing`: only those that
   * cannot be judged for lack of this attribute.
   */
  readonly verdict?: Verdict
  readonly check?: string
  readonly missing?: string
  /** Also return the scales and a mark per candidate (at most `limits.marks`). */
  readonly scales?: boolean
}

export interface FitResult {
  readonly answers: readonly Answer[]
  readonly counts: { readonly fits: number; readonly changes: number; readonly no: number; readonly unknown: number }
  /** Candidates that do not fit, by each check that failed; `label` as in "14 too long or too thick for the chamber". */
  readonly failedBy: readonly { readonly check: string; readonly count: number; readonly label: string }[]
  /** Candidates that cannot be judged, by the attribute that is missing. */
  readonly missingBy: readonly { readonly key: string; readonly count: number; readonly label: string }[]
  readonly assumptions: readonly Assumption[]
  /** Matching `verdict`, `check` and `missing`, over all pages. */
  readonly total: number
  readonly scales?: readonly Scale[]
  readonly marks?: readonly Mark[]
}

/** A part of a setup that contradicts another part or itself. */
export interface Contradiction {
  /** Dotted path into the setup, such as `tank.wallMm` or `tank.chambers.0.lengthMm`. */
  readonly path: string
  readonly detail: string
}
