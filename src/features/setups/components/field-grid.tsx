import type { SetupField } from '#shared/kinds/setup-fields'
import type { UnitSystem } from '#shared/units/systems'
import { findSketch, MeasureSketch } from '../../../components/drawings/measure-sketch'
import { checkField } from '../../../components/setup/check-field'
import { fieldId } from '../../../components/setup/field-groups'
import { FieldControl } from '../../../components/setup/field-control'

export interface FieldGridProps {
  readonly fields: readonly SetupField[]
  readonly form: FormTexts
  /** Of the piece that the fields describe. */
  readonly kind?: string
}

/** What is typed so far, and what to make of it. */
export interface FormTexts {
  readonly texts: Readonly<Record<string, string>>
  readonly onType: (path: string, text: string) => void
  readonly system: UnitSystem
  /** Why the text of a path cannot stay as it was sent. */
  readonly errors: ReadonlyMap<string, string>
  /** What is taken while a field is empty, in words. */
  readonly assumedOf: (path: string) => string | undefined
}

/** Fields side by side, each length with a drawing of where to measure. */
export function FieldGrid({ fields, form, kind }: FieldGridProps) {
  const { texts, onType, system, errors, assumedOf } = form
  return (
    <div className="mt-3 grid gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
      {fields.map(({ path, attribute }) => {
        const text = texts[path] ?? ''
        const shape = findSketch(attribute.key, kind)
        return (
          <div key={path} className="flex min-w-0 gap-3">
            <div className="min-w-0 grow">
              <FieldControl
                id={fieldId(path)}
                path={path}
                attribute={attribute}
                text={text}
                system={system}
                onChange={(next) => onType(path, next)}
                error={errors.has(path) ? (checkField(text, attribute, system) ?? errors.get(path)) : undefined}
                assumed={assumedOf(path)}
              />
            </div>
            {shape && <MeasureSketch shape={shape} />}
          </div>
        )
      })}
    </div>
  )
}
