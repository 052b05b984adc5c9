import type { Request, RequestHandler } from 'express'
import multer, { MulterError } from 'multer'
import { evidenceLimits } from '#shared/schemas/evidence'
import { AppError, createInvalidError } from '../lib/errors'

/** Room for the parts' own headers and the caption. */
const overheadBytes = 64 * 1024
const megabytes = Math.round(evidenceLimits.bytes / 1024 / 1024)

const upload = multer({
  // Kept in memory: an upload that is cut short leaves nothing behind, not even on disk.
  storage: multer.memoryStorage(),
  limits: {
    fileSize: evidenceLimits.bytes,
    files: 1,
    fields: 2,
    parts: 3,
    fieldSize: 4_096,
    fieldNameSize: 100,
    headerPairs: 20,
  },
})

const tooLarge = () =>
  new AppError('too-large', `A file may have ${megabytes} MB. Send a smaller copy; what you typed is kept.`)

const detailByCode: Partial<Record<MulterError['code'], string>> = {
  LIMIT_PART_COUNT: 'One file and its caption are taken at a time.',
  LIMIT_FILE_COUNT: 'One file is taken at a time.',
  LIMIT_FIELD_COUNT: 'One file and its caption are taken at a time.',
  LIMIT_FIELD_VALUE: 'The caption is too long.',
  LIMIT_FIELD_KEY: 'A field has too long a name.',
}

/** What multer and its parser threw, in our own words. */
function toUploadError(error: unknown): AppError {
  if (!(error instanceof MulterError)) {
    return new AppError('malformed', 'The upload broke off or is not a form with a file in it.', [], { cause: error })
  }
  if (error.code === 'LIMIT_FILE_SIZE') return tooLarge()
  if (error.code === 'LIMIT_UNEXPECTED_FILE') {
    return createInvalidError([{ pointer: '#/file', detail: 'is the one field that takes a file' }])
  }
  return new AppError('too-large', detailByCode[error.code] ?? 'The form holds too much.', [], { cause: error })
}

/** Reads a form with one file in its field `file`. Refuses what says itself that it is too large before reading it. */
export const readUpload: RequestHandler = (req, res, next) => {
  if (req.is('multipart/form-data') === false) {
    throw new AppError('unsupported-media-type', 'Send a form (multipart/form-data) with the file in the field "file".')
  }
  if (Number(req.headers['content-length'] ?? 0) > evidenceLimits.bytes + overheadBytes) throw tooLarge()
  upload.single('file')(req, res, (error: unknown) =>
    next(error === undefined || error === null ? undefined : toUploadError(error)),
  )
}

export function requireFile(req: Request): { readonly content: Buffer; readonly name: string } {
  const { file } = req
  if (file === undefined || file.size === 0) {
    throw createInvalidError([{ pointer: '#/file', detail: 'is missing: choose a photo or a document' }])
  }
  return { content: file.buffer, name: file.originalname }
}
