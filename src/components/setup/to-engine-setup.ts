import type { GearRef, Item, Setup, Specs } from '#shared/engine/types'
import type { SetupParsed, SetupRequest } from '#shared/schemas/setup'

export interface TankEntry extends GearRef {
  readonly specs: Readonly<Record<string, unknown>>
}

const isSourced = (value: unknown): value is Specs[string] =>
  typeof value === 'object' && value !== null && 'value' in value

/** The setup as the engine takes it, for drawing: the person's own numbers count as measured. */
export function toEngineSetup(request: SetupRequest, entry?: TankEntry, items: readonly Item[] = []): Setup {
  // What a link holds was held to the very schema that parses it.
  const parsed = request as SetupParsed
  const { gear: _slug, volumeL, ...own } = parsed.tank
  const specs: Record<string, Specs[string]> = {}
  for (const [key, value] of Object.entries({ ...entry?.specs, ...own })) {
    specs[key] = isSourced(value) ? value : { value, source: 'measured' }
  }
  const { country, room, mains, water, goals, units } = parsed
  return {
    units,
    tank: { specs, ...(volumeL !== undefined && { volumeL }), ...(entry && { gear: entry }) },
    ...(country !== undefined && { country }),
    ...(room && { room }),
    ...(mains && { mains }),
    ...(water && { water }),
    ...(goals && { goals }),
    items,
  }
}
