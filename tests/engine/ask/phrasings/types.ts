import type { Question } from '#shared/engine/ask/types'

/** What a phrasing must be read as. Fields and filters are compared whole: nothing more may be read into it. */
export interface Expected {
  readonly intent?: Question['intent']
  readonly kind: Question['kind']
  readonly fields?: Readonly<Record<string, unknown>>
  readonly filters?: Question['filters']
  readonly ignored?: readonly string[]
}

export type Phrasing = readonly [text: string, system: 'us' | 'metric', expected: Expected]

/** Exact by definition (NIST SP 811, appendix B): inch 25.4 mm, US gallon 231 in³, °F = 9/5 °C + 32. */
export const inches = (value: number): number => value * 25.4
export const gallons = (value: number): number => (value * 231 * 25.4 ** 3) / 1e6
export const fahrenheit = (value: number): number => ((value - 32) * 5) / 9

export const tank = (length: number, width: number, height: number) => ({
  'tank.outerLengthMm': length,
  'tank.outerWidthMm': width,
  'tank.outerHeightMm': height,
})
export const tankIn = (length: number, width: number, height: number) =>
  tank(inches(length), inches(width), inches(height))
export const chamber = (length: number, width: number, waterDepth: number, index = 0) => ({
  [`tank.chambers.${index}.lengthMm`]: length,
  [`tank.chambers.${index}.widthMm`]: width,
  [`tank.chambers.${index}.waterDepthMm`]: waterDepth,
})
export const chamberIn = (length: number, width: number, waterDepth: number, index = 0) =>
  chamber(inches(length), inches(width), inches(waterDepth), index)
export const volume = (litres: number) => ({ 'tank.volumeL': litres })
export const volumeGal = (value: number) => volume(gallons(value))
export const coldest = (celsius: number) => ({ 'room.coldestC': celsius })
export const warmest = (celsius: number) => ({ 'room.warmestC': celsius })
export const usual = (celsius: number) => ({ 'room.temperatureC': celsius })
export const water = (celsius: number) => ({ 'goals.temperatureC': celsius })
