import type { KindKey } from '#shared/kinds/index'
import type { GearItem } from '#shared/schemas/gear'
import { SuggestInput } from '../../../components/suggest/suggest-input'
import { Button } from '../../../components/ui/button'
import { controlClass } from '../../../components/ui/field'
import { paths } from '../../../config/paths'
import { describeSpecs } from '../../../lib/describe-specs'
import { usePrinter } from '../../../lib/use-printer'
import { isKindKey } from '#shared/kinds/index'

export interface PieceSearchProps {
  readonly name: 'find' | 'findTank'
  readonly label: string
  readonly hint: string
  readonly text: string
  readonly kind: KindKey | null
  /** What the catalogue has by that name; undefined where nothing was looked for. */
  readonly found: readonly GearItem[] | undefined
  readonly addLabel: string
}

/** Looks a piece up by its name: a suggestion adds it at once, a search lists what it may be. */
export function PieceSearch({ name, label, hint, text, kind, found, addLabel }: PieceSearchProps) {
  const printer = usePrinter()
  const id = `field-${name}`
  return (
    <div className="max-w-3xl">
      <label htmlFor={id} className="block text-sm font-semibold">
        {label}
      </label>
      <p id={`${id}-hint`} className="text-sm text-ink-soft">
        {hint}
      </p>
      <div className="mt-1 flex flex-wrap gap-2">
        <SuggestInput
          id={id}
          name={name}
          key={text}
          scope={{ page: 'piece', kind }}
          defaultValue={text}
          maxLength={200}
          aria-describedby={`${id}-hint`}
          className={controlClass}
        />
        <Button type="submit" formAction={paths.setupNew}>
          Search
        </Button>
      </div>
      {found && (
        <div id={`${name}-found`} tabIndex={-1} className="mt-2 outline-offset-2">
          <p role="status" className="text-sm">
            {found.length === 0
              ? `Nothing in the catalogue is called “${text}”. Describe it yourself${name === 'find' ? ' below' : ' with its measures'}.`
              : `“${text}” may be:`}
          </p>
          <ul>
            {found.map(({ slug, brand, model, kind: own, specs }) => (
              <li key={slug} className="flex items-center justify-between gap-4 border-b border-rule py-2">
                <span className="min-w-0">
                  <span className="font-semibold">
                    {brand} · {model}
                  </span>
                  <span className="block text-sm text-ink-soft">
                    {isKindKey(own) ? describeSpecs(own, specs, printer) : own}
                  </span>
                </span>
                <Button
                  type="submit"
                  size="sm"
                  formAction={paths.setupNew}
                  name="add"
                  value={`${own}.${slug}`}
                  aria-label={`${addLabel}: ${brand} ${model}`}
                >
                  {addLabel}
                </Button>
              </li>
            ))}
          </ul>
        </div>
      )}
    </div>
  )
}
