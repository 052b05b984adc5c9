import { Button } from '../../../components/ui/button'
import { apiBase } from '../../../lib/api-client'
import type { TypedFile } from '../model/typed-form'

export interface FileCardProps {
  readonly file: TypedFile
  /** The values that it can back. */
  readonly targets: readonly { readonly key: string; readonly label: string }[]
  readonly onChange: (file: TypedFile) => void
  readonly onRemove: () => void
}

/** A file that is there: small, with which values it backs, and a way to take it back. */
export function FileCard({ file, targets, onChange, onRemove }: FileCardProps) {
  const { id, name, kind, only } = file
  const isFor = (key: string) => only === null || only.includes(key)
  const toggle = (key: string, isOn: boolean) => {
    const keys = targets.map((target) => target.key).filter((each) => (each === key ? isOn : isFor(each)))
    onChange({ ...file, only: keys.length === targets.length ? null : keys })
  }
  return (
    <li className="flex gap-4 border border-rule bg-sheet px-4 py-3">
      {kind === 'photo' ? (
        <img
          src={`${apiBase}/evidence/${encodeURIComponent(id)}/thumbnail`}
          alt={`Your photo ${name}`}
          width={96}
          height={72}
          className="h-18 w-24 flex-none border border-rule object-cover"
        />
      ) : (
        <span
          aria-hidden="true"
          className="flex h-18 w-24 flex-none items-center justify-center border border-rule font-mono"
        >
          PDF
        </span>
      )}
      <div className="min-w-0">
        <p className="text-sm break-words">{name}</p>
        {targets.length > 1 && (
          <fieldset className="mt-1 text-sm">
            <legend className="text-ink-soft">Backs</legend>
            {targets.map(({ key, label }) => (
              <label key={key} className="mr-4 inline-flex min-h-8 items-center gap-2">
                <input
                  type="checkbox"
                  checked={isFor(key)}
                  onChange={(event) => toggle(key, event.target.checked)}
                  className="size-4 accent-action"
                />
                {label}
              </label>
            ))}
          </fieldset>
        )}
        <Button size="sm" className="mt-2" aria-label={`Remove ${name}`} onClick={onRemove}>
          Remove
        </Button>
      </div>
    </li>
  )
}
