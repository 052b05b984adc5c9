import type { Database } from '../../db/database'
import { listValueRows, type HistoricValue, type NewValue } from './gear-revise.queries'

export type { HistoricValue, NewValue } from './gear-revise.queries'

/** Every value that a piece ever had, oldest first; nothing for a piece that is not there yet. */
export async function readHistory(db: Database, gearId: number | null): Promise<readonly HistoricValue[]> {
  return gearId === null ? [] : listValueRows(db, gearId)
}

/** Everybody who is named in it. */
export const listNamed = (rows: readonly HistoricValue[]) =>
  rows.flatMap(({ authorId, reviewerId }) => [authorId, reviewerId])

/** The same value with the same backing, to be put on record once more. */
export function toNewValue(row: HistoricValue): NewValue {
  const { revision: _, reviewerId: __, ...value } = row
  return value
}
