import type { z } from 'zod'
import { unfoldIssues } from '#shared/schemas/unfold-issues'
import type { Issue } from './errors'

/** RFC 6901 in its URI fragment form: `#/setup/tank/chambers/0/lengthMm`. */
export function toPointer(path: readonly PropertyKey[]): string {
  const parts = path.map((part) => encodeURIComponent(String(part).replaceAll('~', '~0').replaceAll('/', '~1')))
  return ['#', ...parts].join('/')
}

/** Every problem of a parse, each at its pointer, in the order of the fields. */
export function toIssues(error: z.ZodError): Issue[] {
  return unfoldIssues(error.issues).map(({ path, message }) => ({ pointer: toPointer(path), detail: message }))
}
