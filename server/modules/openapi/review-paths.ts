import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import {
  disputeListSchema,
  errorReportListSchema,
  longJobSchema,
  pageQuerySchema,
  queueQuerySchema,
  queueSchema,
  revertRequestSchema,
  settleDisputeSchema,
  settleReportSchema,
  waitingTimesSchema,
} from '#shared/schemas/review'
import { describeCall, type CallDescription } from './describe-calls'

const idParams = z.object({ id: z.uuid() })
const doneSchema = z.object({ status: z.string() })

const describe = (call: Omit<CallDescription, 'tag'>): RouteConfig => describeCall({ ...call, tag: 'review' })

export const reviewPaths: readonly RouteConfig[] = [
  describe({
    method: 'get',
    path: '/api/v1/review',
    summary: 'What waits for a decision',
    access: 'moderator',
    query: queueQuerySchema,
    success: [200, queueSchema],
    problems: [422],
  }),
  describe({
    method: 'get',
    path: '/api/v1/review/times',
    summary: 'How long proposals wait: percentiles of the last 90 days',
    access: 'anyone',
    success: [200, waitingTimesSchema],
  }),
  describe({
    method: 'get',
    path: '/api/v1/review/disputes',
    summary: 'Values that went to and fro, with every value that each ever had',
    access: 'moderator',
    query: pageQuerySchema,
    success: [200, disputeListSchema],
    problems: [422],
  }),
  describe({
    method: 'post',
    path: '/api/v1/disputes/{id}/settle',
    summary: 'Says which revision’s value is used from now on; the other sources stay on record',
    access: 'moderator',
    params: idParams,
    body: settleDisputeSchema,
    success: [200, doneSchema],
    problems: [404, 409],
  }),
  describe({
    method: 'get',
    path: '/api/v1/review/reports',
    summary: 'What readers found wrong, the oldest first',
    access: 'moderator',
    query: pageQuerySchema,
    success: [200, errorReportListSchema],
    problems: [422],
  }),
  describe({
    method: 'post',
    path: '/api/v1/reports/{id}/settle',
    summary: 'Closes a report, with words for the audit trail',
    access: 'moderator',
    params: idParams,
    body: settleReportSchema,
    success: [200, doneSchema],
    problems: [404, 409],
  }),
  describe({
    method: 'post',
    path: '/api/v1/admin/people/{name}/revert',
    summary: 'Begins to take all of a person’s changes back, as new revisions, at most fifty pieces at a time',
    access: 'admin',
    params: z.object({ name: z.string() }),
    body: revertRequestSchema,
    success: [202, longJobSchema],
    problems: [404],
  }),
  describe({
    method: 'get',
    path: '/api/v1/admin/jobs/{id}',
    summary: 'How far such a job has come',
    access: 'admin',
    params: idParams,
    success: [200, longJobSchema],
    problems: [404],
  }),
]
