import type { Verdict } from '#shared/engine/types'
import type { FitRequest } from '#shared/schemas/fit'
import { hasTankSize } from '../../../components/setup/has-tank-size'
import type { ApiClient } from '../../../lib/api-client'
import type { Visit } from '../link/read-visit'
import { fitPagesQuery } from './fit'

const pageSize = 6

/** Whether there is anything to ask: without a size or volume of the tank nothing can be judged. */
export const canAsk = ({ setup }: Visit): boolean => hasTankSize(setup)

/** The list of one verdict; that of those that fit also brings scales, counts and assumptions. */
export function answersQuery(api: ApiClient, { setup, filters, state }: Visit, verdict: Verdict) {
  const { kind, opened, from } = state
  const { check, missing } = opened?.verdict === verdict ? opened : {}
  const request: FitRequest = {
    setup,
    kind,
    ...(Object.keys(filters).length > 0 && { filters }),
    verdict,
    limit: pageSize,
    ...(check !== undefined && { check }),
    ...(missing !== undefined && { missing }),
    ...(verdict === 'fits' && { scales: true }),
  }
  return fitPagesQuery(api, request, from?.verdict === verdict ? from.cursor : null)
}
