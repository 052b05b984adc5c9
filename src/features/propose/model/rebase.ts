import { getAttribute, getKind, type KindKey } from '#shared/kinds/index'
import type { Attribute, GroupAttribute } from '#shared/kinds/types'
import { printValue } from '#shared/kinds/print-value'
import type { Gear } from '#shared/schemas/gear'
import type { ProposedValues } from '#shared/schemas/proposed-values'
import { spellUnit } from '#shared/schemas/setup-link-values'
import type { Printer } from '#shared/units/print'
import type { UnitSystem } from '#shared/units/systems'
import { isSameTyped } from './compare-typed'
import { createBase, type FormBase, type TypedForm, type TypedSpec } from './typed-form'

/** One thing that somebody else changed since the form was opened. */
export interface Meanwhile {
  readonly key: string
  readonly label: string
  readonly was: string
  readonly now: string
  /** What stands in the form, where it was changed there too. */
  readonly mine: string | null
}

const isEqual = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b)

const print = (attribute: Attribute, value: unknown, printer: Printer): string =>
  value === undefined || value === null ? 'not known' : printValue(attribute, value, printer)

/** What changed on the record since, field by field. */
export function findMeanwhile(
  base: FormBase,
  now: Gear,
  values: ProposedValues,
  printer: Printer,
): readonly Meanwhile[] {
  const before = base.gear?.specs ?? {}
  return getKind(base.kind).attributes.flatMap((attribute) => {
    const { key, label } = attribute
    if (isEqual(before[key], now.specs[key])) return []
    const mine = key in values ? print(attribute, values[key]?.value, printer) : null
    return [
      { key, label, was: print(attribute, before[key], printer), now: print(attribute, now.specs[key], printer), mine },
    ]
  })
}

/** As `findMeanwhile`, of a proposal that another tab or device changed. */
export function findAmended(
  kind: KindKey,
  saved: ProposedValues,
  now: ProposedValues,
  mine: ProposedValues,
  printer: Printer,
): readonly Meanwhile[] {
  return getKind(kind).attributes.flatMap((attribute) => {
    const { key, label } = attribute
    if (isEqual(saved[key], now[key])) return []
    const show = (values: ProposedValues) =>
      key in values ? print(attribute, values[key]?.value, printer) : 'no change'
    const own = isEqual(mine[key], now[key]) ? null : show(mine)
    return [{ key, label, was: show(saved), now: show(now), mine: own }]
  })
}

/** The same typing upon the record as it is now: what was not touched follows, what was typed stays. */
export function rebaseTyped(base: FormBase, typed: TypedForm, now: Gear, printer: Printer) {
  const next = createBase(base.kind, now, printer)
  const specs = Object.fromEntries(
    Object.entries(typed.specs).map(([key, spec]) => {
      const [was, is] = [base.typed.specs[key], next.typed.specs[key]]
      if (!was || !is || !isSameTyped(spec, was)) return [key, spec]
      return [key, { ...spec, text: is.text, entries: is.entries }]
    }),
  )
  const identity = Object.fromEntries(
    Object.entries(typed.identity).map(([key, text]) => {
      const at = key as keyof TypedForm['identity']
      return [key, text === base.typed.identity[at] ? next.typed.identity[at] : text]
    }),
  ) as unknown as TypedForm['identity']
  return { base: next, typed: { ...typed, specs, identity } }
}

function spellEntry(group: GroupAttribute, entry: Readonly<Record<string, string>>, from: UnitSystem) {
  return Object.fromEntries(
    Object.entries(entry).map(([key, text]) => {
      const field = group.fields.find((one) => one.key === key)
      return [key, field?.type === 'measure' ? spellUnit(text, field, from) : text]
    }),
  )
}

export function spellSpec(attribute: Attribute | undefined, spec: TypedSpec, from: UnitSystem): TypedSpec {
  if (attribute?.type === 'measure') return { ...spec, text: spellUnit(spec.text, attribute, from) }
  if (attribute?.type !== 'group') return spec
  return { ...spec, entries: spec.entries.map((entry) => spellEntry(attribute, entry, from)) }
}

/** The form in the units of the other system: what was not touched is printed anew, bare numbers keep the unit they had. */
export function respellTyped(base: FormBase, typed: TypedForm, from: UnitSystem, printer: Printer) {
  const next = createBase(base.kind, base.gear, printer)
  const specs = Object.fromEntries(
    Object.entries(typed.specs).map(([key, spec]) => {
      const [was, is] = [base.typed.specs[key], next.typed.specs[key]]
      if (was && is && isSameTyped(spec, was)) return [key, { ...spec, text: is.text, entries: is.entries }]
      return [key, spellSpec(getAttribute(base.kind, key), spec, from)]
    }),
  )
  return { base: next, typed: { ...typed, specs } }
}
