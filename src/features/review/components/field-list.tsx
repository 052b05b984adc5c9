import { useQuery } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'
import { usePrinter } from '../../../lib/use-printer'
import { pieceQuery } from '../api/get-piece'
import type { Review } from '../hooks/use-review'
import { readFieldDraft } from '../model/decision-draft'
import type { DeskField } from '../model/list-fields'
import { findFlagWords } from '../model/find-flag-words'
import { FieldCard } from './field-card'
import { FieldChoice } from './field-choice'

export interface FieldListProps {
  readonly review: Review
  readonly canChoose: boolean
  readonly errors: ReadonlyMap<string, string>
}

/** A sole value stands and falls with the whole, unless somebody else changed it too. */
const hasChoice = ({ isChoosable, state }: DeskField, all: number): boolean =>
  isChoosable && (state === 'conflict' || (all > 1 && state !== 'settled'))

/** Every value of a proposal, each with what is on record and what backs it. */
export function FieldList({ review: { proposal, fields, kept }, canChoose, errors }: FieldListProps) {
  const { api } = useApp()
  const printer = usePrinter()
  const { gear } = proposal
  const piece = useQuery({ ...pieceQuery(api, gear?.slug ?? '', gear?.revision ?? 0), enabled: gear !== null }).data
  const flags = findFlagWords(proposal, piece?.specs ?? {}, printer)
  const { draft, change } = kept
  return (
    <section className="mt-6" aria-labelledby="fields">
      <h2 id="fields">{fields.length === 1 ? 'One value' : `${fields.length} values`}</h2>
      <div className="mt-2 border-b-[1.5px] border-ink">
        {fields.map((field) => (
          <FieldCard
            key={field.key}
            field={field}
            files={proposal.files}
            flags={flags.filter(({ flag }) => field.flags.includes(flag))}
            sources={piece?.sources[field.key] ?? []}
            printer={printer}
          >
            {canChoose && hasChoice(field, fields.length) && (
              <FieldChoice
                field={field}
                draft={readFieldDraft(draft, field)}
                errors={errors}
                onChange={(chosen) => change({ fields: { ...draft.fields, [field.key]: chosen } })}
              />
            )}
          </FieldCard>
        ))}
      </div>
    </section>
  )
}
