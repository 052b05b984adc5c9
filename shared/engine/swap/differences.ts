import { getKind, type KindKey } from '../../kinds/index'
import { printValue } from '../../kinds/print-value'
import type { Attribute } from '../../kinds/types'
import type { Printer } from '../../units/print'
import { units } from '../../units/units'
import type { Specs } from '../types'
import type { Difference } from './types'

/** Sets are alike in any order; groups hold their fields in the order of their kind. */
const writeDown = ({ type }: Attribute, value: unknown): string =>
  JSON.stringify(type === 'set' && Array.isArray(value) ? value.map(String).sort() : value)

/** Kept with their attribute, since a catalogue is compared with what is gone piece by piece. */
const comparedOf = (kind: KindKey): readonly Attribute[] =>
  getKind(kind).attributes.filter(({ role }) => role !== 'display')

const isDifferent = (attribute: Attribute, from: Specs, to: Specs): boolean => {
  const [was, is] = [from[attribute.key]?.value, to[attribute.key]?.value]
  if (was === is) return false
  if (was === undefined || is === undefined) return true
  return typeof was !== typeof is || writeDown(attribute, was) !== writeDown(attribute, is)
}

/** In how many attributes that decide or are compared two pieces of a kind are not alike. */
export const countDifferences = (kind: KindKey, from: Specs, to: Specs): number =>
  comparedOf(kind).filter((attribute) => isDifferent(attribute, from, to)).length

/** Positive where `is` is more: a greater number, yes instead of no, a set that holds the other. */
function compare(was: unknown, is: unknown): number {
  if (typeof was === 'number' && typeof is === 'number') return is - was
  if (typeof was === 'boolean' && typeof is === 'boolean') return Number(is) - Number(was)
  if (!Array.isArray(was) || !Array.isArray(is)) return 0
  const holds = (whole: readonly unknown[], part: readonly unknown[]) => part.every((one) => whole.includes(one))
  return Number(holds(is, was)) - Number(holds(was, is))
}

function findSense({ better }: Attribute, was: unknown, is: unknown): Difference['sense'] {
  const more = compare(was, is)
  if (better === undefined || more === 0) return 'different'
  return more > 0 === (better === 'more') ? 'better' : 'worse'
}

function describe(attribute: Attribute, was: unknown, is: unknown, words: Printer): string {
  const label = `${attribute.label[0]?.toUpperCase()}${attribute.label.slice(1)}`
  if (was === undefined) return `${label}: ${printValue(attribute, is, words)}; what it was is not recorded.`
  if (is === undefined) return `${label}: not recorded, ${printValue(attribute, was, words)} before.`
  const [before, now] =
    attribute.type === 'measure' && typeof was === 'number' && typeof is === 'number'
      ? words.apart(was, is, attribute.unit)
      : [printValue(attribute, was, words), printValue(attribute, is, words)]
  return `${label}: ${now} instead of ${before}.`
}

/** Attribute by attribute, in the order of the kind, what decides or is compared and is not alike. */
export function findDifferences(kind: KindKey, from: Specs, to: Specs, words: Printer): readonly Difference[] {
  return comparedOf(kind)
    .filter((attribute) => isDifferent(attribute, from, to))
    .map((attribute): Difference => {
      const [was, is] = [from[attribute.key]?.value, to[attribute.key]?.value]
      return {
        key: attribute.key,
        label: attribute.label,
        from: was ?? null,
        to: is ?? null,
        unit: attribute.type === 'measure' ? units[attribute.unit].ucum : null,
        sense: findSense(attribute, was, is),
        message: describe(attribute, was, is, words),
      }
    })
}
