import type { z } from 'zod'
import { unfoldIssues } from '#shared/schemas/unfold-issues'
import type { Issue } from './errors'

/** RFC 6901 in its URI fragment form: `#/setup/tank/chambers/0/lengthMm`. */
export function toPointer(path: readonly PropertyKey[]): string {
  const parts = path.map((part) => encodeURIComponent(String(part).replaceAll('~', '~0').replaceAll('/', '~1')))
  return ['#', ...parts].join('/')
}

/** Every wrong field of a parse with the first thing that is wrong with it, in the order of the fields. */
export function toIssues(error: z.ZodError): Issue[] {
  const issues = new Map<string, Issue>()
  for (const { path, message } of unfoldIssues(error.issues)) {
    const pointer = toPointer(path)
    if (!issues.has(pointer)) issues.set(pointer, { pointer, detail: message })
  }
  return [...issues.values()]
}
