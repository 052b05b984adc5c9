import type { Proposal } from '#shared/schemas/proposals'

export interface RecordWordsProps {
  readonly record: Proposal['record']
}

/** What became of somebody's earlier proposals. */
export function RecordWords({ record: { accepted, declined } }: RecordWordsProps) {
  if (accepted + declined === 0) return <span>first proposal</span>
  return (
    <span>
      {accepted} accepted, {declined} declined
    </span>
  )
}
