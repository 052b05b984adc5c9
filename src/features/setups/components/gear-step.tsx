import { kindKeys, kinds } from '#shared/kinds/index'
import type { GearItem } from '#shared/schemas/gear'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { listItems } from '../../../components/setup/items-raw'
import { Button } from '../../../components/ui/button'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import type { NamedItems } from '../hooks/use-named-items'
import { FormStep } from './form-step'
import { ItemFields } from './item-fields'
import { PieceSearch } from './piece-search'
import type { FormTexts } from './field-grid'

export interface GearStepProps {
  readonly raw: RawSetup
  readonly named: NamedItems
  readonly find: string
  readonly found: readonly GearItem[] | undefined
  readonly chambers: readonly { readonly id: string; readonly name: string }[]
  readonly form: FormTexts
}

const ownKinds = kindKeys.filter((key) => key !== 'tank').map((key) => ({ value: key, label: kinds[key].label }))

/** The pieces that are there, planned or gone, and two ways to name another. */
export function GearStep({ raw, named, find, found, chambers, form }: GearStepProps) {
  const items = listItems(raw)
  return (
    <FormStep number={4} id="gear" title="The gear">
      {items.length === 0 && (
        <p className="max-w-prose text-ink-soft">
          Nothing yet. Name what you have or mean to buy; mark a piece as gone to see what can take its place.
        </p>
      )}
      {items.map((item) => {
        const { name, about } = named.of(item.id)
        return (
          <ItemFields
            key={item.id}
            item={item}
            name={name}
            {...(about !== undefined && { about })}
            chambers={chambers}
            form={form}
          />
        )
      })}
      <PieceSearch
        name="find"
        label="Add a piece from the catalogue"
        hint="Its brand and model, or a part of them."
        text={find}
        kind={null}
        found={found}
        addLabel="Add"
      />
      <div className="flex flex-wrap items-end gap-2">
        <div className="min-w-56">
          <SelectField id="field-kind" name="kind" label="Or describe one yourself" options={ownKinds} />
        </div>
        <Button type="submit" formAction={paths.setupNew} name="add" value="own">
          Add it by its measures
        </Button>
      </div>
    </FormStep>
  )
}
