import { writeSetupLink } from '#shared/schemas/setup-link'
import type { UnitSystem } from '#shared/units/systems'
import type { RawSetup } from './edit-raw'

/** The one address of a page about a setup: the setup in its canonical spelling, then what is the page's own. */
export function writeSetupHref(
  path: string,
  raw: RawSetup,
  system: UnitSystem,
  own: Readonly<Record<string, string | undefined>> = {},
): string {
  const said = Object.entries(own).filter((entry): entry is [string, string] => Boolean(entry[1]))
  const query = [writeSetupLink(Object.entries(raw), system), new URLSearchParams(said).toString()].filter(Boolean)
  return query.length === 0 ? path : `${path}?${query.join('&')}`
}
