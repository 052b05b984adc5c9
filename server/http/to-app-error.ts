import { isDatabaseAway } from '../db/errors'
import { AppError, type ErrorCode } from '../lib/errors'
import { FileStoreError } from '../services/files/file-store-error'

const codeByStatus: Readonly<Record<number, ErrorCode>> = {
  400: 'malformed',
  404: 'not-found',
  413: 'too-large',
  415: 'unsupported-media-type',
}

const detailByType: Readonly<Record<string, string>> = {
  'entity.parse.failed': 'The body is not valid JSON.',
  'entity.too.large': 'The body is larger than 256 kB.',
  'charset.unsupported': 'JSON is read in UTF-8 only.',
  'encoding.unsupported': 'The body is encoded in a way that is not read here.',
}

function hasStatus(error: unknown): error is { status: number; type?: unknown } {
  return typeof error === 'object' && error !== null && 'status' in error && typeof error.status === 'number'
}

/** What Express, its body parser or the database threw, in our own words; null for what nobody foresaw. */
export function toAppError(error: unknown): AppError | null {
  if (error instanceof AppError) return error
  if (error instanceof FileStoreError) {
    const detail = 'Photos and documents cannot be reached just now. Nothing was changed; please try again in a moment.'
    return new AppError('unavailable', detail, [], { cause: error })
  }
  if (isDatabaseAway(error)) {
    return new AppError('unavailable', 'The database does not answer. Please try again in a moment.', [], {
      cause: error,
    })
  }
  if (!hasStatus(error)) return null
  const code = codeByStatus[error.status]
  if (code === undefined) return null
  const detail = typeof error.type === 'string' ? detailByType[error.type] : undefined
  return new AppError(code, detail ?? 'The request could not be read.', [], { cause: error })
}
