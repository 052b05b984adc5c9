import { createHash } from 'node:crypto'
import type { z } from 'zod'
import { createInvalidError } from './errors'

function createCheck(payload: string, query: string): string {
  return createHash('sha256').update(`${query}\n${payload}`).digest('base64url').slice(0, 12)
}

/**
 * A place in a list, tied to the question it belongs to: a cursor that was made up, damaged, or taken to another question
 * is refused rather than answered with the wrong page. It holds nothing secret.
 */
export function createCursor(place: unknown, query: string): string {
  const payload = Buffer.from(JSON.stringify(place)).toString('base64url')
  return `${payload}.${createCheck(payload, query)}`
}

function readPayload(cursor: string, query: string): unknown {
  const [payload, check, ...rest] = cursor.split('.')
  if (payload === undefined || rest.length > 0 || check !== createCheck(payload, query)) return undefined
  try {
    return JSON.parse(Buffer.from(payload, 'base64url').toString())
  } catch {
    return undefined
  }
}

/** Throws AppError `invalid` at `#/cursor`. */
export function readCursor<Schema extends z.ZodType>(cursor: string, query: string, schema: Schema): z.output<Schema> {
  const parsed = schema.safeParse(readPayload(cursor, query))
  if (!parsed.success) {
    throw createInvalidError([{ pointer: '#/cursor', detail: 'is not a cursor that this question gave' }])
  }
  return parsed.data
}
