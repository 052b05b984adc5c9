import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import {
  effectsSchema,
  messageRequestSchema,
  proposalListSchema,
  proposalPatchSchema,
  proposalRequestSchema,
  proposalSchema,
  proposalsQuerySchema,
} from '#shared/schemas/proposals'
import { decisionRequestSchema } from '#shared/schemas/review'
import { describeCall, type CallDescription } from './describe-calls'

const idParams = z.object({ id: z.uuid() })
const matchHeaders = z.object({ 'If-Match': z.string().describe('The ETag of what is changed, such as "v3"') })
const keyHeaders = z.object({
  'Idempotency-Key': z.string().describe('Chosen anew for each proposal; repeated, done once'),
})

type Described = Omit<CallDescription, 'tag' | 'params'>

const describeOne = (call: Described): RouteConfig =>
  describeCall({ ...call, tag: 'proposals', params: idParams, problems: [404, ...(call.problems ?? [])] })

/** A change of state: of the version that was read, or not at all. */
const describeTurn = (step: string, summary: string, more: Pick<Described, 'body'> = {}): RouteConfig =>
  describeOne({
    method: 'post',
    path: `/api/v1/proposals/{id}/${step}`,
    summary,
    access: 'member',
    headers: matchHeaders,
    success: [200, proposalSchema],
    problems: [409, 412, 422, 428],
    ...more,
  })

const leasePath = '/api/v1/proposals/{id}/lease'

export const proposalPaths: readonly RouteConfig[] = [
  describeCall({
    method: 'get',
    path: '/api/v1/proposals',
    summary: 'Your own proposals, the newest change first',
    tag: 'proposals',
    access: 'member',
    query: proposalsQuerySchema,
    success: [200, proposalListSchema],
    problems: [422],
  }),
  describeCall({
    method: 'post',
    path: '/api/v1/proposals',
    summary: 'Begins a draft: a new piece, or a change of one from the revision that you read',
    tag: 'proposals',
    access: 'member',
    headers: keyHeaders,
    body: proposalRequestSchema,
    success: [201, proposalSchema],
    problems: [404, 409, 410],
  }),
  describeOne({
    method: 'get',
    path: '/api/v1/proposals/{id}',
    summary: 'A proposal beside the record as it is now: for its author, and for moderators once it was sent in',
    access: 'member',
    success: [200, proposalSchema],
  }),
  describeOne({
    method: 'patch',
    path: '/api/v1/proposals/{id}',
    summary: 'Amends your draft, or what waits or was sent back; it keeps its place in the queue',
    access: 'member',
    headers: matchHeaders,
    body: proposalPatchSchema,
    success: [200, proposalSchema],
    problems: [409, 412, 428],
  }),
  describeTurn('submit', 'Sends it in. A value that would go to and fro a third time opens a dispute instead: 409'),
  describeTurn('withdraw', 'Takes it back; it is kept among your proposals'),
  describeOne({
    method: 'post',
    path: '/api/v1/proposals/{id}/messages',
    summary: 'Says something about it',
    access: 'member',
    body: messageRequestSchema,
    success: [201, proposalSchema],
    problems: [409],
  }),
  describeOne({
    method: 'get',
    path: '/api/v1/proposals/{id}/effects',
    summary: 'Whose answers would change verdict were it approved',
    access: 'member',
    success: [200, effectsSchema],
  }),
  describeOne({
    method: 'post',
    path: leasePath,
    summary: 'Says for 15 minutes that you are reviewing it; others are told your name',
    access: 'moderator',
    success: [200, proposalSchema],
    problems: [409],
  }),
  describeOne({
    method: 'delete',
    path: leasePath,
    summary: 'Gives your lease up',
    access: 'moderator',
    success: [200, proposalSchema],
  }),
  describeOne({
    method: 'post',
    path: '/api/v1/proposals/{id}/decision',
    summary:
      'Approves, whole or by field, sends back or declines. Of several who decide at once one does; nobody their own',
    access: 'moderator',
    headers: matchHeaders,
    body: decisionRequestSchema,
    success: [200, proposalSchema],
    problems: [409, 412, 428],
  }),
]
