import type { FieldAttribute } from '../../kinds/types'
import type { Printer } from '../../units/print'
import type { Assumption, Basis, Contradiction, Setup } from '../types'
import type { StepUnit } from './quantities'

/** One thing that a worksheet asks for. Sections of a setup are asked for by the setup's own fields. */
export interface WorksheetField {
  /** Dotted path into the inputs; `*` stands for one place of a list: `flowCurve.*.headM`. */
  readonly path: string
  readonly attribute: FieldAttribute
  readonly isRequired?: true
  /** The setup says the same there. */
  readonly setupPath?: string
}

/** A list among the inputs, at `path`. */
export interface WorksheetList {
  readonly path: string
  /** Of one entry: "point". */
  readonly label: string
  readonly least: number
  readonly most: number
}

export type SetupSection = 'tank' | 'room' | 'goals'

/** One number or word that comes out. `unit` null: a word, or more than a number. */
export interface ResultField {
  readonly key: string
  readonly label: string
  readonly unit: StepUnit | null
  readonly decimals?: number
  /** In words where there is none. */
  readonly none?: string
}

/** One line of the working: what is computed, its formula, and the formula with the numbers put in, in SI units. */
export interface Step {
  readonly title: string
  readonly formula: string
  readonly text: string
  readonly value: number | null
  readonly unit: StepUnit
  readonly decimals?: number
  readonly source?: string
}

export interface Working {
  readonly ok: true
  readonly result: Readonly<Record<string, unknown>>
  readonly steps: readonly Step[]
  readonly cautions: readonly string[]
  /** Defaults that stood in for what was not said. */
  readonly assumptions: readonly Assumption[]
}

/** Inputs that contradict each other or cannot be computed, each by its path. */
export interface Refused {
  readonly ok: false
  readonly problems: readonly Contradiction[]
}

/** A calculation on its own page: its inputs as data, and the pure function from them to a result with its working. */
export interface Worksheet {
  readonly name: string
  readonly title: string
  /** What it answers, in a sentence or two. */
  readonly intro: string
  /** Parts of a setup that are inputs, and the setup paths that its form asks for. */
  readonly setup?: { readonly sections: readonly SetupSection[]; readonly asks: readonly string[] }
  readonly fields: readonly WorksheetField[]
  readonly lists?: readonly WorksheetList[]
  readonly results: readonly ResultField[]
  readonly basis: Basis
  /** Inputs that work, as they would be sent. */
  readonly example: Readonly<Record<string, unknown>>
  /**
   * `values` are the inputs beside those of the setup, held to their fields beforehand. Words are in the reader's units;
   * formulas are in SI. A setup is there where `setup` says so.
   */
  work(values: object, setup: Setup, words: Printer): Working | Refused
}

/** What a worksheet without a setup is handed. */
export const noSetup: Setup = { units: 'metric', tank: { specs: {} }, items: [] }
