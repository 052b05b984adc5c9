import { findContradictions } from '#shared/engine/setup/contradictions'
import type { Setup } from '#shared/engine/types'
import type { SetupParsed } from '#shared/schemas/setup'
import { createInvalidError, type Issue } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import type { Snapshot } from '../catalogue/build-snapshot'
import { expandSetup } from './expand-setup'

/**
 * The setup as the engine reads it. Throws AppError `invalid`, which names every unknown slug and every contradiction
 * together with what else `findOthers` finds wrong with the request.
 */
export function readSetup(
  snapshot: Snapshot,
  parsed: SetupParsed,
  findOthers: (setup: Setup) => readonly Issue[] = () => [],
): Setup {
  const { expanded, issues } = expandSetup(snapshot, parsed)
  const contradictions = issues.length > 0 ? [] : findContradictions(expanded)
  const found = contradictions.map(({ path, detail }) => ({
    pointer: toPointer(['setup', ...path.split('.')]),
    detail,
  }))
  const all = [...issues, ...found, ...findOthers(expanded)]
  if (all.length > 0) throw createInvalidError(all)
  return expanded
}
