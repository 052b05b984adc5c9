import { OpenAPIRegistry, OpenApiGeneratorV31 } from '@asteasolutions/zod-to-openapi'
import type { z } from 'zod'
import { answerSchema, checkSchema, fitResultSchema, reportSchema } from '#shared/schemas/answer'
import { askRequestSchema, questionSchema } from '#shared/schemas/ask'
import { fitCheckRequestSchema, fitRequestSchema } from '#shared/schemas/fit'
import {
  facetSchema,
  gearItemSchema,
  gearListSchema,
  gearSchema,
  provenanceSchema,
  revisionSchema,
} from '#shared/schemas/gear'
import { kindDescriptionSchema } from '#shared/schemas/kinds'
import { proposalSchema } from '#shared/schemas/proposals'
import { problemSchema } from '#shared/schemas/problem'
import { replacementSchema, replacementsRequestSchema, replacementsSchema } from '#shared/schemas/replacements'
import { setupSchema } from '#shared/schemas/setup'
import { tankInputSchema } from '#shared/schemas/tank-input'
import { workingSchema, worksheetListSchema } from '#shared/schemas/worksheets'
import { hoistNamed } from './hoist-named'
import { paths } from './paths'

const info = {
  title: 'Stillfits',
  version: '1',
  description:
    `A measured, shared record of reef aquarium gear, and an engine that says what fits a setup. Every number in
and out is in the unit that its key names (\`lengthMm\`, \`flowLph\`). Errors are RFC 9457 problem documents. Demo data: every
brand and product is invented.`.replaceAll('\n', ' '),
}

const named = {
  Answer: answerSchema,
  AskRequest: askRequestSchema,
  Check: checkSchema,
  Facet: facetSchema,
  FitResult: fitResultSchema,
  FitRequest: fitRequestSchema,
  FitCheckRequest: fitCheckRequestSchema,
  Gear: gearSchema,
  GearItem: gearItemSchema,
  GearList: gearListSchema,
  Kind: kindDescriptionSchema,
  Problem: problemSchema,
  Proposal: proposalSchema,
  Provenance: provenanceSchema,
  Question: questionSchema,
  Replacement: replacementSchema,
  Replacements: replacementsSchema,
  ReplacementsRequest: replacementsRequestSchema,
  Report: reportSchema,
  Revision: revisionSchema,
  Setup: setupSchema,
  Tank: tankInputSchema,
  Working: workingSchema,
  WorksheetList: worksheetListSchema,
}

/** The library's own JSON for one schema: it only writes whole documents, so the schema is put into one and taken out. */
function createJson(schema: z.ZodType): object {
  const registry = new OpenAPIRegistry()
  const content = { 'application/json': { schema } }
  registry.registerPath({ method: 'post', path: '/', request: { body: { content } }, responses: {} })
  const { paths: written } = new OpenApiGeneratorV31(registry.definitions).generateDocument({ openapi: '3.1.0', info })
  const body = written?.['/']?.post?.requestBody as { content: { 'application/json': { schema: object } } }
  return body.content['application/json'].schema
}

/** The OpenAPI 3.1 document, made from the very schemas that check requests. */
export function createOpenApiDocument(origin: string | undefined): object {
  const registry = new OpenAPIRegistry()
  for (const path of paths) registry.registerPath(path)
  registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: '__Host-session',
    description: 'Set by `POST /api/v1/session`; over plain HTTP its name is `session`.',
  })
  const document = new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info,
    servers: [{ url: origin ?? '/' }],
  })
  const schemas = Object.fromEntries(Object.entries(named).map(([name, schema]) => [name, createJson(schema)]))
  return hoistNamed(
    JSON.parse(JSON.stringify(document)) as never,
    JSON.parse(JSON.stringify(schemas)) as never,
  ) as object
}
