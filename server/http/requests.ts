import express, { type Request, type RequestHandler } from 'express'
import type { z } from 'zod'
import { limits } from '#shared/limits'
import { AppError, createInvalidError, type Issue } from '../lib/errors'
import { toIssues, toPointer } from '../lib/to-issues'

/** Reads JSON bodies and nothing else: another media type could be sent across sites without a preflight. */
export const readJsonBody: readonly RequestHandler[] = [
  (req, _res, next) => {
    const isEmpty = req.headers['content-length'] === '0'
    if (!isEmpty && req.is('application/json') === false) {
      throw new AppError('unsupported-media-type', 'Send JSON, with the content type application/json.')
    }
    next()
  },
  express.json({ limit: limits.bodyBytes, strict: false, type: 'application/json' }),
]

/** Express makes a list of a key that is given twice; no query here takes a list. */
export const refuseRepeatedKeys: RequestHandler = (req, _res, next) => {
  const repeated = Object.entries(req.query).filter(([, value]) => typeof value !== 'string')
  if (repeated.length > 0) {
    throw createInvalidError(
      repeated.map(([key]) => ({ pointer: toPointer([key]), detail: 'is given more than once' })),
    )
  }
  next()
}

/** The parsed body; throws one error that names every wrong field. */
export function parseBody<Schema extends z.ZodType>(schema: Schema, req: Request): z.output<Schema> {
  return parse(schema, req.body)
}

/**
 * The parsed body; where its form is wrong, what else `findMore` finds wrong with what was sent is named in the same
 * answer, so that nobody mends one field to be told of the next.
 */
export async function parseBodyOnce<Schema extends z.ZodType>(
  schema: Schema,
  req: Request,
  findMore: (body: unknown) => Promise<readonly Issue[]>,
): Promise<z.output<Schema>> {
  const parsed = schema.safeParse(req.body)
  if (parsed.success) return parsed.data
  const issues = toIssues(parsed.error)
  const named = new Set(issues.map(({ pointer }) => pointer))
  const more = (await findMore(req.body)).filter(({ pointer }) => !named.has(pointer))
  throw createInvalidError([...issues, ...more])
}

export function parseQuery<Schema extends z.ZodType>(schema: Schema, req: Request): z.output<Schema> {
  return parse(schema, { ...req.query })
}

function parse<Schema extends z.ZodType>(schema: Schema, input: unknown): z.output<Schema> {
  const parsed = schema.safeParse(input)
  if (!parsed.success) throw createInvalidError(toIssues(parsed.error))
  return parsed.data
}
