import { Router } from 'express'
import type { Database } from '../../db/database'
import { addEndpoint } from '../../http/methods'
import { readId } from '../../http/path-params'
import { sendAnswer } from '../../http/responses'
import { requireActor } from '../../http/session'
import type { Catalogue } from '../catalogue/catalogue.service'
import { findEffects } from './effects.service'
import type { QuestionBook } from './questions'

export function createEffectRoutes(db: Database, catalogue: Catalogue, questions: QuestionBook): Router {
  const router = Router()
  addEndpoint(router, '/proposals/:id/effects', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await findEffects(db, catalogue, questions, actor, readId(req, 'proposal')))
    },
  })
  return router
}
