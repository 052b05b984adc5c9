import type { FieldAttribute, Option } from '#shared/kinds/types'
import { describeExample } from '#shared/units/examples'
import type { UnitSystem } from '#shared/units/systems'
import { MeasureField } from '../ui/measure-field'
import { SelectField } from '../ui/select-field'
import { TextField } from '../ui/text-field'
import { echoField } from './check-field'
import { capitalise } from '../../lib/capitalise'

export interface FieldControlProps {
  readonly id: string
  readonly path: string
  readonly attribute: FieldAttribute
  readonly text: string
  readonly system: UnitSystem
  readonly onChange: (text: string) => void
  readonly error?: string | undefined
  /** What is taken while the field is empty, in words. */
  readonly assumed?: string | undefined
  /** Instead of a bare example, where that could be taken for a value. */
  readonly placeholder?: string
}

const yesNo = [
  { value: 'yes', label: 'yes' },
  { value: 'no', label: 'no' },
]

/** A link may hold what is no option: it stays in sight until something else is chosen. */
const keepTyped = (options: readonly Option[], text: string): readonly Option[] =>
  text === '' || options.some(({ value }) => value === text)
    ? options
    : [...options, { value: text, label: `“${text}”` }]

/** One thing to say of a setup, asked for as its sort demands. The text stays as it was typed. */
export function FieldControl(props: FieldControlProps) {
  const { id, path, attribute, text, system, onChange, error, assumed } = props
  const shared = {
    id,
    name: path,
    label: capitalise(attribute.label),
    hint: attribute.guide,
    error,
    value: text,
    onChange,
  }
  const taken = assumed === undefined ? 'not said' : `${assumed}, assumed`
  switch (attribute.type) {
    case 'measure':
      return (
        <MeasureField
          {...shared}
          echo={echoField(text, attribute, system) ?? (text.trim() === '' && assumed !== undefined ? taken : '')}
          placeholder={props.placeholder ?? describeExample(attribute.unit, system)}
        />
      )
    case 'choice':
      return <SelectField {...shared} options={keepTyped(attribute.options, text)} emptyLabel={taken} />
    case 'boolean':
      return <SelectField {...shared} options={keepTyped(yesNo, text)} emptyLabel={taken} />
    case 'set':
      return <SetControl {...props} />
    case 'text':
    case 'texts':
      return <TextField {...shared} {...(attribute.type === 'text' && { maxLength: attribute.maxLength })} />
  }
}

/** Checkboxes of one name; "none of these" is an answer too, and not the same as saying nothing. */
function SetControl({ id, path, attribute, text, onChange, error, assumed }: FieldControlProps) {
  if (attribute.type !== 'set') return null
  const chosen = new Set(text.split(',').map((part) => part.trim()))
  const toggle = (value: string, isOn: boolean) => {
    if (value === 'none') return onChange(isOn ? 'none' : '')
    const kept = attribute.options.map((option) => option.value).filter((each) => each !== value && chosen.has(each))
    onChange([...kept, ...(isOn ? [value] : [])].join(','))
  }
  const boxes = [...attribute.options, { value: 'none', label: 'none of these' }]
  return (
    <fieldset id={id} tabIndex={-1} aria-describedby={error ? `${id}-error` : undefined}>
      <legend className="text-sm font-semibold">{capitalise(attribute.label)}</legend>
      {attribute.guide && <p className="text-sm text-ink-soft">{attribute.guide}</p>}
      <div className="mt-1 flex flex-wrap gap-x-5">
        {boxes.map((option) => (
          <label key={option.value} className="flex min-h-9 items-center gap-2">
            <input
              type="checkbox"
              name={path}
              value={option.value}
              checked={chosen.has(option.value)}
              onChange={(event) => toggle(option.value, event.target.checked)}
              className="size-4 accent-action"
            />
            {option.label}
          </label>
        ))}
      </div>
      {error ? (
        <p id={`${id}-error`} className="text-sm font-semibold text-no">
          {error}
        </p>
      ) : (
        text.trim() === '' &&
        assumed !== undefined && <p className="font-mono text-xs text-ink-soft">{assumed}, assumed</p>
      )}
    </fieldset>
  )
}
