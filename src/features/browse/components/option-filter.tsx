import type { Facet } from '#shared/schemas/gear'
import type { Option } from '#shared/kinds/types'
import type { FilterProblem } from '../link/read-ranges'
import { unknownText } from '../../../lib/describe-filter'
import { FilterCheck } from './filter-check'

export interface OptionFilterProps {
  readonly name: string
  readonly label: string
  readonly options: readonly Option[]
  readonly facet: (Facet & { type: 'options' }) | undefined
  /** As in the address. */
  readonly text: string | undefined
  readonly problems: readonly FilterProblem[]
  readonly canBeUnknown?: boolean
}

/** Some of the values that a choice can have. */
export function OptionFilter({ name, label, options, facet, text, problems, canBeUnknown = true }: OptionFilterProps) {
  const problem = problems.find(({ key }) => key === name)
  const chosen = (text ?? problem?.text ?? '').split(',')
  const countOf = (value: string) => facet?.counts.find((each) => String(each.value) === value)?.count
  const isUnknownOffered = canBeUnknown && ((facet?.unknown ?? 0) > 0 || chosen.includes('unknown'))
  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-semibold first-letter:uppercase">{label}</legend>
      <div className="mt-1 max-h-44 overflow-y-auto">
        {options.map((option) => (
          <FilterCheck
            key={option.value}
            name={name}
            value={option.value}
            label={option.label}
            isChecked={chosen.includes(option.value)}
            count={facet && (countOf(option.value) ?? 0)}
          />
        ))}
        {isUnknownOffered && (
          <FilterCheck
            name={name}
            value="unknown"
            label={unknownText}
            isChecked={chosen.includes('unknown')}
            count={facet?.unknown}
          />
        )}
      </div>
      {problem && <p className="mt-1 text-sm font-semibold text-no">{problem.detail}</p>}
    </fieldset>
  )
}
