import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import {
  adminPeopleQuerySchema,
  adminPeopleSchema,
  adminPersonSchema,
  personChangeSchema,
  personSchema,
} from '#shared/schemas/people'
import { describeCall } from './describe-calls'

const nameParams = z.object({ name: z.string() })

export const peoplePaths: readonly RouteConfig[] = [
  describeCall({
    method: 'get',
    path: '/api/v1/people/{name}',
    summary: 'What everybody may see of a person: since when, and what was accepted',
    tag: 'people',
    access: 'anyone',
    params: nameParams,
    success: [200, personSchema],
    problems: [404],
  }),
  describeCall({
    method: 'get',
    path: '/api/v1/admin/people',
    summary: 'Everybody with an account, by name; `Link` leads to the next page',
    tag: 'people',
    access: 'admin',
    query: adminPeopleQuerySchema,
    success: [200, adminPeopleSchema],
    problems: [422],
  }),
  describeCall({
    method: 'patch',
    path: '/api/v1/admin/people/{name}',
    summary: 'Changes somebody’s role, suspends, or lifts a suspension; all of it is audited',
    tag: 'people',
    access: 'admin',
    params: nameParams,
    body: personChangeSchema,
    success: [200, adminPersonSchema],
    problems: [404, 409],
  }),
]
