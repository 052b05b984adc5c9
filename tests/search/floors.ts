import type { QueryClass } from './queries/types'

/** nDCG@10 and MRR of the queries that have an answer. */
export interface Floor {
  readonly ndcg: number
  readonly mrr: number
}

interface Floors {
  readonly blind: Floor
  readonly open: Floor
}

/** Values of `npm run search:measure`, rounded down. They are raised when the search gets better, never lowered. */
export const floors: Readonly<Record<Exclude<QueryClass, 'no answer'>, Floors>> = {
  exact: { blind: { ndcg: 0.98, mrr: 1 }, open: { ndcg: 0.99, mrr: 1 } },
  'one typo': { blind: { ndcg: 0.98, mrr: 1 }, open: { ndcg: 0.95, mrr: 1 } },
  'two typos': { blind: { ndcg: 0.99, mrr: 1 }, open: { ndcg: 0.99, mrr: 1 } },
  'swapped letters': { blind: { ndcg: 0.97, mrr: 1 }, open: { ndcg: 0.95, mrr: 1 } },
  'missing letters': { blind: { ndcg: 0.99, mrr: 1 }, open: { ndcg: 0.97, mrr: 1 } },
  'word order': { blind: { ndcg: 0.98, mrr: 1 }, open: { ndcg: 0.93, mrr: 1 } },
  'glued words': { blind: { ndcg: 0.84, mrr: 1 }, open: { ndcg: 0.84, mrr: 1 } },
  'split words': { blind: { ndcg: 0.98, mrr: 1 }, open: { ndcg: 0.93, mrr: 0.96 } },
  'model number': { blind: { ndcg: 0.89, mrr: 1 }, open: { ndcg: 0.88, mrr: 1 } },
  synonym: { blind: { ndcg: 0.89, mrr: 0.95 }, open: { ndcg: 0.99, mrr: 1 } },
  'unit variant': { blind: { ndcg: 0.87, mrr: 0.96 }, open: { ndcg: 0.81, mrr: 1 } },
}
