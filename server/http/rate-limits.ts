import type { RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'
import { AppError } from '../lib/errors'

/** What one address or one person may ask for. */
export interface RateLimits {
  readonly readsPerMinute: number
  readonly calculationsPerMinute: number
  readonly pagesPerMinute: number
  /** Changes of any kind by somebody of whom nothing was accepted yet. */
  readonly writesPerHour: number
  readonly proposalsPerHour: number
  readonly signUpsPerHour: number
  readonly resetsPerHour: number
  readonly failedSignInsPerQuarter: number
}

/** A shared household or classroom is one address; the figures leave room for it. */
export const defaultRateLimits: RateLimits = {
  readsPerMinute: 1200,
  calculationsPerMinute: 600,
  pagesPerMinute: 600,
  writesPerHour: 300,
  proposalsPerHour: 60,
  signUpsPerHour: 30,
  resetsPerHour: 10,
  failedSignInsPerQuarter: 50,
}

export function createRateLimit(name: string, perMinute: number): RequestHandler {
  return rateLimit({
    windowMs: 60_000,
    limit: perMinute,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    identifier: name,
    handler: () => {
      throw new AppError(
        'too-many-requests',
        `One address may make ${perMinute} requests (${name}) a minute. Retry-After says in how many seconds there is room again.`,
      )
    },
  })
}
