import { blindQueries } from './queries/blind'
import { openQueries } from './queries/open'
import { queryClasses, type Judgements, type QueryClass } from './queries/types'

export interface JudgedQuery {
  readonly query: string
  readonly queryClass: QueryClass
  /** Written before there was a search, and held out: nothing is tuned on it. */
  readonly isBlind: boolean
  readonly judgements: Judgements
}

/** Over 300 queries to the demo catalogue with the answers that people would want, more than half of them blind. */
export const judgedQueries: readonly JudgedQuery[] = [
  { table: blindQueries, isBlind: true },
  { table: openQueries, isBlind: false },
].flatMap(({ table, isBlind }) =>
  queryClasses.flatMap((queryClass) =>
    Object.entries(table[queryClass]).map(([query, judgements]) => ({ query, queryClass, isBlind, judgements })),
  ),
)
