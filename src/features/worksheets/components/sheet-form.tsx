import { Form } from 'react-router-dom'
import type { WorksheetField } from '#shared/engine/worksheets/types'
import { FieldControl } from '../../../components/setup/field-control'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'
import type { Sheet } from '../hooks/use-sheet'
import { groupFields, groupRows, sheetFieldId, type FieldGroup, type RowGroup } from '../model/group-fields'
import { printAssumed } from '../model/print-assumed'

/** A worksheet's inputs: a plain form that works without scripts, and live with them. */
export function SheetForm({ sheet: shown }: { readonly sheet: Sheet }) {
  const { sheet, printer, texts } = shown
  const groups = groupFields(sheet)
  const rows = groupRows(sheet, texts)
  const asked = new Set(
    [...groups.flatMap(({ fields }) => fields), ...rows.flatMap((group) => group.rows.flat())].map(({ path }) => path),
  )
  const kept = Object.entries(texts).filter(([path]) => !asked.has(path))
  return (
    <Form
      action={paths.worksheet(sheet.name)}
      method="get"
      preventScrollReset
      noValidate
      onSubmit={shown.onSend}
      className="space-y-8"
    >
      <input type="hidden" name="typed" value={printer.system} />
      {kept.map(([path, text]) => (
        <input key={path} type="hidden" name={path} value={text} />
      ))}
      {rows.map((group) => (
        <Rows key={group.path} group={group} sheet={shown} />
      ))}
      {groups.map((group) => (
        <Group key={group.key} group={group} sheet={shown} />
      ))}
      <div className="print:hidden">
        <Button type="submit" variant="primary">
          Work it out
        </Button>
      </div>
    </Form>
  )
}

function Group({ group, sheet }: { readonly group: FieldGroup; readonly sheet: Sheet }) {
  return (
    <fieldset>
      <legend className="font-heading text-lg font-bold">{group.title}</legend>
      <div className="mt-2 grid gap-x-6 gap-y-4 sm:grid-cols-2">
        {group.fields.map((field) => (
          <SheetField key={field.path} field={field} sheet={sheet} />
        ))}
      </div>
    </fieldset>
  )
}

/** One row an entry; an empty one at the end makes the next. */
function Rows({ group, sheet }: { readonly group: RowGroup; readonly sheet: Sheet }) {
  const error = sheet.solved.errors.get(group.path)
  return (
    <fieldset
      id={sheetFieldId(group.path)}
      tabIndex={-1}
      aria-describedby={error && `${sheetFieldId(group.path)}-error`}
    >
      <legend className="font-heading text-lg font-bold">{group.title}</legend>
      {error && (
        <p id={`${sheetFieldId(group.path)}-error`} className="mt-1 text-sm font-semibold text-no">
          {error}
        </p>
      )}
      <ul className="mt-2 space-y-5">
        {group.rows.map((fields, place) => (
          <li key={place}>
            <fieldset>
              <legend className="text-sm text-ink-soft first-letter:uppercase">
                {group.label} {place + 1}
              </legend>
              <div className="mt-1 grid grid-cols-2 gap-x-4 gap-y-3">
                {fields.map((field) => (
                  <SheetField key={field.path} field={field} sheet={sheet} isBrief={place > 0} />
                ))}
              </div>
            </fieldset>
          </li>
        ))}
      </ul>
    </fieldset>
  )
}

interface SheetFieldProps {
  readonly field: WorksheetField
  readonly sheet: Sheet
  /** Where to measure was said above. */
  readonly isBrief?: boolean
}

function SheetField({ field: { path, attribute, isRequired }, sheet, isBrief = false }: SheetFieldProps) {
  const { texts, printer, solved, onType } = sheet
  const { guide: _, ...brief } = attribute
  const assumption = solved.working?.assumptions.find(({ key }) => key === path)
  return (
    <FieldControl
      id={sheetFieldId(path)}
      path={path}
      attribute={isBrief ? brief : attribute}
      text={texts[path] ?? ''}
      system={printer.system}
      onChange={(text) => onType(path, text)}
      error={solved.errors.get(path)}
      assumed={isRequired || !assumption ? undefined : printAssumed(assumption.value, attribute, printer)}
    />
  )
}
