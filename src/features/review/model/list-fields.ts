import { identityAttributes } from '#shared/kinds/common'
import { getKind, isKindKey } from '#shared/kinds/index'
import type { Attribute } from '#shared/kinds/types'
import type { Proposal, ProposedField } from '#shared/schemas/proposals'

/** A value with whatever is known of where it is from. */
export type RecordedValue = Partial<NonNullable<ProposedField['now']>> & { readonly value?: unknown }

/** One thing that a proposal would change, as the desk decides about it. */
export interface DeskField {
  /** As a decision names it: `lengthMm`, `identity.model`. */
  readonly key: string
  readonly attribute: Attribute
  readonly state: ProposedField['state']
  readonly base: RecordedValue | null
  readonly now: RecordedValue | null
  /** Null: the value would be taken away. */
  readonly proposed: (Partial<NonNullable<ProposedField['proposed']>> & { readonly value: unknown }) | null
  readonly flags: Proposal['flags']
  /** Without brand and model there is no new piece: they stand and fall with the whole. */
  readonly isChoosable: boolean
}

const identityPrefix = 'identity.'

function listIdentityFields({ identity, identityNow }: Proposal): DeskField[] {
  const nowByKey: Readonly<Record<string, unknown>> = identityNow ?? {}
  const wanted: Readonly<Record<string, unknown>> = identity
  return identityAttributes.flatMap((attribute) => {
    const value = wanted[attribute.key]
    const now = nowByKey[attribute.key] ?? null
    if (value === undefined || (value ?? null) === now) return []
    return [
      {
        key: `${identityPrefix}${attribute.key}`,
        attribute,
        state: 'change' as const,
        base: null,
        now: now === null ? null : { value: now },
        proposed: value === null ? null : { value },
        flags: [],
        isChoosable: identityNow !== null || !['brand', 'model'].includes(attribute.key),
      },
    ]
  })
}

const belongsTo = (key: string, path: string): boolean => path === key || path.startsWith(`${key}.`)

/** What names the piece, then its values, conflicts and all, in the order of the spec sheet. */
export function listFields(proposal: Proposal): readonly DeskField[] {
  const attributes = isKindKey(proposal.kind) ? getKind(proposal.kind).attributes : []
  const values = attributes.flatMap((attribute) => {
    const field = proposal.fields[attribute.key]
    if (field === undefined) return []
    const flags = proposal.flags.filter(({ path }) => belongsTo(attribute.key, path))
    return [{ key: attribute.key, attribute, ...field, flags, isChoosable: true }]
  })
  return [...listIdentityFields(proposal), ...values]
}

/** How a key that a proposal changes is called. */
export function nameKey(kind: string, key: string): string {
  const attributes = [...identityAttributes, ...(isKindKey(kind) ? getKind(kind).attributes : [])]
  return attributes.find((attribute) => attribute.key === key.replace(identityPrefix, ''))?.label ?? key
}
