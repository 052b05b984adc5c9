import compression from 'compression'
import express, { Router, type Express } from 'express'
import type { Env } from './config/env'
import { getOwnOrigin } from './config/origin'
import type { Database } from './db/database'
import { createErrorPage } from './http/error-page'
import { createLifecycle, type Lifecycle } from './http/lifecycle'
import { createRequestLog } from './http/logging'
import { refuseDotFiles, refuseOddMethods } from './http/methods'
import { createProblemHandler, refuseUnknownPath } from './http/problem-handler'
import { createRateLimit, defaultRateLimits, type RateLimits } from './http/rate-limits'
import { createPageRoutes, type Pages } from './http/render'
import { createOriginCheck } from './http/origin-check'
import { refuseRepeatedKeys } from './http/requests'
import { assignNonce, createSecurityHeaders } from './http/security-headers'
import { createSessionLookup } from './http/session'
import { createWriteLimits } from './http/write-limits'
import type { Logger } from './lib/logger'
import { createAccountContext } from './modules/accounts/account-context'
import { createAccountRoutes } from './modules/accounts/accounts.routes'
import type { FileStore } from './services/files/file-store'
import { createSessions } from './modules/accounts/sessions.service'
import { createCatalogue } from './modules/catalogue/catalogue.service'
import { createAuditRoutes } from './modules/audit/audit.routes'
import { createAskRoutes } from './modules/ask/ask.routes'
import { createEvidenceRoutes } from './modules/evidence/evidence.routes'
import { askDemoQuestions } from './modules/effects/demo-questions'
import { createEffectRoutes } from './modules/effects/effects.routes'
import { createQuestionBook } from './modules/effects/questions'
import { createFitRoutes } from './modules/fit/fit.routes'
import { createGearCareRoutes } from './modules/gear-care/gear-care.routes'
import { createGearRoutes } from './modules/gear/gear.routes'
import { createMovedPageRoutes } from './modules/gear/moved-pages.routes'
import { createKindRoutes } from './modules/kinds/kinds.routes'
import { createMailRoutes } from './modules/mail/mail.routes'
import { createMailroomRoutes } from './modules/mail/mailroom.routes'
import { createOpenApiRoutes } from './modules/openapi/openapi.routes'
import { createDecisionRoutes } from './modules/proposals/decision.routes'
import { createProposalRoutes } from './modules/proposals/proposals.routes'
import { createPeopleRoutes } from './modules/people/people.routes'
import { createPreferenceRoutes } from './modules/preferences/preferences.routes'
import { createRevertRoutes } from './modules/revert/revert.routes'
import { createReviewRoutes } from './modules/review/review.routes'
import { createSettleRoutes } from './modules/review/settle.routes'
import { createSetupRoutes } from './modules/setups/setups.routes'
import { createSystemRoutes } from './modules/system/system.routes'
import { createWorksheetRoutes } from './modules/worksheets/worksheets.routes'

export interface AppDependencies {
  readonly db: Database
  readonly env: Env
  readonly logger: Logger
  readonly lifecycle?: Lifecycle
  /** The built client; without it there is the API alone. */
  readonly pages?: Pages | null
  readonly rateLimits?: Partial<RateLimits>
  /** Where photos and documents lie; without it none can be added. */
  readonly files?: FileStore | null
  /** What time it is; tests move it. */
  readonly now?: () => Date
}

/** Puts the parts together; everything that lives outside the process is handed in. */
export function createApp(dependencies: AppDependencies): Express {
  const { db, env, logger, lifecycle = createLifecycle(), pages = null, files = null, now } = dependencies
  const rateLimits = { ...defaultRateLimits, ...dependencies.rateLimits }
  const isHttps = env.PUBLIC_ORIGIN?.startsWith('https:') ?? false
  const origin = getOwnOrigin(env)
  const catalogue = createCatalogue(db)
  const sessions = createSessions(db, now)
  const questions = createQuestionBook()
  questions.register(askDemoQuestions)
  const mailroomFolder = env.DEMO ? (env.MAILROOM_FOLDER ?? null) : null

  const app = express()
  app.disable('x-powered-by')
  app.disable('etag')
  app.set('trust proxy', env.TRUST_PROXY)
  app.use(assignNonce, createRequestLog(logger), createSecurityHeaders(isHttps), refuseOddMethods, refuseDotFiles)
  app.use(compression())
  app.use(createSystemRoutes(db, catalogue, lifecycle))

  app.use(createOriginCheck(isHttps, env.PUBLIC_ORIGIN))

  const api = Router()
  api.use(refuseRepeatedKeys, createSessionLookup(sessions.find, isHttps))
  api.use(
    ['/ask', '/fit', '/replacements', '/setups', '/worksheets'],
    createRateLimit('calculations', rateLimits.calculationsPerMinute),
  )
  api.use(
    ['/gear', '/kinds', '/openapi.json', '/people', '/session'],
    createRateLimit('reads', rateLimits.readsPerMinute),
  )
  api.use(createWriteLimits(db, rateLimits, now))
  api.use(createAskRoutes(catalogue), createFitRoutes(catalogue), createSetupRoutes(catalogue))
  api.use(createWorksheetRoutes(catalogue))
  api.use(createGearCareRoutes(db))
  api.use(createKindRoutes(), createGearRoutes(db, catalogue), createOpenApiRoutes(env.PUBLIC_ORIGIN))
  api.use(createAccountRoutes(createAccountContext(db, origin, now), sessions, isHttps))
  api.use(createProposalRoutes(db, origin), createDecisionRoutes(db, origin))
  api.use(createReviewRoutes(db), createSettleRoutes(db), createRevertRoutes(db))
  api.use(createEffectRoutes(db, catalogue, questions))
  api.use(createEvidenceRoutes(db, files), createMailRoutes(db), createAuditRoutes(db))
  api.use(createMailroomRoutes(mailroomFolder, '/mailroom'))
  api.use(createPeopleRoutes(db, origin))
  api.use(refuseUnknownPath)
  app.use('/api/v1', api)
  app.use('/api', refuseUnknownPath)

  app.use(createPreferenceRoutes(isHttps), createMailroomRoutes(mailroomFolder, '/mailroom.json'))
  if (pages !== null) app.use(createMovedPageRoutes(db), createPageRoutes(app, pages, rateLimits.pagesPerMinute))
  app.use(refuseUnknownPath)
  app.use(createProblemHandler(pages?.errorPage ?? createErrorPage()))
  return app
}
