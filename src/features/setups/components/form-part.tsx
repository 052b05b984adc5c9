import type { ReactNode } from 'react'
import { Disclosure } from '../../../components/ui/disclosure'
import type { FormPart } from '../model/form-sections'
import { FieldGrid, type FormTexts } from './field-grid'

export interface FormPartFieldsProps {
  readonly part: FormPart
  readonly form: FormTexts
  readonly id?: string
  readonly children?: ReactNode
}

/** Some fields under one legend, with those that most people leave open folded away until one of them says something. */
export function FormPartFields({ part, form, id, children }: FormPartFieldsProps) {
  const { title, fields, more } = part
  const isSaid = more.some(({ path }) => (form.texts[path] ?? '') !== '' || form.errors.has(path))
  return (
    <fieldset id={id} tabIndex={id === undefined ? undefined : -1} className="outline-offset-4">
      <legend className="font-heading text-lg font-bold">{title}</legend>
      {children}
      {fields.length > 0 && <FieldGrid fields={fields} form={form} />}
      {more.length > 0 && (
        <div className="mt-3">
          <Disclosure summary={`${title}: ${fields.length > 0 ? 'more' : 'say more'}`} isOpen={isSaid}>
            <FieldGrid fields={more} form={form} />
          </Disclosure>
        </div>
      )}
    </fieldset>
  )
}
