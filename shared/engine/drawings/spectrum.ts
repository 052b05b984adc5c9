import { findBlueShare } from '../checks/light'
import { thresholds } from '../thresholds'
import type { Piece } from '../types'
import { readGroups } from '../values'

export interface Band {
  readonly fromNm: number
  readonly toNm: number
  /** Of all photons, 0 to 1. */
  readonly share: number
}

export interface SpectrumDrawing {
  /** By wavelength. */
  readonly bands: readonly Band[]
  /** Of the photons, those between 400 and 500 nm, and how many of them a tank of corals wants. */
  readonly blueShare: number
  readonly wantedBlueShare: number
}

/** A light's spectrum; null where nobody recorded one. */
export function drawSpectrum({ specs }: Piece): SpectrumDrawing | null {
  const bands = readGroups<Band>(specs, 'bands')
  if (!bands || bands.length === 0) return null
  return {
    bands: bands.toSorted((a, b) => a.fromNm - b.fromNm || a.toNm - b.toNm),
    blueShare: findBlueShare(bands),
    wantedBlueShare: thresholds.blueShare.value,
  }
}
