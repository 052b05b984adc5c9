import type { z } from 'zod'
import type { Issue } from './errors'

/** RFC 6901 in its URI fragment form: `#/setup/tank/chambers/0/lengthMm`. */
export function toPointer(path: readonly PropertyKey[]): string {
  const parts = path.map((part) => encodeURIComponent(String(part).replaceAll('~', '~0').replaceAll('/', '~1')))
  return ['#', ...parts].join('/')
}

type ZodIssue = z.core.$ZodIssue

/** A union's own message says nothing: the branch that got furthest does. */
function flatten(issue: ZodIssue, base: readonly PropertyKey[]): Issue[] {
  const path = [...base, ...issue.path]
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ pointer: toPointer([...path, key]), detail: 'is not a known field' }))
  }
  if (issue.code === 'invalid_key' || issue.code === 'invalid_element') {
    return issue.issues.flatMap((inner) => flatten(inner, path))
  }
  return [{ pointer: toPointer(path), detail: issue.message }]
}

/** Every problem of a parse, each at its pointer, in the order of the fields. */
export function toIssues(error: z.ZodError, base: readonly PropertyKey[] = []): Issue[] {
  return error.issues.flatMap((issue) => flatten(issue, base))
}
