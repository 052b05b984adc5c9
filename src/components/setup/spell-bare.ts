import { findLinkField } from '#shared/schemas/setup-link'
import type { Printer } from '#shared/units/print'
import type { CanonicalUnit } from '#shared/units/units'
import type { RawSetup } from './edit-raw'

const bareNumber = /^-?\d+(\.\d+)?$/

/** A bare number in a link is canonical, in a form it is in the person's own unit: on the way into one its unit is written out. */
export function spellBare(raw: RawSetup, printer: Printer): RawSetup {
  const texts = new Map(Object.entries(raw))
  const spell = (value: number, unit: CanonicalUnit) =>
    printer.measure(value, unit, { exact: true }).replaceAll('\u00a0', ' ')
  return Object.fromEntries(
    [...texts].map(([path, text]) => {
      const attribute = bareNumber.test(text) ? findLinkField(path, texts) : undefined
      return [path, attribute?.type === 'measure' ? spell(Number(text), attribute.unit) : text]
    }),
  )
}
