import { readSetupLink, writeSetupLink, type LinkProblem } from '#shared/schemas/setup-link'
import type { SetupRequest } from '#shared/schemas/setup'
import type { UnitSystem } from '#shared/units/systems'
import { listSetupEntries, type RawSetup } from './edit-raw'

export interface SetupVisit {
  readonly raw: RawSetup
  /** What could be read. */
  readonly setup: SetupRequest
  /** What could not, with the text kept. */
  readonly problems: readonly LinkProblem[]
  /** Whether the setup's part of the address is already as it is written. */
  readonly isCanonical: boolean
}

const spell = (entries: Iterable<readonly [string, string]>): string =>
  Array.from(entries, ([key, text]) => `${key}=${text}`).join('&')

/** The setup of an address. Never throws: whatever it holds, there is something to show. */
export function readSetupVisit(params: URLSearchParams, system: UnitSystem): SetupVisit {
  const entries = listSetupEntries(params)
  const canonical = new URLSearchParams(writeSetupLink(entries, system))
  const { setup, raw, problems } = readSetupLink(canonical, system)
  return { raw, setup, problems, isCanonical: spell(entries) === spell(canonical) }
}
