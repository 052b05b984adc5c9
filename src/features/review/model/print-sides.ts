import { printValue } from '#shared/kinds/print-value'
import type { Printer } from '#shared/units/print'
import type { DeskField } from './list-fields'

export interface Sides {
  readonly base: string | null
  readonly now: string | null
  readonly proposed: string | null
}

/** The sides of a field in the reader's units; numbers that differ are written so that they look different. */
export function printSides({ attribute, base, now, proposed }: DeskField, printer: Printer): Sides {
  const print = (side: { readonly value?: unknown } | null) =>
    side === null ? null : printValue(attribute, side.value, printer)
  const sides = { base: print(base), now: print(now), proposed: print(proposed) }
  if (attribute.type !== 'measure' || typeof proposed?.value !== 'number') return sides
  const apartFrom = (side: { readonly value?: unknown } | null) =>
    typeof side?.value === 'number' ? printer.apart(side.value, Number(proposed.value), attribute.unit) : null
  const pair = apartFrom(now) ?? apartFrom(base)
  return {
    base: apartFrom(base)?.[0] ?? sides.base,
    now: apartFrom(now)?.[0] ?? sides.now,
    proposed: pair?.[1] ?? sides.proposed,
  }
}
