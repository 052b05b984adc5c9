/** Decimals kept below a magnitude, largest last; above the last, none. Chosen for reading on a tape, scale or meter. */
type Steps = readonly (readonly [below: number, decimals: number])[]

const tenths: Steps = [[Infinity, 1]]
const tenthsBelowTen: Steps = [[10, 1]]
const tenthsBelowHundred: Steps = [[100, 1]]
const tenthsBelowTwenty: Steps = [[20, 1]]
const whole: Steps = []

const stepsOf: Readonly<Record<string, Steps>> = {
  in: tenthsBelowHundred,
  ft: tenthsBelowHundred,
  mm: tenthsBelowTen,
  m: [
    [10, 2],
    [100, 1],
  ],
  gal: tenthsBelowTwenty,
  L: tenthsBelowHundred,
  lb: tenthsBelowTwenty,
  kg: tenthsBelowHundred,
  'kg/L': [[Infinity, 2]],
  'lb/gal': tenthsBelowHundred,
  '°F': whole,
  '°C': tenths,
  ppt: tenths,
  dKH: tenths,
  A: tenthsBelowHundred,
}

/** Their zero is a mark on a scale, not nothing: digits do not grow near it. */
const isScale = (symbol: string): boolean => symbol === '°F' || symbol === '°C'

/** Two significant digits below one, else what the unit's steps give. */
export const countDecimals = (value: number, symbol: string): number => {
  const size = Math.abs(value)
  if (size > 0 && size < 1 && !isScale(symbol)) return Math.min(2 - 1 - Math.floor(Math.log10(size)), 8)
  const steps = stepsOf[symbol] ?? tenthsBelowTen
  return steps.find(([below]) => size < below)?.[1] ?? 0
}

/** A tie such as 3.175 may be stored a hair under itself; it rounds away from zero all the same. */
const tieUp = 1 + 4 * Number.EPSILON

/** Trailing zeros trimmed, a true minus sign, and never "-0". What is not finite prints as an en dash. */
export const printDigits = (value: number, decimals: number): string => {
  if (!Number.isFinite(value)) return '–'
  const fixed = (value * tieUp).toFixed(Math.min(Math.max(decimals, 0), 12))
  const trimmed = fixed.includes('.') ? fixed.replace(/\.?0+$/, '') : fixed
  return trimmed === '-0' ? '0' : trimmed.replace('-', '\u2212')
}
