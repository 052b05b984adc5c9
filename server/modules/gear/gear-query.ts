import type { KindKey } from '#shared/kinds/index'
import { listSorts, readGearFilters, type GearFilter } from '#shared/schemas/gear-filters'
import { gearQuerySchema, type GearQuery } from '#shared/schemas/gear-requests'
import { createInvalidError, type Issue } from '../../lib/errors'
import { toIssues, toPointer } from '../../lib/to-issues'

export interface GearListQuery extends Omit<GearQuery, 'sort'> {
  readonly filters: readonly GearFilter[]
  readonly sort: string
}

function findSortIssues(sort: string | undefined, kind: KindKey | undefined, hasText: boolean): Issue[] {
  const sorts = listSorts(kind).filter((each) => hasText || each !== 'relevance')
  if (sort === undefined || sorts.includes(sort)) return []
  return [{ pointer: '#/sort', detail: `must be one of ${sorts.join(', ')}` }]
}

/** The fixed keys and the kind's filters together, so that one answer names everything that is wrong. */
export function parseGearQuery(texts: Readonly<Record<string, string>>): GearListQuery {
  const isFixed = ([key]: [string, string]) => Object.hasOwn(gearQuerySchema.shape, key)
  const entries = Object.entries(texts)
  const fixed = Object.fromEntries(entries.filter(isFixed))
  const others = Object.fromEntries(entries.filter((entry) => !isFixed(entry)))
  const parsed = gearQuerySchema.safeParse(fixed)
  const kind = gearQuerySchema.shape.kind.safeParse(fixed.kind).data
  const { filters, issues } = readGearFilters(kind, others)
  const all = [
    ...(parsed.error === undefined ? [] : toIssues(parsed.error)),
    ...findSortIssues(fixed.sort, kind, fixed.q !== undefined),
    ...issues.map(({ key, detail }) => ({ pointer: toPointer([key]), detail })),
  ]
  if (all.length > 0 || !parsed.success) throw createInvalidError(all)
  const { sort = fixed.q === undefined ? 'name' : 'relevance', ...rest } = parsed.data
  return { ...rest, sort, filters }
}
