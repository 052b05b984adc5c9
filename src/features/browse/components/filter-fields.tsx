import type { Role } from '#shared/kinds/types'
import type { Facet, GearList } from '#shared/schemas/gear'
import { listFilterable, type FilterableAttribute } from '#shared/schemas/gear-filters'
import { roleTitles } from '../../../lib/role-titles'
import type { Browse } from '../hooks/use-browse'
import { listOptions } from '../../../lib/describe-filter'
import { OptionFilter } from './option-filter'
import { RangeFilter } from './range-filter'

export interface FilterFieldsProps {
  readonly browse: Browse
  readonly facets: GearList['facets'] | undefined
}

const asMeasure = (facet: Facet | undefined) => (facet?.type === 'measure' ? facet : undefined)
const asOptions = (facet: Facet | undefined) => (facet?.type === 'options' ? facet : undefined)

function toOptions(facet: Facet | undefined, chosen: string | undefined) {
  const counts = asOptions(facet)?.counts ?? []
  const listed = counts.map(({ value, label }) => ({ value: String(value), label }))
  const others = (chosen ?? '')
    .split(',')
    .filter((value) => value !== '' && !listed.some((each) => each.value === value))
  return [...others.map((value) => ({ value, label: value })), ...listed]
}

function AttributeFilter({
  attribute,
  browse,
  facets,
}: FilterFieldsProps & { readonly attribute: FilterableAttribute }) {
  const { visit, state, printer } = browse
  const { key, label } = attribute
  const shared = { text: state.filters[key], problems: visit.problems }
  const facet = facets?.[key]
  if (attribute.type === 'measure')
    return <RangeFilter attribute={attribute} facet={asMeasure(facet)} printer={printer} {...shared} />
  return <OptionFilter name={key} label={label} options={listOptions(attribute)} facet={asOptions(facet)} {...shared} />
}

const grid = 'mt-3 grid grid-cols-1 gap-x-8 gap-y-5 sm:grid-cols-2 lg:grid-cols-4'

/** Every filter of the kind, those that decide first. */
export function FilterFields({ browse, facets }: FilterFieldsProps) {
  const { visit, state } = browse
  const { kind, filters } = state
  const attributes = kind === null ? [] : listFilterable(kind)
  const ofRole = (role: Role) => attributes.filter((attribute) => attribute.role === role)
  return (
    <div className="space-y-6">
      {(['check', 'difference', 'display'] as const).map((role) => {
        const listed = ofRole(role)
        if (listed.length === 0) return null
        return (
          <section key={role} aria-label={roleTitles[role]}>
            <h3 className="text-sm text-ink-soft">{roleTitles[role]}</h3>
            <div className={grid}>
              {listed.map((attribute) => (
                <AttributeFilter key={attribute.key} attribute={attribute} browse={browse} facets={facets} />
              ))}
            </div>
          </section>
        )
      })}
      <section aria-label="Who makes it">
        <h3 className="text-sm text-ink-soft">Who makes it, and whether still</h3>
        <div className={grid}>
          {(['brand', 'status'] as const).map((name) => (
            <OptionFilter
              key={name}
              name={name}
              label={name}
              options={toOptions(facets?.[name], filters[name])}
              facet={asOptions(facets?.[name])}
              text={filters[name]}
              problems={visit.problems}
              canBeUnknown={false}
            />
          ))}
        </div>
      </section>
    </div>
  )
}
