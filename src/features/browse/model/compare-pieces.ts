import { getKind, type KindKey } from '#shared/kinds/index'
import type { Attribute, MeasureAttribute, Role } from '#shared/kinds/types'
import type { GearItem } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { printValue } from '#shared/kinds/print-value'

/** A number of each piece, to be drawn to one scale; null: nobody has recorded it. */
export interface MeasureDifference {
  readonly type: 'measure'
  readonly attribute: MeasureAttribute
  readonly values: readonly (number | null)[]
}

/** What each piece is or has, in words. */
export interface WordDifference {
  readonly type: 'words'
  readonly attribute: Attribute
  readonly words: readonly (string | null)[]
}

export type Difference = MeasureDifference | WordDifference

export interface RoleDifferences {
  readonly role: Role
  readonly differences: readonly Difference[]
  /** The same in all: "thermostat built in". */
  readonly alike: readonly string[]
  /** Labels of what is recorded of none. */
  readonly unknown: readonly string[]
}

const roles = ['check', 'difference', 'display'] as const

function compareAttribute(attribute: Attribute, pieces: readonly GearItem[], printer: Printer): Difference {
  const values = pieces.map(({ specs }) => specs[attribute.key])
  if (attribute.type === 'measure')
    return { type: 'measure', attribute, values: values.map((value) => (typeof value === 'number' ? value : null)) }
  const words = values.map((value) => (value === undefined ? null : printValue(attribute, value, printer)))
  return { type: 'words', attribute, words }
}

const listShown = (difference: Difference, printer: Printer): readonly (string | null)[] =>
  difference.type === 'words'
    ? difference.words
    : difference.values.map((value) => (value === null ? null : printer.measure(value, difference.attribute.unit)))

/** How pieces of one kind differ, what decides first; what is the same in all is said once. */
export function comparePieces(
  kind: KindKey,
  pieces: readonly GearItem[],
  printer: Printer,
): readonly RoleDifferences[] {
  return roles.flatMap((role) => {
    const compared = getKind(kind)
      .attributes.filter((attribute) => attribute.role === role)
      .map((attribute) => compareAttribute(attribute, pieces, printer))
    const differences: Difference[] = []
    const alike: string[] = []
    const unknown: string[] = []
    for (const difference of compared) {
      const shown = listShown(difference, printer)
      const [first] = shown
      if (shown.every((each) => each === null)) unknown.push(difference.attribute.label)
      else if (first && shown.every((each) => each === first)) alike.push(`${difference.attribute.label} ${first}`)
      else differences.push(difference)
    }
    return compared.length === 0 ? [] : [{ role, differences, alike, unknown }]
  })
}
