import type { SandScaleDrawing } from '#shared/engine/drawings/sand-scale'
import { printDigits } from '#shared/units/digits'

/** Grain sizes are in millimetres in both unit systems, as on every bag. */
export const printGrain = (mm: number): string => `${printDigits(mm, mm < 1 ? 3 : 2)}\u00a0mm`

/** The text alternative of a grain scale. */
export function describeSandScale({ grains, wantedMm, classes }: SandScaleDrawing): string {
  const wanted = `Between ${printGrain(wantedMm[0])} and ${printGrain(wantedMm[1])} sand stays down and lets waste through.`
  if (grains === null) return `A scale of grain sizes after Wentworth. ${wanted} Nobody has said this sand’s grains.`
  const { minMm, maxMm, middleMm } = grains
  const name = classes.find(({ fromMm, toMm }) => middleMm >= fromMm && middleMm < toMm)?.name
  return `A scale of grain sizes after Wentworth. This sand runs from ${printGrain(minMm)} to ${printGrain(maxMm)}, its middle at ${printGrain(middleMm)}${name ? `: ${name}` : ''}. ${wanted}`
}
