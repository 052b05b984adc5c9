import type { z } from 'zod'

export interface FoundIssue {
  readonly path: PropertyKey[]
  readonly message: string
}

/** One issue per wrong field: zod names all unknown fields of an object in one. */
export function unfoldIssues(issues: readonly z.core.$ZodIssue[]): FoundIssue[] {
  return issues.flatMap((issue): FoundIssue[] => {
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ path: [...issue.path, key], message: 'is not a known field' }))
    }
    if (issue.code === 'invalid_key' || issue.code === 'invalid_element') {
      return unfoldIssues(issue.issues).map(({ path, message }) => ({ path: [...issue.path, ...path], message }))
    }
    return [{ path: issue.path, message: issue.message }]
  })
}
