import type { GearRef, Goals, Item, Mains, Room, Setup, Source, Water } from '../types'

export interface Chamber {
  readonly id: string
  readonly name: string
  /** Along the tank. */
  readonly lengthMm: number
  /** Front to back. */
  readonly widthMm: number
  readonly waterDepthMm: number
  readonly heightMm: number
  readonly openingLengthMm?: number
  readonly openingWidthMm?: number
}

/** One open box of water that loses heat and weighs: the tank itself, or its sump. */
export interface WaterTub {
  readonly insideLengthMm: number
  readonly insideWidthMm: number
  readonly waterDepthMm: number
  readonly wallMm: number
  readonly bottomMm: number
  readonly material: 'glass' | 'acrylic'
}

/** The tank with nothing left unsaid. Lengths in mm, volumes in litres. */
export interface TankPlan {
  readonly gear?: GearRef
  /** Of the dimensions as given. */
  readonly source: Source
  readonly plusMinus?: number
  readonly outerLengthMm: number
  readonly outerWidthMm: number
  readonly outerHeightMm: number
  readonly wallMm: number
  readonly bottomMm: number
  readonly material: 'glass' | 'acrylic'
  readonly rim: 'rimless' | 'rimmed' | 'braced'
  readonly lid: 'none' | 'mesh' | 'solid'
  readonly shape: string
  readonly filtration: 'rear-chambers' | 'sump' | 'hang-on' | 'none'
  readonly insideLengthMm: number
  readonly insideWidthMm: number
  readonly insideHeightMm: number
  readonly waterLineMm: number
  readonly displayLengthMm: number
  readonly displayWidthMm: number
  readonly chambers: readonly Chamber[]
  readonly boxes: readonly WaterTub[]
  /** Inside length × inside width × water line, with the sump. */
  readonly grossL: number
  /** Nominal where stated, else gross: what makers' ratings speak of. */
  readonly ratedL: number
  /** Net of rock and sand where the person gave both, else gross: what is heated, turned over and salted. */
  readonly waterL: number
  readonly includedPump?: IncludedPump
  readonly returnBoreMm?: number
  readonly dryMassKg?: number
}

export interface IncludedPump {
  readonly flowLph?: number
  readonly maxHeadM?: number
  readonly powerW?: number
  readonly plugs?: number
  readonly boreMm?: number
}

/** A setup with every default filled in, as the checks read it. */
export interface Plan {
  readonly setup: Setup
  readonly tank: TankPlan
  readonly room: Room
  readonly mains: Mains
  readonly water: Water
  readonly goals: Goals
  /** Items that count: everything but what is gone. */
  readonly items: readonly Item[]
  /** Dotted paths of the defaults used, in the order in which they were needed, with their values. */
  readonly assumed: ReadonlyMap<string, number | string | boolean | readonly string[] | readonly number[]>
}
