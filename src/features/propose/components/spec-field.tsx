import { useController, type Control } from 'react-hook-form'
import { printValue } from '#shared/kinds/print-value'
import type { FieldAttribute } from '#shared/kinds/types'
import { findSketch, MeasureSketch } from '../../../components/drawings/measure-sketch'
import { FieldControl } from '../../../components/setup/field-control'
import { fieldIdOf } from '../model/form-errors'
import { writePlaceholder } from '../model/type-value'
import type { ReadForm } from '../model/read-typed'
import type { FormBase, TypedForm } from '../model/typed-form'
import type { Printer } from '#shared/units/print'
import type { PlacedDoubt } from '../model/doubts'
import { BackingFields } from './backing-fields'
import { DoubtNote, type DoubtActions } from './doubt-note'

export interface SpecFormParts {
  readonly control: Control<TypedForm, unknown, ReadForm>
  readonly base: FormBase
  readonly printer: Printer
  readonly doubts: readonly PlacedDoubt[]
  readonly actions: DoubtActions
}

export interface SpecFieldProps extends SpecFormParts {
  readonly attribute: FieldAttribute
}

/** One attribute as it is typed, with where to measure it, what is unlikely about it, and what backs it. */
export function SpecField({ attribute, ...parts }: SpecFieldProps) {
  const { control, base, printer, doubts, actions } = parts
  const path = `specs.${attribute.key}.text` as const
  const { field, fieldState } = useController({ control, name: path })
  const shape = findSketch(attribute.key, base.kind)
  const recorded = base.gear?.specs[attribute.key]
  const isChanged = field.value.trim() !== (base.typed.specs[attribute.key]?.text ?? '').trim()
  return (
    <div className="min-w-0 border-t border-rule py-3">
      <div className="flex gap-4">
        <div className="min-w-0 grow">
          <FieldControl
            id={fieldIdOf(path)}
            path={path}
            attribute={attribute}
            text={field.value}
            system={printer.system}
            onChange={field.onChange}
            error={fieldState.error?.message}
            placeholder={writePlaceholder(attribute, printer)}
          />
          {isChanged && recorded !== undefined && (
            <p className="text-sm text-ink-soft">
              On record: <span className="font-mono">{printValue(attribute, recorded, printer)}</span>
            </p>
          )}
        </div>
        {shape && <MeasureSketch shape={shape} />}
      </div>
      {doubts
        .filter(({ place }) => place === path)
        .map((doubt) => (
          <DoubtNote key={doubt.id} doubt={doubt} actions={actions} />
        ))}
      {field.value.trim() !== '' && <BackingFields control={control} attribute={attribute} />}
    </div>
  )
}
