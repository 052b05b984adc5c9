import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import { answerSchema, fitResultSchema, reportSchema } from '#shared/schemas/answer'
import { askRequestSchema, questionSchema } from '#shared/schemas/ask'
import { fitCheckRequestSchema, fitRequestSchema, reportRequestSchema } from '#shared/schemas/fit'
import { gearListSchema, gearSchema, revisionListSchema, revisionSchema, slugSchema } from '#shared/schemas/gear'
import { describedGearQuerySchema } from './gear-query-description'
import { worksheets } from '#shared/engine/worksheets/registry'
import { kindListSchema } from '#shared/schemas/kinds'
import { createWorksheetSchema, workingSchema, worksheetListSchema } from '#shared/schemas/worksheets'
import { replacementsRequestSchema, replacementsSchema } from '#shared/schemas/replacements'
import { accountPaths } from './account-paths'
import { adminPaths } from './admin-paths'
import { describeProblems, type ProblemStatus } from './describe-calls'
import { evidencePaths } from './evidence-paths'
import { examples } from './examples'
import { gearCarePaths } from './gear-care-paths'
import { peoplePaths } from './people-paths'
import { proposalPaths } from './proposal-paths'
import { reviewPaths } from './review-paths'

function describeRead(
  path: string,
  summary: string,
  schema: z.ZodType,
  request: RouteConfig['request'] = {},
): RouteConfig {
  const hasNames = path.includes('{')
  return {
    method: 'get',
    path,
    summary,
    tags: ['catalogue'],
    request,
    responses: {
      200: { description: summary, content: { 'application/json': { schema } } },
      304: { description: 'Not changed since the `ETag` sent as `If-None-Match`' },
      ...(hasNames ? describeProblems(404) : {}),
      ...describeProblems(422, 429, 503),
    },
  }
}

function describeCalculation(
  path: string,
  summary: string,
  [body, example, answer]: readonly [z.ZodType, unknown, z.ZodType],
): RouteConfig {
  return {
    method: 'post',
    path,
    summary,
    tags: ['fit'],
    request: { body: { required: true, content: { 'application/json': { schema: body, example } } } },
    responses: {
      200: { description: summary, content: { 'application/json': { schema: answer } } },
      ...describeProblems(400, 413, 415, 422, 429, 503),
    },
  }
}

const slugParams = z.object({ slug: slugSchema })
const revisionParams = slugParams.extend({ number: z.int().min(1) })
const statusSchema = z.object({ status: z.string() })

function describeState(path: string, summary: string, ...problems: ProblemStatus[]): RouteConfig {
  const content = { 'application/json': { schema: statusSchema } }
  return {
    method: 'get',
    path,
    summary,
    tags: ['service'],
    responses: { 200: { description: summary, content }, ...describeProblems(...problems) },
  }
}

/** Every call, each described by the schemas that check it. */
export const paths: readonly RouteConfig[] = [
  describeRead(
    '/api/v1/kinds',
    'All kinds of gear, what can be known of each, and the checks that read it',
    kindListSchema,
  ),
  describeRead('/api/v1/gear', 'Searches the catalogue; `Link` leads to the next page', gearListSchema, {
    query: describedGearQuerySchema,
  }),
  describeRead('/api/v1/gear/{slug}', 'A piece of gear, with what backs each of its values', gearSchema, {
    params: slugParams,
  }),
  describeRead('/api/v1/gear/{slug}/revisions', 'Its history, newest first', revisionListSchema, {
    params: slugParams,
  }),
  describeRead('/api/v1/gear/{slug}/revisions/{number}', 'Its specs as of one revision', revisionSchema, {
    params: revisionParams,
  }),
  describeCalculation(
    '/api/v1/ask',
    'Reads a question: what is asked about, its filters, and what it tells of the setup',
    [askRequestSchema, examples.ask, questionSchema],
  ),
  describeCalculation('/api/v1/fit', 'Every piece of a kind, judged in a setup', [
    fitRequestSchema,
    examples.fit,
    fitResultSchema,
  ]),
  describeCalculation('/api/v1/fit/check', 'One piece, judged in a setup', [
    fitCheckRequestSchema,
    examples.fitCheck,
    answerSchema,
  ]),
  describeCalculation(
    '/api/v1/replacements',
    'What can take the place of an item that is gone, what changes with it, and what has to be added',
    [replacementsRequestSchema, examples.replacements, replacementsSchema],
  ),
  describeCalculation('/api/v1/setups/report', 'Every check, need and budget of a whole setup', [
    reportRequestSchema,
    examples.report,
    reportSchema,
  ]),
  describeRead(
    '/api/v1/worksheets',
    'All calculations that can be worked out by themselves, what each is sent and what comes out of it',
    worksheetListSchema,
  ),
  ...worksheets.map((sheet) =>
    describeCalculation(`/api/v1/worksheets/${sheet.name}`, sheet.intro, [
      createWorksheetSchema(sheet),
      sheet.example,
      workingSchema,
    ]),
  ),
  ...accountPaths,
  ...peoplePaths,
  ...evidencePaths,
  ...adminPaths,
  ...proposalPaths,
  ...reviewPaths,
  ...gearCarePaths,
  describeState('/health', 'Whether the process lives; asks nobody else'),
  describeState('/ready', 'Whether the process can answer: not while the database is away or it shuts down', 503),
]
