import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import { slugSchema } from '#shared/schemas/gear'
import {
  careRequestSchema,
  confirmationRequestSchema,
  confirmationSchema,
  duplicatesQuerySchema,
  duplicatesSchema,
  gearCareSchema,
  mergeRequestSchema,
  reportRequestSchema,
  restoreRequestSchema,
  valueSourcesSchema,
} from '#shared/schemas/review'
import { describeCall, type CallDescription } from './describe-calls'

const slugParams = z.object({ slug: slugSchema })
const matchHeaders = z.object({
  'If-Match': z.string().describe('The ETag of the piece, or its newest revision as "r7"'),
})

const describeOne = (call: Omit<CallDescription, 'tag' | 'params'>): RouteConfig =>
  describeCall({ params: slugParams, ...call, tag: 'gear care', problems: [404, ...(call.problems ?? [])] })

const describeStep = (step: string, summary: string, more: Partial<CallDescription> = {}): RouteConfig =>
  describeOne({
    method: 'post',
    path: `/api/v1/gear/{slug}/${step}`,
    summary,
    access: 'moderator',
    body: careRequestSchema,
    success: [200, gearCareSchema],
    problems: [409],
    ...more,
  })

export const gearCarePaths: readonly RouteConfig[] = [
  describeCall({
    method: 'get',
    path: '/api/v1/gear/duplicates',
    summary: 'Pieces that may be the one you are about to add, the surest first',
    tag: 'gear care',
    access: 'anyone',
    query: duplicatesQuerySchema,
    success: [200, duplicatesSchema],
    problems: [422],
  }),
  describeCall({
    method: 'get',
    path: '/api/v1/gear/{slug}/sources/{key}',
    summary: 'All sources of one value that still count, the one in use first',
    tag: 'gear care',
    access: 'anyone',
    params: slugParams.extend({ key: z.string() }),
    success: [200, valueSourcesSchema],
    problems: [404, 410],
  }),
  describeOne({
    method: 'get',
    path: '/api/v1/gear/{slug}/care',
    summary: 'How the piece stands, what you did with it and what you may do; for merged and retired pieces too',
    access: 'member',
    success: [200, gearCareSchema],
  }),
  describeOne({
    method: 'post',
    path: '/api/v1/gear/{slug}/confirmations',
    summary: 'Confirms a value: once a person and value, and never one’s own. 200 where you did so before',
    access: 'member',
    body: confirmationRequestSchema,
    success: [201, confirmationSchema],
    problems: [409, 410],
  }),
  describeOne({
    method: 'post',
    path: '/api/v1/gear/{slug}/reports',
    summary: 'Says what is wrong; needs no account',
    access: 'anyone',
    body: reportRequestSchema,
    success: [201, z.object({ status: z.string() })],
    problems: [409, 410],
  }),
  describeStep('restore', 'Makes an earlier revision the present state again, as a new revision', {
    headers: matchHeaders,
    body: restoreRequestSchema,
    problems: [409, 410, 412, 428],
  }),
  describeStep('merge', 'Leads every address of a duplicate to another piece (301)', { body: mergeRequestSchema }),
  describeStep('unmerge', 'Makes a merged piece one of its own again'),
  describeStep('retire', 'Takes a piece out of the catalogue; its address answers 410 with the words'),
  describeStep('unretire', 'Puts a retired piece back'),
]
