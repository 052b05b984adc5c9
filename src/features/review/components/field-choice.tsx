import { TextareaField } from '../../../components/ui/textarea-field'
import { fieldChoiceId, fieldWordsId, type FieldDraft } from '../model/decision-draft'
import { describeField } from '../model/field-words'
import type { DeskField } from '../model/list-fields'

export interface FieldChoiceProps {
  readonly field: DeskField
  readonly draft: FieldDraft
  readonly errors: ReadonlyMap<string, string>
  readonly onChange: (draft: FieldDraft) => void
}

/** Approve or decline one value; what is declined is told why. */
export function FieldChoice({ field, draft, errors, onChange }: FieldChoiceProps) {
  const { key, attribute } = field
  const { approve, decline } = describeField(field)
  const choiceId = fieldChoiceId(key)
  const error = errors.get(choiceId)
  const options = [
    { value: 'approve', label: approve },
    { value: 'decline', label: decline },
  ] as const
  return (
    <div className="mt-3">
      <fieldset aria-describedby={error && `${choiceId}-error`}>
        <legend className="sr-only">Decision about {attribute.label}</legend>
        <div className="flex flex-wrap gap-x-6">
          {options.map(({ value, label }, at) => (
            <label key={value} className="flex min-h-11 items-center gap-2">
              <input
                type="radio"
                // The first of them stands for the question, for errors to point at.
                id={at === 0 ? choiceId : `${choiceId}-${value}`}
                name={choiceId}
                value={value}
                checked={draft.choice === value}
                onChange={() => onChange({ ...draft, choice: value })}
                className="size-5 accent-action"
              />
              {label}
            </label>
          ))}
        </div>
        {error && (
          <p id={`${choiceId}-error`} className="text-sm font-semibold text-no">
            <span className="sr-only">Error: </span>
            {error}
          </p>
        )}
      </fieldset>
      {draft.choice === 'decline' && (
        <div className="mt-1 max-w-prose">
          <TextareaField
            id={fieldWordsId(key)}
            label={`Why not, about ${attribute.label}?`}
            hint="Its author reads this."
            rows={2}
            maxLength={2000}
            value={draft.words}
            error={errors.get(fieldWordsId(key))}
            onChange={(words) => onChange({ ...draft, words })}
          />
        </div>
      )}
    </div>
  )
}
