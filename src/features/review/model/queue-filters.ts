import { isKindKey, type KindKey } from '#shared/kinds/index'
import { ages, queueSorts } from '#shared/schemas/review-choices'

type Age = (typeof ages)[number]
type QueueSort = (typeof queueSorts)[number]

/** What the queue is narrowed by and ordered by: all of it lives in the address. */
export interface QueueFilters {
  readonly kind: KindKey | null
  readonly age: Age | null
  readonly flagged: 'yes' | 'no' | null
  readonly sort: QueueSort
  readonly cursor: string | null
}

const oneOf = <T extends string>(known: readonly T[], text: string | null): T | null =>
  known.find((one) => one === text) ?? null

/** What cannot be read is as if it were not there. */
export function readQueueFilters(params: URLSearchParams): QueueFilters {
  const kind = params.get('kind') ?? ''
  return {
    kind: isKindKey(kind) ? kind : null,
    age: oneOf(ages, params.get('age')),
    flagged: oneOf(['yes', 'no'], params.get('flagged')),
    sort: oneOf(queueSorts, params.get('sort')) ?? 'oldest',
    cursor: params.get('cursor') || null,
  }
}

/** With its question mark, or nothing where nothing is asked for. */
export function writeQueueQuery({ kind, age, flagged, sort, cursor }: QueueFilters): string {
  const params = new URLSearchParams({
    ...(kind !== null && { kind }),
    ...(age !== null && { age }),
    ...(flagged !== null && { flagged }),
    ...(sort !== 'oldest' && { sort }),
    ...(cursor !== null && { cursor }),
  }).toString()
  return params === '' ? '' : `?${params}`
}

export const isNarrowed = ({ kind, age, flagged }: QueueFilters): boolean =>
  kind !== null || age !== null || flagged !== null
