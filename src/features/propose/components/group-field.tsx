import { useController } from 'react-hook-form'
import type { GroupAttribute } from '#shared/kinds/types'
import { findSketch, MeasureSketch } from '../../../components/drawings/measure-sketch'
import { FieldControl } from '../../../components/setup/field-control'
import { Button } from '../../../components/ui/button'
import { capitalise } from '../../../lib/capitalise'
import { fieldIdOf, type FoundError } from '../model/form-errors'
import { writePlaceholder } from '../model/type-value'
import { listEntryFields } from '../model/typed-form'
import { BackingFields } from './backing-fields'
import { DoubtNote } from './doubt-note'
import type { SpecFormParts } from './spec-field'

export interface GroupFieldProps extends SpecFormParts {
  readonly group: GroupAttribute
  readonly errors: readonly FoundError[]
}

type Entry = Readonly<Record<string, string>>

/** "Chamber 2"; the one entry of a group that has but one is called like the group. */
const nameEntry = ({ label, many }: GroupAttribute, at: number): string =>
  many ? `${capitalise(label.replace(/s$/, ''))} ${at + 1}` : capitalise(label)

/** A value made of several fields, or a list of such: chambers, points of a pump's curve, bands of a lamp. */
export function GroupField({ group, errors, ...parts }: GroupFieldProps) {
  const { control, base, printer, doubts, actions } = parts
  const name = `specs.${group.key}.entries` as const
  const { field } = useController({ control, name })
  const entries = field.value as readonly Entry[]
  const type = (at: number, key: string, text: string) =>
    field.onChange(entries.map((entry, each) => (each === at ? { ...entry, [key]: text } : entry)))
  const messageAt = (path: string) => errors.find((error) => error.path === path)?.message
  const own = messageAt(name)
  return (
    <fieldset id={fieldIdOf(name)} tabIndex={-1} className="min-w-0 border-t border-rule py-3 lg:col-span-2">
      <legend className="sr-only">{capitalise(group.label)}</legend>
      <p aria-hidden="true" className="text-sm font-semibold">
        {capitalise(group.label)}
      </p>
      {group.guide && <p className="text-sm text-ink-soft">{group.guide}</p>}
      {own && (
        <p className="text-sm font-semibold text-no">
          <span className="sr-only">Error: </span>
          {own}
        </p>
      )}
      {entries.map((entry, at) => (
        <fieldset key={at} className="mt-3 border-l-[1.5px] border-rule pl-4">
          <legend className={group.many ? 'font-semibold' : 'sr-only'}>{nameEntry(group, at)}</legend>
          <div className="mt-1 grid gap-x-6 gap-y-4 sm:grid-cols-2">
            {listEntryFields(group).map((attribute) => {
              const path = `${name}.${at}.${attribute.key}`
              const shape = findSketch(attribute.key)
              return (
                <div key={attribute.key} className="min-w-0">
                  <div className="flex gap-3">
                    <div className="min-w-0 grow">
                      <FieldControl
                        id={fieldIdOf(path)}
                        path={path}
                        attribute={attribute}
                        text={entry[attribute.key] ?? ''}
                        system={printer.system}
                        onChange={(text) => type(at, attribute.key, text)}
                        error={messageAt(path)}
                        placeholder={writePlaceholder(attribute, printer)}
                      />
                    </div>
                    {shape && <MeasureSketch shape={shape} />}
                  </div>
                  {doubts
                    .filter(({ place }) => place === path)
                    .map((doubt) => (
                      <DoubtNote key={doubt.id} doubt={doubt} actions={actions} />
                    ))}
                </div>
              )
            })}
          </div>
          {group.many && (
            <Button size="sm" className="mt-3" onClick={() => field.onChange(entries.filter((_, each) => each !== at))}>
              Take {nameEntry(group, at).toLowerCase()} out
            </Button>
          )}
        </fieldset>
      ))}
      {group.many && (
        <Button size="sm" className="mt-3" onClick={() => field.onChange([...entries, {}])}>
          Add {nameEntry(group, entries.length).toLowerCase()}
        </Button>
      )}
      {entries.length > 0 && <BackingFields control={control} attribute={group} />}
      {base.gear?.specs[group.key] !== undefined && entries.length === 0 && (
        <p className="mt-2 text-sm text-ink-soft">Sent like this, what is on record is proposed to be taken away.</p>
      )}
    </fieldset>
  )
}
