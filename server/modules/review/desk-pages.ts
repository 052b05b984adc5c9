import { z } from 'zod'
import { createCursor, readCursor } from '../../lib/cursor'
import type { DeskPlace } from './disputes.queries'

const placeSchema = z.strictObject({ createdAt: z.iso.datetime(), id: z.uuid() })
const pageSize = 25

interface Placed {
  readonly id: string
  readonly createdAt: Date
}

/** A page of what is listed by age, oldest first, and the cursor to the next. */
export async function readPage<Row extends Placed>(
  question: string,
  cursor: string | undefined,
  list: (after: DeskPlace | null, limit: number) => Promise<Row[]>,
): Promise<{ readonly rows: readonly Row[]; readonly next: string | null }> {
  const after = cursor === undefined ? null : readCursor(cursor, question, placeSchema)
  const found = await list(after, pageSize + 1)
  const rows = found.slice(0, pageSize)
  const last = rows.at(-1)
  const place = last === undefined ? null : { createdAt: last.createdAt.toISOString(), id: last.id }
  return { rows, next: found.length > pageSize && place !== null ? createCursor(place, question) : null }
}
