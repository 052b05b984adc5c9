import type { KindKey } from '#shared/kinds/index'
import { findFilterable } from '../../../lib/describe-filter'

const plain: Readonly<Record<string, string>> = {
  relevance: 'how well it matches',
  name: 'name',
  '-name': 'name, backwards',
  updated: 'last changed, oldest first',
  '-updated': 'last changed, newest first',
}

/** "power, most first" */
export function printSort(kind: KindKey | null, sort: string): string {
  const known = plain[sort]
  if (known !== undefined) return known
  const isDown = sort.startsWith('-')
  const label = findFilterable(kind, sort.replace(/^-/, ''))?.label ?? sort
  return `${label}, ${isDown ? 'most' : 'least'} first`
}
