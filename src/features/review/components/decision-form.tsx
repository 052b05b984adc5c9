import { reasons } from '#shared/schemas/review-choices'
import { Button } from '../../../components/ui/button'
import { SelectField } from '../../../components/ui/select-field'
import { TextareaField } from '../../../components/ui/textarea-field'
import { countApproved, decisionWordsId, reasonId, type Course, type DecisionDraft } from '../model/decision-draft'
import type { DeskField } from '../model/list-fields'

export interface DecisionFormProps {
  readonly draft: DecisionDraft
  readonly fields: readonly DeskField[]
  readonly errors: ReadonlyMap<string, string>
  readonly isBusy: boolean
  /** Held by somebody else: everything can be prepared, nothing sent. */
  readonly holder: string | null
  readonly onChange: (change: Partial<DecisionDraft>) => void
  readonly onDecide: () => void
}

const courses: readonly { readonly value: Course; readonly label: string }[] = [
  { value: 'approve', label: 'Approve' },
  { value: 'send-back', label: 'Send back with questions' },
  { value: 'decline', label: 'Decline' },
]

const wordLabels: Readonly<Record<Course, string>> = {
  approve: 'Words to its author, if any',
  'send-back': 'What do you ask its author?',
  decline: 'Why is it declined?',
}

function nameAction({ course }: DecisionDraft, approved: number, all: number): string {
  if (course === 'send-back') return 'Send it back'
  if (course === 'decline') return 'Decline it'
  if (all === 1) return 'Approve it'
  return approved === all ? `Approve all ${all}` : `Approve ${approved} of ${all}`
}

function CourseChoice({ course, onChange }: { readonly course: Course; readonly onChange: (course: Course) => void }) {
  return (
    <fieldset>
      <legend className="text-sm font-semibold">What becomes of it?</legend>
      {courses.map(({ value, label }) => (
        <label key={value} className="flex min-h-11 items-center gap-2">
          <input
            type="radio"
            name="course"
            value={value}
            checked={course === value}
            onChange={() => onChange(value)}
            className="size-5 accent-action"
          />
          {label}
        </label>
      ))}
    </fieldset>
  )
}

/** The decision about the whole: with a reason and words unless it is approved. */
export function DecisionForm({ draft, fields, errors, isBusy, holder, onChange, onDecide }: DecisionFormProps) {
  const { course, reasonCode, words } = draft
  const codes = course === 'approve' ? {} : reasons[course]
  return (
    <form
      aria-labelledby="decide"
      onSubmit={(event) => {
        event.preventDefault()
        onDecide()
      }}
      className="grid gap-4"
    >
      <h2 id="decide">Decide</h2>
      <CourseChoice course={course} onChange={(chosen) => onChange({ course: chosen, reasonCode: '' })} />
      {course !== 'approve' && (
        <SelectField
          id={reasonId}
          label="Reason"
          emptyLabel="choose one"
          options={Object.entries(codes).map(([value, label]) => ({ value, label: String(label) }))}
          value={reasonCode}
          error={errors.get(reasonId)}
          onChange={(chosen) => onChange({ reasonCode: chosen })}
        />
      )}
      <TextareaField
        id={decisionWordsId}
        label={wordLabels[course]}
        rows={4}
        maxLength={2000}
        value={words}
        error={errors.get(decisionWordsId)}
        onChange={(typed) => onChange({ words: typed })}
      />
      {holder !== null && <p className="text-sm">{holder} holds this now: it cannot be decided until then.</p>}
      <div>
        <Button type="submit" variant="primary" isBusy={isBusy}>
          {nameAction(draft, countApproved(draft, fields), fields.length)}
        </Button>
      </div>
    </form>
  )
}
