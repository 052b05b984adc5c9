/** Sizes of gear that was drawn in inches and gallons, rounded as a data sheet rounds them. */

const roundTo = (value: number, step: number): number => Math.round(value / step) * step
const trim = (value: number): number => Number(value.toFixed(3))

export const inch = (value: number): number => trim(roundTo(value * 25.4, 0.1))
export const gal = (value: number): number => trim(roundTo(value * 3.785411784, 0.1))
export const gph = (value: number): number => Math.round(value * 3.785411784)
export const gpd = (value: number): number => Math.round(value * 3.785411784)
export const psi = (value: number): number => Math.round(value * 6.894757293168)
export const lb = (value: number): number => trim(roundTo(value * 0.45359237, 0.01))
export const foot = (value: number): number => trim(roundTo(value * 0.3048, 0.01))
