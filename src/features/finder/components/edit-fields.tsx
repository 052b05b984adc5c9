import { useState, type FormEvent } from 'react'
import { Button } from '../../../components/ui/button'
import type { Finder } from '../hooks/use-finder'
import { changeRaw, removeChamber, spellOut } from '../link/edit-raw'
import type { RawSetup } from '../link/finder-state'
import { checkField } from '../model/check-field'
import type { EditTarget } from '../model/edit-target'
import { fieldId } from '../model/field-groups'
import { readAssumed } from '../model/assumed'
import { FieldControl } from './field-control'

export interface EditFieldsProps {
  readonly finder: Finder
  readonly target: EditTarget
  readonly onDone: () => void
}

/** A few fields on their own: Enter applies, what cannot be read stays and says why. */
export function EditFields({ finder, target, onDone }: EditFieldsProps) {
  const { state, plan, printer, go } = finder
  const { fields, title, chamber } = target
  const { system } = printer
  const [texts, setTexts] = useState<RawSetup>(() =>
    Object.fromEntries(fields.map(({ path }) => [path, state.raw[path] ?? ''])),
  )
  const [hasTried, setHasTried] = useState(false)
  const assumedOf = (path: string) => (state.raw[path] === undefined ? readAssumed(path, plan, printer) : undefined)
  const errorOf = ({ path, attribute }: (typeof fields)[number]) => checkField(texts[path] ?? '', attribute, system)
  const hasSaid = fields.some(({ path }) => state.raw[path] !== undefined)
  const only = fields.length === 1 ? fields[0] : undefined
  const assumed = only && assumedOf(only.path)

  const apply = (raw: RawSetup) => {
    go({ raw })
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
    apply(changeRaw(state.raw, Object.fromEntries(spelt) as Record<string, string>))
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
          <Button size="sm" onClick={() => apply(changeRaw(state.raw, { [only.path]: assumed.exact }))}>
            Yes, {assumed.shown}
          </Button>
        )}
        {hasSaid && chamber === undefined && (
          <Button
            size="sm"
            onClick={() => apply(changeRaw(state.raw, Object.fromEntries(fields.map(({ path }) => [path, '']))))}
          >
            Leave it open
          </Button>
        )}
        {chamber !== undefined && (
          <Button size="sm" onClick={() => apply(removeChamber(state.raw, chamber))}>
            Take the chamber out
          </Button>
        )}
      </div>
    </form>
  )
}
