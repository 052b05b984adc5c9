/** Why a proposal goes back, or is declined: ours, short, and never without words beside it. */
export const reasons = {
  'send-back': {
    'evidence-missing': 'Nothing backs the value yet',
    'evidence-unclear': 'The evidence cannot be read or shows something else',
    'number-doubtful': 'The number looks mistyped',
    'unit-doubtful': 'The number looks taken in another unit',
    'place-doubtful': 'It seems measured at another place than the guide shows',
    question: 'A question comes first',
  },
  decline: {
    'already-there': 'The record says this already',
    'better-known': 'A better source says otherwise',
    'not-backed': 'Nothing backs it, and nothing came when asked',
    'other-piece': 'It is about another piece of gear',
    'out-of-scope': 'It is nothing that this record keeps',
    mischief: 'It was not meant to be true',
  },
} as const

export type ReasonCode = keyof (typeof reasons)['send-back'] | keyof (typeof reasons)['decline']

/** Waiting for longer than that. */
export const ages = ['day', 'week', 'month'] as const

export const queueSorts = ['oldest', 'newest', 'flagged', 'newcomers'] as const
