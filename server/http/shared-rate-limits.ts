import type { Request, RequestHandler, Response } from 'express'
import { ipKeyGenerator, rateLimit, type Store } from 'express-rate-limit'
import { AppError } from '../lib/errors'
import type { Actor } from '../lib/actor'
import type { Counter } from '../modules/limits/limits.service'
import { getActor } from './session'

const minute = 60_000

/** The library's own store counts in one process; this one counts for all of them. */
function createStore(name: string, counter: Counter): Store {
  return {
    localKeys: false,
    prefix: name,
    async increment(key) {
      const { hits, resetsAt } = await counter.add(key)
      return { totalHits: hits, resetTime: resetsAt }
    },
    decrement: counter.takeBack,
    resetKey: counter.clear,
  }
}

export interface SharedRateLimit {
  /** Names the limit in its headers. */
  readonly name: string
  readonly counter: Counter
  readonly windowMs: number
  /** How many there may be in a window: of a person by what was accepted of theirs, of an address where nobody is signed in. */
  readonly limit: number | ((actor: Actor | null) => Promise<number>)
  /** What is said when there were too many. */
  readonly describe: (limit: number, minutes: number) => string
  /** Count by address even of somebody who is signed in. */
  readonly byAddress?: boolean
  /** Count only what failed. */
  readonly onlyFailures?: boolean
  readonly skip?: (req: Request, res: Response) => boolean
}

const nameAddress = (req: Request) => `address ${ipKeyGenerator(req.ip ?? '')}`

/** A limit that holds across processes: for writes and signing in, where a query more does not matter. */
export function createSharedRateLimit(options: SharedRateLimit): RequestHandler {
  const { name, counter, windowMs, limit, describe, byAddress = false, onlyFailures = false, skip } = options
  return rateLimit({
    windowMs,
    limit: typeof limit === 'number' ? limit : (_req, res) => limit(getActor(res)),
    store: createStore(name, counter),
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    identifier: name,
    skipSuccessfulRequests: onlyFailures,
    keyGenerator: (req, res) => {
      const actor = byAddress ? null : getActor(res)
      return actor === null ? nameAddress(req) : `person ${actor.id}`
    },
    ...(skip !== undefined && { skip }),
    handler: (req) => {
      const { rateLimit: info } = req as { readonly rateLimit?: { readonly limit: number } }
      throw new AppError('too-many-requests', describe(info?.limit ?? 0, Math.round(windowMs / minute)))
    },
  })
}
