import { createHash } from 'node:crypto'
import type { Request, RequestHandler, Response } from 'express'
import type { Database } from '../db/database'
import { AppError } from '../lib/errors'
import {
  claimKey,
  keepAnswer,
  releaseKey,
  type KeyOfPerson,
  type StoredAnswer,
} from '../modules/idempotency/idempotency.service'
import { requireActor } from './session'

const keyForm = /^[\x21-\x7e]{8,128}$/
const keptHeaders = ['content-type', 'location', 'etag', 'cache-control'] as const

function readKey(req: Request): string {
  const key = req.get('Idempotency-Key')
  if (key === undefined || !keyForm.test(key)) {
    throw new AppError(
      'malformed',
      'Send the header Idempotency-Key, 8 to 128 characters chosen anew for each thing that you add, so that it is added once.',
    )
  }
  return key
}

function hashRequest(req: Request): string {
  const body = JSON.stringify(req.body ?? null)
  return createHash('sha256').update(`${req.method} ${req.originalUrl}\n${body}`).digest('hex')
}

function readHeaders(res: Response): Record<string, string> {
  return Object.fromEntries(
    keptHeaders.flatMap((name) => {
      const value = res.getHeader(name)
      return value === undefined ? [] : [[name, String(value)]]
    }),
  )
}

function replay(res: Response, { status, headers, body }: StoredAnswer): void {
  res.status(status).set({ ...headers, 'Idempotency-Replayed': 'true' })
  res.end(body)
}

/** Keeps the answer before it leaves, so that whoever asks again the moment after is given the same. */
function keepWhenSent(db: Database, res: Response, of: KeyOfPerson): void {
  const end = res.end.bind(res) as (body?: unknown, encoding?: unknown) => Response
  const settle = (body: string) =>
    res.statusCode < 300
      ? keepAnswer(db, of, { status: res.statusCode, headers: readHeaders(res), body })
      : releaseKey(db, of)
  res.end = (chunk?: unknown, encoding?: unknown) => {
    const body = typeof chunk === 'string' || Buffer.isBuffer(chunk) ? chunk.toString() : ''
    settle(body)
      // What was asked for is done; an answer that could not be kept is still the answer.
      .catch((error: unknown) => {
        res.err ??= error instanceof Error ? error : new Error(String(error))
      })
      .finally(() => end(chunk, encoding))
    return res
  }
}

/**
 * Makes a POST that adds something repeatable: the same key with the same body is answered as before and done once.
 * Stands after the body's reader and before what does the work; needs somebody who is signed in.
 */
export function createIdempotency(db: Database): RequestHandler {
  return async (req, res, next) => {
    const of = { personId: requireActor(res).id, key: readKey(req) }
    const stored = await claimKey(db, of, hashRequest(req))
    if (stored !== null) return replay(res, stored)
    keepWhenSent(db, res, of)
    next()
  }
}
