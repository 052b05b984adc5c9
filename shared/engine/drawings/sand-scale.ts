import { grainClasses, middleGrainMm } from '../physics/sand'
import { thresholds } from '../thresholds'

export interface GrainClass {
  readonly name: string
  readonly fromMm: number
  readonly toMm: number
}

/** Sizes of grains on Wentworth's scale, where each class is twice as coarse as the one before. */
export interface SandScaleDrawing {
  readonly classes: readonly GrainClass[]
  readonly fromMm: number
  readonly toMm: number
  /** Finer blows about, coarser traps waste. */
  readonly wantedMm: readonly [number, number]
  /** Of the sand; null where nobody said. */
  readonly grains: { readonly minMm: number; readonly maxMm: number; readonly middleMm: number } | null
}

const finestMm = 0.0625
const coarsestMm = 8

/** The scale, stretched by whole classes where the sand goes beyond it. */
export function drawSandScale(grainMinMm: number | undefined, grainMaxMm: number | undefined): SandScaleDrawing {
  const grains =
    grainMinMm === undefined || grainMaxMm === undefined
      ? null
      : { minMm: grainMinMm, maxMm: grainMaxMm, middleMm: middleGrainMm(grainMinMm, grainMaxMm) }
  const fromMm = Math.min(finestMm, 2 ** Math.floor(Math.log2(grains?.minMm ?? finestMm)))
  const toMm = Math.max(coarsestMm, 2 ** Math.ceil(Math.log2(grains?.maxMm ?? coarsestMm)))
  const classes = grainClasses.map(([below, name], at) => ({
    name,
    fromMm: Math.max(fromMm, grainClasses[at - 1]?.[0] ?? 0),
    toMm: Math.min(toMm, below),
  }))
  return {
    classes: classes.filter((one) => one.toMm > one.fromMm),
    fromMm,
    toMm,
    wantedMm: [thresholds.grainLowMm.value, thresholds.grainHighMm.value],
    grains,
  }
}
