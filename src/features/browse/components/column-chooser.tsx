import type { KindKey } from '#shared/kinds/index'
import type { Browse } from '../hooks/use-browse'
import { useDraft } from '../hooks/use-draft'
import { chooseColumns, listColumns, printHeader } from '../model/columns'
import { FilterCheck } from './filter-check'

/** Which columns, and how close the rows stand. */
export function ColumnChooser({ browse, kind }: { readonly browse: Browse; readonly kind: KindKey }) {
  const { state, printer } = browse
  const shown = chooseColumns(kind, state.columns)
  const [density, setDensity] = useDraft(state.density)
  return (
    <div className="grid grid-cols-1 gap-x-8 gap-y-4 sm:grid-cols-[minmax(0,1fr)_12rem]">
      <fieldset className="min-w-0">
        <legend className="text-sm font-semibold">Columns</legend>
        <div className="mt-1 gap-x-6 sm:columns-2 lg:columns-4">
          {listColumns(kind).map((attribute) => (
            <FilterCheck
              key={attribute.key}
              name="cols"
              value={attribute.key}
              label={printHeader(attribute, printer)}
              isChecked={shown.includes(attribute)}
            />
          ))}
        </div>
      </fieldset>
      <fieldset>
        <legend className="text-sm font-semibold">Rows</legend>
        {(['comfortable', 'compact'] as const).map((each) => (
          <label key={each} className="flex min-h-7 items-center gap-2 text-sm hover:text-action">
            <input
              type="radio"
              name="density"
              value={each}
              checked={density === each}
              onChange={() => setDensity(each)}
              className="size-4 accent-action"
            />
            {each}
          </label>
        ))}
      </fieldset>
    </div>
  )
}
