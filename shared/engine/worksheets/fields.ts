import { getAttribute, type KindKey } from '../../kinds/index'
import { findSetupField } from '../../kinds/setup-fields'
import type { Attribute, FieldAttribute } from '../../kinds/types'
import type { WorksheetField } from './types'

type Changes = Partial<Pick<FieldAttribute, 'label' | 'guide'>> & { readonly plausible?: readonly [number, number] }

function toField(attribute: Attribute | undefined, name: string): FieldAttribute {
  if (attribute === undefined || attribute.type === 'group') throw new RangeError(`There is no single field ${name}`)
  return attribute
}

const createField = (
  path: string,
  attribute: FieldAttribute,
  changes: Changes,
  setupPath?: string,
): WorksheetField => ({
  path,
  ...(setupPath !== undefined && { setupPath }),
  // A measure's own range is all that can be changed beside its words.
  attribute: { ...attribute, key: path.split('.').at(-1) ?? path, ...changes },
})

/** Asks as the setup does for the value at `setupPath`. */
export const fromSetupField = (path: string, setupPath: string, changes: Changes = {}): WorksheetField =>
  createField(path, toField(findSetupField(setupPath)?.attribute, setupPath), changes, setupPath)

/** Asks as a kind's spec sheet does. */
export const fromKind = (path: string, kind: KindKey, key: string, changes: Changes = {}): WorksheetField =>
  createField(path, toField(getAttribute(kind, key), `${kind} ${key}`), changes)

/** Asks for one field of a group of a kind's spec sheet. */
export function fromGroup(path: string, kind: KindKey, group: string, key: string, changes: Changes = {}) {
  const found = getAttribute(kind, group)
  const fields = found?.type === 'group' ? found.fields : []
  return createField(
    path,
    toField(
      fields.find((field) => field.key === key),
      `${kind} ${group} ${key}`,
    ),
    changes,
  )
}

export const ownField = (path: string, attribute: FieldAttribute): WorksheetField => ({ path, attribute })

export const required = (field: WorksheetField): WorksheetField => ({ ...field, isRequired: true })
