import { Router, type RequestHandler } from 'express'
import type { Database } from '../db/database'
import { createCounter } from '../modules/limits/limits.service'
import { countAccepted } from '../modules/people/people.service'
import type { RateLimits } from './rate-limits'
import { createSharedRateLimit, type SharedRateLimit } from './shared-rate-limits'

const quarterMs = 15 * 60_000
const hourMs = 60 * 60_000

/** Standing counts: ten accepted contributions double a limit, and it grows up to ten times. */
const growth = { perAccepted: 0.1, most: 10 }

/** Calculations change nothing, and signing in has a limit of its own. */
const elsewhere = /^\/(ask|fit|replacements|session|setups|worksheets)(\/|$)/
const reading = new Set(['GET', 'HEAD', 'OPTIONS'])

/** Limits on what changes something. Reads and calculations have their own, of each process. */
export function createWriteLimits(db: Database, limits: RateLimits, now?: () => Date): Router {
  const create = (name: string, windowMs: number, rest: Omit<SharedRateLimit, 'name' | 'windowMs' | 'counter'>) =>
    createSharedRateLimit({ name, windowMs, counter: createCounter(db, name, windowMs, now), ...rest })

  function createGrowing(name: string, base: number, what: string, skip?: SharedRateLimit['skip']): RequestHandler {
    return create(name, hourMs, {
      limit: async (actor) => {
        if (actor === null) return base
        const accepted = await countAccepted(db, actor.id)
        return Math.round(base * Math.min(growth.most, 1 + growth.perAccepted * accepted))
      },
      describe: (most) =>
        `You may ${what} ${most} times an hour. It becomes more with each contribution of yours that is accepted. Retry-After says in how many seconds there is room again.`,
      ...(skip !== undefined && { skip }),
    })
  }

  const signUps = create('sign-ups', hourMs, {
    limit: limits.signUpsPerHour,
    byAddress: true,
    describe: (most) => `From one address ${most} people may sign up an hour. Please try again later.`,
  })
  const resets = create('resets', hourMs, {
    limit: limits.resetsPerHour,
    byAddress: true,
    describe: (most) => `From one address ${most} new passwords may be asked for an hour. Please try again later.`,
  })
  const failedSignIns = create('failed-sign-ins', quarterMs, {
    limit: limits.failedSignInsPerQuarter,
    byAddress: true,
    onlyFailures: true,
    describe: (most, minutes) =>
      `Signing in failed ${most} times in ${minutes} minutes from your address. Please wait a little, or ask for a new password.`,
  })

  const router = Router()
  router.use(
    createGrowing('writes', limits.writesPerHour, 'change something', (req) => {
      return reading.has(req.method) || elsewhere.test(req.path)
    }),
  )
  router.post('/proposals', createGrowing('proposals', limits.proposalsPerHour, 'propose something'))
  router.post('/people', signUps)
  router.post('/password-resets', resets)
  router.post('/session', failedSignIns)
  return router
}
