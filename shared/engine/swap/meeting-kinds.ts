import type { KindKey } from '../../kinds/index'
import { findCheapestCover } from '../cover'

/**
 * Kinds of which a piece can meet a need, by the need's name: what rules ask for and what a setup cannot do without.
 * Whether one does is asked of the rules again with the piece in the setup.
 */
const meeting: Readonly<Record<string, readonly KindKey[]>> = {
  'temperature-control': ['temperature-controller'],
  'second-cut-off': ['temperature-controller'],
  'feed-pressure': ['booster-pump'],
  'light-mount': ['light-mount'],
  'light-control': ['light-controller'],
  'return-pump': ['return-pump'],
  'base-rock': ['rock'],
  outlets: ['power-strip'],
  'cycle-tests': ['test-kit'],
  heat: ['heater'],
  'salinity-reading': ['salinity-meter'],
  salt: ['salt-mix'],
  'pure-water': ['ro-unit'],
  circulation: ['wavemaker', 'return-pump'],
  'glass-cleaning': ['scraper'],
  light: ['light'],
}

export const listMeetingKinds = (need: string): readonly KindKey[] => meeting[need] ?? []

/** Kinds whose pieces are in a setup because something else needs them. */
export const isHelperKind = (kind: KindKey): boolean => helpers.has(kind)

const helpers: ReadonlySet<KindKey> = new Set<KindKey>([
  'temperature-controller',
  'booster-pump',
  'light-mount',
  'light-controller',
  'power-strip',
])

/**
 * The fewest pieces that can meet some needs, by kind alone: one temperature controller both switches a heater and cuts
 * it off. What no kind in the catalogue meets (an adaptor for a plug) has to be got as well and counts one each.
 */
export function countExtraPieces(needs: ReadonlySet<string>): number {
  if (needs.size === 0) return 0
  const all = [...needs]
  const inCatalogue = all.filter((need) => listMeetingKinds(need).length > 0)
  const kinds = [...new Set(inCatalogue.flatMap(listMeetingKinds))]
  const sets = kinds.map((kind) => inCatalogue.filter((need) => listMeetingKinds(need).includes(kind)))
  return all.length - inCatalogue.length + (findCheapestCover(inCatalogue, sets)?.length ?? 0)
}
