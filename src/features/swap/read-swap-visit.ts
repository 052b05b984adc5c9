import type { ReplacementsRequest } from '#shared/schemas/replacements'
import type { UnitSystem } from '#shared/units/systems'
import { hasTankSize } from '../../components/setup/has-tank-size'
import { readSetupVisit, type SetupVisit } from '../../components/setup/read-setup-visit'
import { writeSetupHref } from '../../components/setup/setup-href'
import { paths } from '../../config/paths'

/** As many as are drawn beside what is gone. */
const candidates = 3
const longestCursor = 400

export interface SwapVisit {
  readonly visit: SetupVisit
  readonly itemId: string
  readonly request: ReplacementsRequest
  readonly cursor: string | null
  /** Set where the address should be another one: spelt otherwise, or a setup that cannot be judged yet. */
  readonly redirect?: string
}

/** Reads an address of the swap page. Never throws. */
export function readSwapVisit(params: URLSearchParams, itemId: string, system: UnitSystem): SwapVisit {
  const visit = readSetupVisit(params, system)
  const given = params.get('cursor')
  const cursor = given !== null && given !== '' && given.length <= longestCursor ? given : null
  const request: ReplacementsRequest = {
    setup: visit.setup,
    itemId,
    limit: candidates,
    ...(cursor !== null && { cursor }),
  }
  const state = { visit, itemId, request, cursor }
  if (visit.problems.length > 0 || !hasTankSize(visit.setup))
    return { ...state, redirect: writeSetupHref(paths.setup, visit.raw, system) }
  if (visit.isCanonical) return state
  return {
    ...state,
    redirect: writeSetupHref(paths.swap(itemId), visit.raw, system, { cursor: cursor ?? undefined }),
  }
}
