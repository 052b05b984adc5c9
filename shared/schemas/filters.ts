import { z } from 'zod'
import { getAttribute, type KindKey } from '../kinds/index'
import type { Attribute } from '../kinds/types'

const boundSchema = z.number().nullable()

/** From, to (null: open), one of an attribute's options, or yes and no; canonical, by attribute key of the kind. */
export const filtersSchema = z.record(
  z.string(),
  z.union([z.tuple([boundSchema, boundSchema]), z.string(), z.boolean()], {
    error: 'must be [from, to] with null for an open end, an option, or true or false',
  }),
  { error: 'must be an object of attributes' },
)

export type Filters = z.infer<typeof filtersSchema>
type Filter = Filters[string]

function findFault(attribute: Attribute | undefined, filter: Filter): string | null {
  switch (attribute?.type) {
    case 'measure': {
      if (!Array.isArray(filter)) return 'must be [from, to], with null for an open end'
      const [from, to] = filter
      return from !== null && to !== null && from > to ? 'must not fall: [from, to]' : null
    }
    case 'choice':
    case 'set': {
      const options = attribute.options.map(({ value }) => value)
      return typeof filter === 'string' && options.includes(filter) ? null : `must be one of: ${options.join(', ')}`
    }
    case 'boolean':
      return typeof filter === 'boolean' ? null : 'must be true or false'
    case 'text':
    case 'texts':
    case 'group':
      return 'cannot be filtered by'
    case undefined:
      return 'is not an attribute of this kind'
  }
}

/** Which filters a kind cannot answer, and why. */
export function checkFilters(
  { kind, filters = {} }: { readonly kind: KindKey; readonly filters?: Filters | undefined },
  context: z.RefinementCtx<unknown>,
): void {
  for (const [key, filter] of Object.entries(filters)) {
    const message = findFault(getAttribute(kind, key), filter)
    if (message !== null) context.addIssue({ code: 'custom', path: ['filters', key], message })
  }
}
