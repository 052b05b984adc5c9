import { useState } from 'react'
import { Link } from 'react-router-dom'
import { getAttribute, isKindKey } from '#shared/kinds/index'
import { printValue } from '#shared/kinds/print-value'
import type { Dispute } from '#shared/schemas/review'
import { paths } from '../../../config/paths'
import { capitalise } from '../../../lib/capitalise'
import { printDate } from '../../../lib/print-date'
import { sourceWords } from '../../../lib/source-words'
import { usePrinter } from '../../../lib/use-printer'
import { useSettle } from '../api/use-settle'
import { nameKey } from '../model/list-fields'
import { FieldBacking } from './field-backing'
import { SettleForm } from './settle-form'

export interface DisputeCardProps {
  readonly dispute: Dispute
  readonly onSettled: (message: string) => void
}

function useValueWords(kind: string, key: string): (value: unknown) => string {
  const printer = usePrinter()
  const attribute = isKindKey(kind) ? getAttribute(kind, key) : undefined
  return (value) => (attribute ? printValue(attribute, value, printer) : String(value))
}

/** A value that went to and fro, with everything that was ever said of it, and the choice of what is used. */
export function DisputeCard({ dispute: { id, gear, key, values, proposalId }, onSettled }: DisputeCardProps) {
  const print = useValueWords(gear.kind, key)
  const [revision, setRevision] = useState(values.find(({ isUsed }) => isUsed)?.revision ?? values.at(-1)?.revision)
  const { mutate, isPending, error } = useSettle('disputes', id)
  const name = nameKey(gear.kind, key)
  const settle = (words: string) => {
    if (revision === undefined) return
    mutate({ words, revision }, { onSuccess: () => onSettled(`${capitalise(name)} of ${gear.model} is settled.`) })
  }
  return (
    <li className="border-t-[1.5px] border-ink py-4">
      <h2>
        {capitalise(name)} of{' '}
        <Link to={paths.gear(gear.slug)} className="link">
          {gear.brand} · {gear.model}
        </Link>
      </h2>
      {proposalId !== null && (
        <p className="text-sm">
          <Link to={paths.reviewProposal(proposalId)} className="link">
            The proposal that would turn it once more
          </Link>
        </p>
      )}
      <fieldset className="mt-2">
        <legend className="text-sm font-semibold">Which value is used from now on?</legend>
        {values.map((value) => (
          <div key={value.revision} className="border-b border-rule py-2">
            <label className="flex min-h-8 items-center gap-2">
              <input
                type="radio"
                name={`dispute-${id}`}
                checked={revision === value.revision}
                onChange={() => setRevision(value.revision)}
                className="size-5 accent-action"
              />
              <span>
                <span className="font-mono">{print(value.value)}</span>{' '}
                {value.isUsed && <strong className="font-semibold">in use</strong>}
              </span>
            </label>
            <div className="pl-7 text-sm text-ink-soft">
              {sourceWords[value.source]}, {printDate(value.date)}, {value.author}, revision {value.revision}
              <FieldBacking evidence={value.evidence} files={value.files ?? []} of={name} />
            </div>
          </div>
        ))}
      </fieldset>
      <SettleForm
        id={`settle-${id}`}
        label="Why this one?"
        hint="Stands beside the value in its history."
        action="Settle it"
        isBusy={isPending}
        failure={error}
        onSettle={settle}
      />
    </li>
  )
}
