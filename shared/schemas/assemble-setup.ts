import type { Question } from '../engine/ask/types'
import type { UnitSystem } from '../units/systems'
import type { SetupRequest } from './setup'
import { readSetupLink } from './setup-link'

/** The partial setup that a question's fields describe, nested as requests are: the one that a link of them would hold. */
export function assembleSetup(fields: Question['fields'], system: UnitSystem): SetupRequest {
  return readSetupLink(
    Object.entries(fields).map(([path, { text }]) => [path, text] as const),
    system,
  ).setup
}
