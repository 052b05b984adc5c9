import type { EvidenceRef } from '#shared/schemas/gear'
import { EvidenceFiles } from '../../../components/record/evidence-files'
import { EvidenceText } from '../../../components/record/evidence-text'

export interface FieldBackingProps {
  readonly evidence: string | undefined
  readonly files: readonly EvidenceRef[]
  readonly of: string
  /** Where nothing backs the value; leave out to say nothing. */
  readonly emptyText?: string
}

/** What backs a value: words, addresses, photos and documents. */
export function FieldBacking({ evidence, files, of, emptyText }: FieldBackingProps) {
  if (evidence === undefined && files.length === 0)
    return emptyText === undefined ? null : <p className="text-sm font-semibold text-changes">{emptyText}</p>
  return (
    <>
      {evidence !== undefined && (
        <p className="text-sm">
          <EvidenceText text={evidence} />
        </p>
      )}
      <EvidenceFiles files={files} of={of} />
    </>
  )
}
