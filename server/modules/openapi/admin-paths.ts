import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import {
  auditListSchema,
  auditQuerySchema,
  letterListSchema,
  letterQuerySchema,
  letterSchema,
  mailroomSchema,
  unsubscribeQuerySchema,
} from '#shared/schemas/admin'
import { describeCall } from './describe-calls'

export const adminPaths: readonly RouteConfig[] = [
  describeCall({
    method: 'get',
    path: '/api/v1/admin/audit',
    summary: 'Who did what, newest first; nothing in it can be changed or taken out',
    tag: 'admin',
    access: 'admin',
    query: auditQuerySchema,
    success: [200, auditListSchema],
    problems: [422],
  }),
  describeCall({
    method: 'get',
    path: '/api/v1/admin/letters',
    summary: 'Letters that wait, were sent or were given up, without their words',
    tag: 'admin',
    access: 'admin',
    query: letterQuerySchema,
    success: [200, letterListSchema],
    problems: [422],
  }),
  describeCall({
    method: 'post',
    path: '/api/v1/admin/letters/{id}/retry',
    summary: 'Gives a letter that was given up its tries again',
    tag: 'admin',
    access: 'admin',
    params: z.object({ id: z.uuid() }),
    success: [200, letterSchema],
    problems: [404, 409],
  }),
  describeCall({
    method: 'post',
    path: '/api/v1/unsubscribe',
    summary: 'Ends notices by e-mail, by the token of a letter (RFC 8058); no body is read',
    tag: 'mail',
    access: 'anyone',
    query: unsubscribeQuerySchema,
    success: [204],
    problems: [404, 422],
  }),
  describeCall({
    method: 'get',
    path: '/api/v1/mailroom',
    summary: 'Demo mode only: what the local stand-in for a mail server received',
    tag: 'mail',
    access: 'anyone',
    success: [200, mailroomSchema],
    problems: [404],
  }),
]
