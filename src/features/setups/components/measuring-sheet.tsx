import { Form, Link, useLocation } from 'react-router-dom'
import { getKind, isKindKey, kindKeys, kinds, type KindKey } from '#shared/kinds/index'
import type { FieldAttribute, GroupAttribute } from '#shared/kinds/types'
import { findSketch, MeasureSketch } from '../../../components/drawings/measure-sketch'
import { Button } from '../../../components/ui/button'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import { usePrinter } from '../../../lib/use-printer'

/** The kind that a sheet is asked for; a tank's, where none or no such is named. */
export const readSheetKind = (params: URLSearchParams): KindKey => {
  const kind = params.get('kind') ?? ''
  return isKindKey(kind) ? kind : 'tank'
}

const isField = (field: GroupAttribute['fields'][number]): field is FieldAttribute => field.type !== 'group'

function listLines(kind: KindKey) {
  return getKind(kind)
    .attributes.filter(({ role }) => role === 'check')
    .map((attribute) => ({
      attribute,
      fields: attribute.type === 'group' ? attribute.fields.filter(isField).filter(({ key }) => key !== 'id') : [],
    }))
}

/** An empty line to write on. */
function Blank() {
  return (
    <span aria-hidden="true" className="block min-w-24 border-b-[1.5px] border-ink-soft">
      &nbsp;
    </span>
  )
}

/** What to measure of a kind of gear, where, and room to write it down. */
export function MeasuringSheet() {
  const { search } = useLocation()
  const printer = usePrinter()
  const kind = readSheetKind(new URLSearchParams(search))
  const { label } = getKind(kind)
  const unitOf = (field: FieldAttribute) => (field.type === 'measure' ? printer.unitLabel(field.unit) : '')
  const choices = (field: FieldAttribute) =>
    'options' in field
      ? field.options.map((option) => option.label).join(' · ')
      : field.type === 'boolean'
        ? 'yes · no'
        : ''
  return (
    <>
      <h1>Measuring sheet: {label}</h1>
      <p className="mt-2 max-w-prose">
        Print it, take it to the {kind === 'tank' ? 'tank' : 'piece'}, and write down what you can. Any unit will do;
        note which. What you cannot reach stays empty.
      </p>
      <Form
        action={paths.measuringSheet}
        method="get"
        preventScrollReset
        className="mt-4 flex flex-wrap items-end gap-2 print:hidden"
      >
        <div className="min-w-56">
          <SelectField
            key={kind}
            id="sheet-kind"
            name="kind"
            label="Sheet for"
            defaultValue={kind}
            options={kindKeys.map((key) => ({ value: key, label: kinds[key].label }))}
          />
        </div>
        <Button type="submit">Show</Button>
        <Link to={paths.setupNew} className="link ml-2 min-h-11 content-center">
          To the form
        </Link>
      </Form>
      <p className="mt-5 hidden grid-cols-2 gap-6 print:grid">
        <span>
          Brand and model <Blank />
        </span>
        <span>
          Measured on, by <Blank />
        </span>
      </p>
      <ul className="mt-5 border-t border-rule">
        {listLines(kind).map(({ attribute, fields }) => {
          const shape = findSketch(attribute.key, kind)
          return (
            <li
              key={attribute.key}
              className="grid gap-x-5 gap-y-2 border-b border-rule py-3 sm:grid-cols-[4rem_minmax(0,1fr)_minmax(0,1fr)] print:grid-cols-[4rem_minmax(0,1fr)_minmax(0,1fr)]"
            >
              <span>{shape && <MeasureSketch shape={shape} />}</span>
              <span className="min-w-0">
                <span className="block font-semibold first-letter:uppercase">{attribute.label}</span>
                {attribute.guide && <span className="block text-sm text-ink-soft">{attribute.guide}</span>}
              </span>
              {attribute.type === 'group' ? (
                <ul className="space-y-1.5 text-sm">
                  {fields.map((field) => (
                    <li key={field.key} className="grid grid-cols-[minmax(0,1fr)_7rem] items-end gap-2">
                      <span className="min-w-0">{field.label}</span>
                      <span className="flex items-end gap-1">
                        <Blank />
                        <span className="text-ink-soft">{unitOf(field)}</span>
                      </span>
                    </li>
                  ))}
                </ul>
              ) : choices(attribute) ? (
                <span className="self-end text-sm text-ink-soft">Circle: {choices(attribute)}</span>
              ) : (
                <span className="flex items-end gap-2 self-end">
                  <Blank />
                  <span className="text-sm text-ink-soft">{unitOf(attribute)}</span>
                </span>
              )}
            </li>
          )
        })}
      </ul>
    </>
  )
}
