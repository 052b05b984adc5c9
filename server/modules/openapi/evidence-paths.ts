import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import { evidenceFieldsSchema, evidenceListSchema, evidenceSchema } from '#shared/schemas/evidence'
import { describeCall, describeProblems } from './describe-calls'

const idParams = z.object({ id: z.uuid() })
const tag = 'evidence'

const fileSchema = z.string().meta({ format: 'binary' })

/** A call whose answer is a file: of a type that the file itself decides. */
function describeFile(path: string, summary: string, ...types: string[]): RouteConfig {
  const call = describeCall({
    method: 'get',
    path,
    summary,
    tag,
    access: 'anyone',
    params: idParams,
    success: [200],
    problems: [404],
  })
  const content = Object.fromEntries(types.map((type) => [type, { schema: fileSchema }]))
  return {
    ...call,
    responses: {
      ...call.responses,
      200: { description: summary, content },
      304: { description: 'Not changed since the `ETag` sent as `If-None-Match`' },
    },
  }
}

function describeUpload(): RouteConfig {
  const call = describeCall({
    method: 'post',
    path: '/api/v1/proposals/{id}/evidence',
    summary: 'Adds one photo (JPEG, PNG, WebP) or PDF of at most 25 MB; the same file sent again is kept once',
    tag,
    access: 'member',
    params: idParams,
    success: [201, evidenceSchema],
    problems: [400, 404, 409, 413, 415, 422],
  })
  const schema = z.object({ ...evidenceFieldsSchema.shape, file: fileSchema })
  return {
    ...call,
    request: { ...call.request, body: { required: true, content: { 'multipart/form-data': { schema } } } },
    responses: { ...call.responses, ...describeProblems(413, 415) },
  }
}

export const evidencePaths: readonly RouteConfig[] = [
  describeCall({
    method: 'get',
    path: '/api/v1/proposals/{id}/evidence',
    summary: 'The files of a proposal, for its author and for those who review',
    tag,
    access: 'member',
    params: idParams,
    success: [200, evidenceListSchema],
    problems: [404],
  }),
  describeUpload(),
  describeFile(
    '/api/v1/evidence/{id}',
    'A file; until it was approved, for its uploader and for those who review alone',
    'image/jpeg',
    'image/png',
    'image/webp',
    'application/pdf',
  ),
  describeFile('/api/v1/evidence/{id}/thumbnail', 'A small copy of a photo', 'image/webp'),
  describeCall({
    method: 'delete',
    path: '/api/v1/evidence/{id}',
    summary: 'Removes a file that one added, while its proposal is open',
    tag,
    access: 'member',
    params: idParams,
    success: [204],
    problems: [404, 409],
  }),
]
