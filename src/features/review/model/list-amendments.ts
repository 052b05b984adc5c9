import type { Proposal } from '#shared/schemas/proposals'
import { nameKey } from './list-fields'

type Content = Pick<Proposal, 'kind' | 'values' | 'identity' | 'summary' | 'flags'>

const isSame = (a: unknown, b: unknown): boolean => JSON.stringify(a ?? null) === JSON.stringify(b ?? null)

function listDifferent(before: object, after: object): string[] {
  const [was, is] = [new Map(Object.entries(before)), new Map(Object.entries(after))]
  return [...new Set([...was.keys(), ...is.keys()])].filter((key) => !isSame(was.get(key), is.get(key)))
}

/** What an author changed between two versions of a proposal, by name. */
export function listAmendments(before: Content, after: Content): readonly string[] {
  const keys = [...listDifferent(before.identity, after.identity), ...listDifferent(before.values, after.values)]
  const names = keys.map((key) => nameKey(after.kind, key))
  return [
    ...names,
    ...(isSame(before.summary, after.summary) ? [] : ['the summary']),
    ...(isSame(before.flags, after.flags) ? [] : ['what is said about the warnings']),
  ]
}
