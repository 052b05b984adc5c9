import type { MeasureAttribute } from '#shared/kinds/types'
import type { Facet } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { controlClass } from '../../../components/ui/field'
import { useDraft } from '../hooks/use-draft'
import { parseRange } from '../../../lib/ranges'
import { endKey, type End, type FilterProblem } from '../link/read-ranges'
import { printEnd, unknownText } from '../../../lib/describe-filter'
import { printHeader } from '../model/columns'
import { FilterCheck } from './filter-check'
import { RangeLine } from './range-line'

export interface RangeFilterProps {
  readonly attribute: MeasureAttribute
  readonly facet: (Facet & { type: 'measure' }) | undefined
  /** As in the address. */
  readonly text: string | undefined
  readonly problems: readonly FilterProblem[]
  readonly printer: Printer
}

function EndField(props: {
  readonly attribute: MeasureAttribute
  readonly end: End
  readonly value: string
  readonly problem: FilterProblem | undefined
  readonly placeholder: string
}) {
  const { attribute, end, value, problem, placeholder } = props
  const [draft, setDraft] = useDraft(problem?.text ?? value)
  const name = endKey(attribute.key, end)
  const id = `filter-${attribute.key}-${end}`
  return (
    <input
      id={id}
      name={name}
      type="text"
      value={draft}
      onChange={(event) => setDraft(event.target.value)}
      aria-label={`${attribute.label}, ${end === 'from' ? 'at least' : 'at most'}`}
      aria-invalid={problem ? true : undefined}
      aria-describedby={problem ? `${id}-error` : undefined}
      placeholder={placeholder}
      autoComplete="off"
      spellCheck={false}
      className={`${controlClass} min-h-9 min-w-0 px-2 font-mono text-sm`}
    />
  )
}

/** From and to, typed as people write measures; above them where the catalogue begins and ends. */
export function RangeFilter({ attribute, facet, text, problems, printer }: RangeFilterProps) {
  const { key, unit } = attribute
  const range = parseRange(text) ?? { from: null, to: null }
  const print = (value: number | null) => (value === null ? '' : printEnd(value, attribute, printer))
  const bounds = [facet?.min ?? null, facet?.max ?? null] as const
  const hint = (value: number | null) => (value === null ? '' : printer.number(value, unit))
  const problemOf = (end: End) => problems.find((problem) => problem.key === key && problem.end === end)
  const shown = problems.filter((problem) => problem.key === key)
  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-semibold">{printHeader(attribute, printer)}</legend>
      <RangeLine bounds={bounds} range={range} unit={unit} printer={printer} />
      <div className="flex items-center gap-2">
        <EndField
          attribute={attribute}
          end="from"
          value={print(range.from)}
          problem={problemOf('from')}
          placeholder={hint(bounds[0])}
        />
        <span className="text-sm text-ink-soft">to</span>
        <EndField
          attribute={attribute}
          end="to"
          value={print(range.to)}
          problem={problemOf('to')}
          placeholder={hint(bounds[1])}
        />
      </div>
      {shown.map(({ end = 'from', detail }) => (
        <p key={end} id={`filter-${key}-${end}-error`} className="mt-1 text-sm font-semibold text-no">
          <span className="sr-only">Error: </span>
          {detail}
        </p>
      ))}
      {((facet?.unknown ?? 0) > 0 || text === 'unknown') && (
        <div className="mt-1">
          <FilterCheck
            name={key}
            value="unknown"
            label={unknownText}
            isChecked={text === 'unknown'}
            count={facet?.unknown}
          />
        </div>
      )}
    </fieldset>
  )
}
