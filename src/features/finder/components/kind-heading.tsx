import { useSubmit } from 'react-router-dom'
import { kindKeys, kinds } from '#shared/kinds/index'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'
import type { FinderState } from '../link/finder-state'
import { HiddenFields } from './hidden-fields'

/** "Which [heater] still fits?": the kind is chosen inside the heading's own sentence. */
export function KindHeading({ state }: { readonly state: FinderState }) {
  const submit = useSubmit()
  return (
    <form action={paths.find} method="get" className="flex flex-wrap items-end gap-x-3 gap-y-2">
      <HiddenFields state={state} without={['kind']} />
      <h1 className="flex flex-wrap items-baseline gap-x-2">
        <span>Which</span>
        <label className="inline-flex max-w-full min-w-0">
          <span className="sr-only">Kind of gear</span>
          <select
            key={state.kind}
            name="kind"
            defaultValue={state.kind}
            onChange={(event) => void submit(event.currentTarget.form, { preventScrollReset: true })}
            className="field-sizing-content max-w-full min-w-0 rounded-ui border-b-[3px] border-action bg-transparent pr-1 font-heading text-action"
          >
            {kindKeys.map((kind) => (
              <option key={kind} value={kind} className="bg-sheet text-base text-ink">
                {kinds[kind].label}
              </option>
            ))}
          </select>
        </label>
        <span>still fits?</span>
      </h1>
      <noscript>
        <Button type="submit" size="sm">
          Show this kind
        </Button>
      </noscript>
    </form>
  )
}
