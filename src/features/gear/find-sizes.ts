import type { PieceSizes } from './components/piece-drawing'

type BareSpecs = Readonly<Record<string, unknown>>

const read = (specs: BareSpecs, key: string): number | undefined => {
  const value = specs[key]
  return typeof value === 'number' && value > 0 ? value : undefined
}

/** What of a piece can be drawn to scale: a rod by length and thickness, a body by its sides; undefined for neither. */
export function findSizes(specs: BareSpecs): PieceSizes | undefined {
  const lengthMm = read(specs, 'lengthMm') ?? read(specs, 'topLengthMm')
  const diameterMm = read(specs, 'diameterMm')
  if (lengthMm === undefined) return undefined
  if (diameterMm !== undefined) return { lengthMm, heightMm: diameterMm, isRod: true }
  const heightMm = read(specs, 'heightMm')
  const widthMm = read(specs, 'widthMm') ?? read(specs, 'topWidthMm')
  if (heightMm === undefined) return undefined
  return { lengthMm, heightMm, isRod: false, ...(widthMm !== undefined && { widthMm }) }
}
