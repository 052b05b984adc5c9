import { readGroup, readGroups, readText } from '../values'
import type { ChamberInput, Specs } from '../types'

/** Ids by which the water of a tank can be named as a place: its chambers', the display, and its sump. */
export function listChamberIds(specs: Specs): ReadonlySet<string> {
  const hasSump = readText(specs, 'filtration') === 'sump' || readGroup(specs, 'sump') !== undefined
  const chambers = readGroups<ChamberInput>(specs, 'chambers') ?? []
  return new Set([...chambers.map(({ id }) => id), 'display', ...(hasSump ? ['sump'] : [])])
}
