import { fieldId } from '../../../components/setup/field-groups'
import type { LinkItem } from '../../../components/setup/items-raw'
import { Button } from '../../../components/ui/button'
import { Disclosure } from '../../../components/ui/disclosure'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import { isPlaced, listCountFields, listSpecFields } from '../model/item-paths'
import { FieldGrid, type FormTexts } from './field-grid'

export interface ItemFieldsProps {
  readonly item: LinkItem
  readonly name: string
  /** One line of what the catalogue knows of it. */
  readonly about?: string
  readonly chambers: readonly { readonly id: string; readonly name: string }[]
  readonly form: FormTexts
}

const states = [
  { value: '', label: 'I have it' },
  { value: 'planned', label: 'planned, not bought yet' },
  { value: 'gone', label: 'gone: broken, or not to be had' },
]

const namedPlaces = [
  { value: 'display', label: 'in the display' },
  { value: 'cabinet', label: 'in the cabinet' },
  { value: 'hang-on', label: 'hung on' },
  { value: 'outside', label: 'outside' },
]

/** A piece of the setup: whether it is there, how many, where, and its measures where the catalogue does not have them. */
export function ItemFields({ item, name, about, chambers, form }: ItemFieldsProps) {
  const { id, kind, slug } = item
  const path = (key: string) => `items.${id}.${key}`
  const select = (key: string) => ({
    id: fieldId(path(key)),
    name: path(key),
    value: form.texts[path(key)] ?? '',
    onChange: (text: string) => form.onType(path(key), text),
    error: form.errors.get(path(key)),
  })
  const places = [...chambers.map((one) => ({ value: one.id, label: `in the ${one.name}` })), ...namedPlaces]
  const place = select('place')
  const keptPlaces =
    place.value === '' || places.some(({ value }) => value === place.value)
      ? places
      : [...places, { value: place.value, label: `“${place.value}”` }]
  const more = listSpecFields(item, 'other')
  return (
    <fieldset id={`item-${id}`} tabIndex={-1} className="border border-rule bg-sheet p-4 outline-offset-2">
      <legend className="max-w-full px-1 font-heading text-lg font-bold">{name}</legend>
      {about && <p className="text-sm text-ink-soft">{about}</p>}
      {kind !== null && <input type="hidden" name={path('kind')} value={kind} />}
      {slug !== null && <input type="hidden" name={path('gear')} value={slug} />}
      <div className="mt-2 grid gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
        <SelectField {...select('state')} label="Do you have it?" options={states} />
        {isPlaced(item) && (
          <SelectField {...place} label="Where it stands" options={keptPlaces} emptyLabel="wherever there is room" />
        )}
      </div>
      <FieldGrid fields={listCountFields(item)} form={form} />
      {kind !== null && slug === null && (
        <>
          <p className="mt-4 max-w-prose text-sm text-ink-soft">
            What is not said stays unknown: the report names each number that a verdict waits for.
          </p>
          <FieldGrid fields={listSpecFields(item, 'check')} form={form} kind={kind} />
          {more.length > 0 && (
            <div className="mt-3">
              <Disclosure summary="What is compared when something takes its place">
                <FieldGrid fields={more} form={form} kind={kind} />
              </Disclosure>
            </div>
          )}
        </>
      )}
      <Button
        type="submit"
        size="sm"
        className="mt-4"
        formAction={paths.setupNew}
        name="drop"
        value={id}
        aria-label={`Take it out: ${name}`}
      >
        Take it out
      </Button>
    </fieldset>
  )
}
