import { getKind, type KindKey } from '#shared/kinds/index'
import type { Attribute } from '#shared/kinds/types'
import type { Provenance, Revision } from '#shared/schemas/gear'

/** A value in one revision, and who says so. */
export interface Recorded {
  readonly value: unknown
  readonly provenance: Provenance | undefined
}

export interface RevisionChange {
  readonly attribute: Attribute
  /** Null: not recorded. */
  readonly before: Recorded | null
  readonly after: Recorded | null
  /** The same value, said by somebody else or known better. */
  readonly isConfirmed: boolean
}

type Told = Pick<Revision, 'specs' | 'provenance'>

const nothing: Told = { specs: {}, provenance: {} }

function readRecorded({ specs, provenance }: Told, key: string): Recorded | null {
  const value = specs[key]
  return value === undefined ? null : { value, provenance: provenance[key] }
}

/** Values arrive from JSON, groups with their fields in one order: the texts are equal where the values are. */
const isSame = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b)

/** The revision that a value was set by is not part of what is said of it. */
function tellsSame(a: Provenance | undefined, b: Provenance | undefined): boolean {
  const told = (provenance: Provenance | undefined) =>
    provenance && [provenance.source, provenance.plusMinus, provenance.evidence, provenance.date, provenance.author]
  return isSame(told(a), told(b))
}

/** What the later of two revisions says otherwise, in the order of the kind's attributes. */
export function findRevisionChanges(kind: KindKey, before: Told | null, after: Told): readonly RevisionChange[] {
  return getKind(kind).attributes.flatMap((attribute) => {
    const was = readRecorded(before ?? nothing, attribute.key)
    const is = readRecorded(after, attribute.key)
    const isValueSame = isSame(was?.value, is?.value)
    if (isValueSame && tellsSame(was?.provenance, is?.provenance)) return []
    return [{ attribute, before: was, after: is, isConfirmed: isValueSame }]
  })
}
