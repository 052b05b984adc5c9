import { thresholds } from '../thresholds'

export interface RodValues {
  readonly lengthMm: number
  readonly diameterMm: number
  readonly minImmersionMm?: number
  readonly orientation?: 'vertical' | 'horizontal' | 'any'
  readonly chamber: {
    readonly lengthMm: number
    readonly widthMm: number
    readonly waterDepthMm: number
    readonly heightMm?: number
    readonly openingLengthMm?: number
    readonly openingWidthMm?: number
  }
  readonly clearanceMm?: number
}

/** Water to leave around a rod where nobody said: what the checks ask for. */
export const usualClearanceMm = thresholds.rodClearanceMm.value
