import type { MeasureAttribute } from '#shared/kinds/types'
import type { UnitSystem } from '#shared/units/systems'
import { isSetupKey } from '#shared/schemas/setup-link-keys'
import { spellUnit } from '#shared/schemas/setup-link-values'

/** The setup as typed: texts by dotted path, chambers by their place. */
export type RawSetup = Readonly<Record<string, string>>

/** The entries of a query that belong to the setup, and the key that says how a form's bare numbers were meant. */
export function listSetupEntries(params: URLSearchParams): [string, string][] {
  return [...params].filter(([key]) => (isSetupKey(key) && key !== 'units') || key === 'typed')
}

/** Sets or (with an empty text) clears fields. */
export function changeRaw(raw: RawSetup, changes: Readonly<Record<string, string>>): RawSetup {
  const next = { ...raw, ...changes }
  return Object.fromEntries(Object.entries(next).filter(([, text]) => text.trim() !== ''))
}

const chamberPattern = /^tank\.chambers\.(\d+)\.(.+)$/

export function countChambers(raw: RawSetup): number {
  const places = Object.keys(raw).flatMap((path) => {
    const place = chamberPattern.exec(path)?.[1]
    return place === undefined ? [] : [Number(place) + 1]
  })
  return Math.max(0, ...places)
}

/** Takes one chamber out; those after it move up. */
export function removeChamber(raw: RawSetup, at: number): RawSetup {
  return Object.fromEntries(
    Object.entries(raw).flatMap(([path, text]): [string, string][] => {
      const [, place, key] = chamberPattern.exec(path) ?? []
      if (place === undefined) return [[path, text]]
      if (Number(place) === at) return []
      return [[Number(place) < at ? path : `tank.chambers.${Number(place) - 1}.${key}`, text]]
    }),
  )
}

/** As typed, with the unit that was meant: in a link a bare number is canonical, on the page it is in the person's own unit. */
export const spellOut = (text: string, attribute: MeasureAttribute, system: UnitSystem): string =>
  spellUnit(text.trim(), attribute, system)
