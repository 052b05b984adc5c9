import type { Coral, Piece, Specs } from '../types'

/** What the sheet asks of a light, by the keys of its kind. */
export const lightKeys = [
  'layout',
  'lengthMm',
  'widthMm',
  'ppfdUmol',
  'ppfdAtMm',
  'photonFluxUmolS',
  'beamAngleDeg',
  'dimmable',
]

export interface LightValues {
  readonly light: Readonly<Record<string, unknown>>
  readonly quantity?: number
  readonly mountHeightMm?: number
  readonly depthMm?: number
  readonly coral?: readonly Coral[]
}

/** The light as the checks read it. One that nobody said cannot be dimmed is taken to dim. */
export function toLight({ light }: LightValues): Piece {
  const specs: Record<string, Specs[string]> = { dimmable: { value: true, source: 'estimate' } }
  for (const [key, value] of Object.entries(light)) specs[key] = { value, source: 'measured' }
  return { kind: 'light', specs }
}
