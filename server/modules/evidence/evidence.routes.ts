import { pipeline } from 'node:stream/promises'
import { Router, type Request, type RequestHandler, type Response } from 'express'
import { z } from 'zod'
import { evidenceFieldsSchema } from '#shared/schemas/evidence'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { parseBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { getActor, requireActor } from '../../http/session'
import { readUpload, requireFile } from '../../http/uploads'
import { AppError } from '../../lib/errors'
import type { FileStore } from '../../services/files/file-store'
import * as evidence from './evidence.service'

const idSchema = z.uuid()

/** Text that cannot be an id names nothing. */
function readId(req: Request): string {
  const parsed = idSchema.safeParse(req.params.id)
  if (!parsed.success) throw new AppError('not-found', 'There is nothing by that name.')
  return parsed.data
}

/** Opened by itself, a file may do nothing: no script, no form, no frame, and a document is only downloaded. */
function setFileHeaders(res: Response, id: string, { contentType, isPublished, etag }: evidence.OpenedFile): void {
  const ending = contentType.split('/')[1] ?? 'bin'
  const disposition = contentType === 'application/pdf' ? 'attachment' : 'inline'
  res.set({
    'Content-Type': contentType,
    'Content-Disposition': `${disposition}; filename="evidence-${id}.${ending}"`,
    'Content-Security-Policy':
      "default-src 'none'; frame-ancestors 'none'; base-uri 'none'; object-src 'none'; sandbox",
    'X-Content-Type-Options': 'nosniff',
    'Cache-Control': isPublished ? 'public, max-age=3600' : 'private, no-store',
    Vary: 'Cookie',
    ...(isPublished && { ETag: etag }),
  })
}

/** Photos and documents that back values. `files` is null where no object store is named. */
export function createEvidenceRoutes(db: Database, files: FileStore | null): Router {
  const router = Router()

  function requireStore(): { db: Database; files: FileStore } {
    if (files === null) throw new AppError('unavailable', 'Photos and documents cannot be kept here just now.')
    return { db, files }
  }

  const sendFile = (size: 'whole' | 'thumbnail'): RequestHandler => {
    return async (req, res) => {
      const id = readId(req)
      const store = requireStore()
      const file = await evidence.findFile(db, id, getActor(res), size)
      setFileHeaders(res, id, file)
      if (file.isPublished && req.fresh) return void res.status(304).end()
      const stream = await store.files.get(file.key)
      if (stream === null) throw new AppError('not-found', 'The file is no longer there.')
      await pipeline(stream, res).catch((error: unknown) => {
        // A visitor who leaves early is no failure.
        if (!res.destroyed) throw error
      })
    }
  }

  addEndpoint(router, '/proposals/:id/evidence', {
    get: async (req, res) => sendAnswer(res, await evidence.listEvidence(db, readId(req), requireActor(res))),
    post: [
      async (req, res, next) => {
        await evidence.requireOpenProposal(db, readId(req), requireActor(res))
        requireStore()
        next()
      },
      readUpload,
      async (req, res) => {
        const { caption } = parseBody(evidenceFieldsSchema, req)
        const by = { actor: requireActor(res), requestId: getRequestId(req) }
        const added = await evidence.addEvidence(requireStore(), readId(req), { ...requireFile(req), caption }, by)
        res.status(201).location(added.url)
        sendAnswer(res, added)
      },
    ],
  })

  addEndpoint(router, '/evidence/:id', {
    get: sendFile('whole'),
    delete: async (req, res) => {
      const by = { actor: requireActor(res), requestId: getRequestId(req) }
      await evidence.removeEvidence(requireStore(), readId(req), by)
      res.set('Cache-Control', 'private, no-store').status(204).end()
    },
  })

  addEndpoint(router, '/evidence/:id/thumbnail', { get: sendFile('thumbnail') })

  return router
}
