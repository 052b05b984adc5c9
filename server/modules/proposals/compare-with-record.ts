import type { ProposedField } from '#shared/schemas/proposals'
import type { ProposedValues } from '../../db/schema/index'
import type { HistoricValue } from '../gear/gear-history.service'
import { isSameValue, readSources, takesPlace } from '../gear/value-history'

export interface ComparedValue {
  readonly base: HistoricValue | null
  readonly now: HistoricValue | null
  readonly state: ProposedField['state']
}

function compareOne(
  rows: readonly HistoricValue[],
  baseRevision: number,
  proposed: ProposedValues[string],
): ComparedValue {
  const base = readSources(rows.filter(({ revision }) => revision <= baseRevision)).used
  const now = readSources(rows).used
  const isSettled = proposed === null ? now === null : now !== null && isSameValue(now.value, proposed?.value)
  if (isSettled) return { base, now, state: 'settled' }
  const hasMoved = base?.revision !== now?.revision
  if (hasMoved && !isSameValue(base?.value, now?.value)) return { base, now, state: 'conflict' }
  const stands = now?.source ?? null
  const isBehind =
    proposed !== null &&
    proposed !== undefined &&
    stands !== null &&
    !takesPlace({ source: proposed.source, standing: 'plain' }, { source: stands })
  return { base, now, state: isBehind ? 'shadowed' : 'change' }
}

/** Holds each proposed value against the record as it was at the base revision and as it is now. */
export function compareWithRecord(
  history: readonly HistoricValue[],
  baseRevision: number | null,
  values: ProposedValues,
): ReadonlyMap<string, ComparedValue> {
  return new Map(
    Object.entries(values).map(([key, proposed]) => {
      const rows = history.filter((row) => row.key === key)
      return [key, compareOne(rows, baseRevision ?? 0, proposed)]
    }),
  )
}

export function listConflicts(compared: ReadonlyMap<string, ComparedValue>): string[] {
  return [...compared].filter(([, { state }]) => state === 'conflict').map(([key]) => key)
}
