import type { DeskField } from './list-fields'

interface Words {
  /** Beside the name of the field; null where there is nothing out of the ordinary. */
  readonly note: string | null
  readonly approve: string
  readonly decline: string
}

const byState: Readonly<Record<DeskField['state'], Words>> = {
  change: { note: null, approve: 'Approve', decline: 'Decline' },
  conflict: {
    note: 'Conflict: the record was changed too since this was proposed',
    approve: 'Use the proposed value',
    decline: 'Keep what is on record now',
  },
  settled: { note: 'Already on record as proposed', approve: 'Approve', decline: 'Decline' },
  shadowed: {
    note: 'Kept as a further source: a better one stays in use',
    approve: 'Approve as a further source',
    decline: 'Decline',
  },
}

export const describeField = ({ state }: DeskField): Words => byState[state]
