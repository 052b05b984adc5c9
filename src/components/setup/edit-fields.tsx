import { useState, type FormEvent } from 'react'
import { Button } from '../ui/button'
import type { Plan } from '#shared/engine/setup/plan'
import type { Printer } from '#shared/units/print'
import { changeRaw, removeChamber, spellOut, type RawSetup } from './edit-raw'
import { checkField } from './check-field'
import type { EditTarget } from './edit-target'
import { fieldId } from './field-groups'
import { readAssumed } from './assumed'
import { FieldControl } from './field-control'

export interface EditFieldsProps {
  readonly raw: RawSetup
  readonly plan: Plan
  readonly printer: Printer
  readonly target: EditTarget
  readonly onChange: (raw: RawSetup) => void
  readonly onDone: () => void
}

/** A few fields on their own: Enter applies, what cannot be read stays and says why. */
export function EditFields({ raw, plan, printer, target, onChange, onDone }: EditFieldsProps) {
  const { fields, title, chamber } = target
  const { system } = printer
  const [texts, setTexts] = useState<RawSetup>(() =>
    Object.fromEntries(fields.map(({ path }) => [path, raw[path] ?? ''])),
  )
  const [hasTried, setHasTried] = useState(false)
  const assumedOf = (path: string) => (raw[path] === undefined ? readAssumed(path, plan, printer) : undefined)
  const errorOf = ({ path, attribute }: (typeof fields)[number]) => checkField(texts[path] ?? '', attribute, system)
  const hasSaid = fields.some(({ path }) => raw[path] !== undefined)
  const only = fields.length === 1 ? fields[0] : undefined
  const assumed = only && assumedOf(only.path)

  const apply = (next: RawSetup) => {
    onChange(next)
    onDone()
  }
  const submit = (event: FormEvent) => {
    event.preventDefault()
    setHasTried(true)
    const wrong = fields.find((field) => errorOf(field) !== undefined)
    if (wrong) return document.getElementById(`edit-${fieldId(wrong.path)}`)?.focus()
    const spelt = fields.map(({ path, attribute }) => {
      const text = texts[path] ?? ''
      return [path, attribute.type === 'measure' && text.trim() !== '' ? spellOut(text, attribute, system) : text]
    })
    apply(changeRaw(raw, Object.fromEntries(spelt) as Record<string, string>))
  }

  return (
    <form onSubmit={submit} noValidate className="space-y-3">
      {!only && <p className="font-heading font-bold">{title}</p>}
      {fields.map((field) => (
        <FieldControl
          key={field.path}
          id={`edit-${fieldId(field.path)}`}
          path={field.path}
          attribute={field.attribute}
          text={texts[field.path] ?? ''}
          system={system}
          onChange={(text) => setTexts((earlier) => ({ ...earlier, [field.path]: text }))}
          error={hasTried ? errorOf(field) : undefined}
          assumed={assumedOf(field.path)?.shown}
        />
      ))}
      <div className="flex flex-wrap gap-2">
        <Button type="submit" variant="primary" size="sm">
          Apply
        </Button>
        {only && assumed && (
          <Button size="sm" onClick={() => apply(changeRaw(raw, { [only.path]: assumed.exact }))}>
            Yes, {assumed.shown}
          </Button>
        )}
        {hasSaid && chamber === undefined && (
          <Button
            size="sm"
            onClick={() => apply(changeRaw(raw, Object.fromEntries(fields.map(({ path }) => [path, '']))))}
          >
            Leave it open
          </Button>
        )}
        {chamber !== undefined && (
          <Button size="sm" onClick={() => apply(removeChamber(raw, chamber))}>
            Take the chamber out
          </Button>
        )}
      </div>
    </form>
  )
}
