import type { Response } from 'supertest'
import { expect } from 'vitest'
import { problemSchema, type Problem } from '../../shared/schemas/problem'

/** Holds an answer to RFC 9457 and returns its document. */
export function expectProblem(response: Response, status: number): Problem {
  expect(response.status).toBe(status)
  expect(response.headers['content-type']).toMatch(/^application\/problem\+json/)
  expect(response.headers['cache-control']).toBe('no-store')
  const problem = problemSchema.strict().parse(JSON.parse(response.text))
  expect(problem.status).toBe(status)
  expect(problem.requestId).toBe(response.headers['x-request-id'])
  expect(response.text).not.toMatch(/node_modules|\bat \w+ \(/)
  return problem
}

export function listPointers(problem: Problem): string[] {
  return (problem.errors ?? []).map(({ pointer }) => pointer).sort()
}
