import { useEffect, useRef, type FormEvent, type ReactNode } from 'react'
import { kindKeys, kinds } from '#shared/kinds/index'
import { limits } from '#shared/limits'
import { listSorts } from '#shared/schemas/gear-filters'
import { Button } from '../../../components/ui/button'
import { controlClass } from '../../../components/ui/field'
import { SuggestInput } from '../../../components/suggest/suggest-input'
import { paths } from '../../../config/paths'
import { formId, type Browse } from '../hooks/use-browse'
import { useDraft } from '../hooks/use-draft'
import { printSort } from '../model/print-sort'

const typingMs = 350

const isTyped = (target: EventTarget): boolean => target instanceof HTMLInputElement && target.type === 'text'

function FormSelect(props: {
  readonly name: string
  readonly label: string
  readonly value: string
  readonly options: readonly { readonly value: string; readonly label: string }[]
}) {
  const { name, label, value, options } = props
  const [draft, setDraft] = useDraft(value)
  return (
    <label className="block min-w-0">
      <span className="block text-sm font-semibold">{label}</span>
      <select
        name={name}
        value={draft}
        onChange={(event) => setDraft(event.target.value)}
        className={`${controlClass} mt-1`}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </label>
  )
}

const kindOptions = [
  { value: '', label: 'every kind' },
  ...kindKeys.map((key) => ({ value: key, label: kinds[key].plural })),
]

/** Kind, search and order. A plain form: without scripts its button leads to the same addresses. */
export function BrowseForm({ browse, children }: { readonly browse: Browse; readonly children?: ReactNode }) {
  const { state, sendForm } = browse
  const { kind, q, sort } = state
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined)
  useEffect(() => () => clearTimeout(timer.current), [])
  const [draft, setDraft] = useDraft(q)

  const follow = ({ currentTarget: form, target }: FormEvent<HTMLFormElement>) => {
    clearTimeout(timer.current)
    if (isTyped(target)) timer.current = setTimeout(() => sendForm(form, true), typingMs)
    else sendForm(form)
  }
  const sorts = listSorts(kind ?? undefined).filter((each) => q !== '' || each !== 'relevance')
  const usual = q === '' ? 'name' : 'relevance'
  return (
    <form
      id={formId}
      action={paths.gearList}
      method="get"
      role="search"
      aria-label="Gear"
      onChange={follow}
      onBlur={({ currentTarget, target }) => {
        if (!isTyped(target)) return
        clearTimeout(timer.current)
        sendForm(currentTarget)
      }}
      onSubmit={(event) => {
        event.preventDefault()
        clearTimeout(timer.current)
        sendForm(event.currentTarget)
      }}
      className="print:hidden"
    >
      <input type="hidden" name="of" value={kind ?? ''} />
      <div className="grid grid-cols-1 items-end gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-[minmax(0,1fr)_14rem_14rem_auto]">
        <div className="min-w-0 sm:max-lg:col-span-2">
          <label htmlFor="gear-search" className="block text-sm font-semibold">
            Search by brand, model or a telling number
          </label>
          <SuggestInput
            id="gear-search"
            name="q"
            scope={{ page: 'gear', kind }}
            value={draft}
            onChange={(event) => setDraft(event.target.value)}
            maxLength={limits.searchText}
            enterKeyHint="search"
            className={`${controlClass} mt-1`}
          />
        </div>
        <FormSelect name="kind" label="Kind of gear" value={kind ?? ''} options={kindOptions} />
        <FormSelect
          name="sort"
          label="In order of"
          value={sort ?? ''}
          options={[
            { value: '', label: printSort(kind, usual) },
            ...sorts.filter((each) => each !== usual).map((each) => ({ value: each, label: printSort(kind, each) })),
          ]}
        />
        <Button type="submit" variant="primary" className="max-sm:w-full">
          Show
        </Button>
      </div>
      {children}
    </form>
  )
}
