import { useDraft } from '../hooks/use-draft'

export interface FilterCheckProps {
  readonly name: string
  readonly value: string
  readonly label: string
  readonly isChecked: boolean
  /** How many there are; undefined while that is not known. */
  readonly count?: number | undefined
}

/** One choice of a filter, with how many pieces it would keep. */
export function FilterCheck({ name, value, label, isChecked, count }: FilterCheckProps) {
  const [draft, setDraft] = useDraft(isChecked)
  return (
    <label className="flex min-h-7 items-baseline gap-2 text-sm hover:text-action">
      <input
        type="checkbox"
        name={name}
        value={value}
        checked={draft}
        onChange={(event) => setDraft(event.target.checked)}
        className="size-4 flex-none translate-y-0.5 accent-action"
      />
      <span className="min-w-0">
        {label}
        {count !== undefined && <span className="font-mono text-xs text-ink-soft"> {count}</span>}
      </span>
    </label>
  )
}
