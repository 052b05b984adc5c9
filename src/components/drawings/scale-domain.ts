import type { Zone } from '#shared/engine/types'

export type Domain = readonly [number, number]

/** The stretch that shows every value and limit with a little air at both ends. */
export function fitDomain(values: readonly number[], padding = 0.05): Domain {
  const finite = values.filter(Number.isFinite)
  if (finite.length === 0) return [0, 1]
  const low = Math.min(...finite)
  const high = Math.max(...finite)
  const air = (high - low || Math.abs(high) || 1) * padding
  // Lengths, powers and the like do not go below zero, so neither does the air.
  return [low >= 0 ? Math.max(0, low - air) : low - air, high + air]
}

/** Where a value stands, 0 to 100; past an end it stands on that end. */
export function placePercent(value: number, [low, high]: Domain): number {
  return Math.min(100, Math.max(0, ((value - low) / (high - low)) * 100))
}

export function percent(share: number): string {
  return `${Number(share.toFixed(3))}%`
}

/** A zone's part of the domain as a box in percent; none where it lies outside. */
export function placeZone(zone: Zone, domain: Domain): { readonly x: string; readonly width: string } | undefined {
  const from = placePercent(zone.from, domain)
  const to = placePercent(zone.to, domain)
  return to > from ? { x: percent(from), width: percent(to - from) } : undefined
}
