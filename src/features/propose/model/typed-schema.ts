import { z } from 'zod'
import type { UnitSystem } from '#shared/units/systems'
import { hasChanges, readTyped } from './read-typed'
import type { FormBase, TypedForm } from './typed-form'

/** The form as it is typed, read as the API takes it; every field that cannot be read is named at once. */
export function createTypedSchema(base: FormBase, system: UnitSystem) {
  return z.custom<TypedForm>().transform((typed, context) => {
    const read = readTyped(base, typed, system)
    for (const { path, message } of read.problems) {
      context.addIssue({ code: 'custom', path: path.split('.'), message })
    }
    if (read.problems.length === 0 && !hasChanges(read)) {
      const message = 'Nothing differs from the record yet: change a value, or say where one is from.'
      context.addIssue({ code: 'custom', path: ['root', 'unchanged'], message })
    }
    return read
  })
}
