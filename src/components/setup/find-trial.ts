import type { Turn } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { findScaleUnit } from '../drawings/scale-unit'
import { changeRaw, type RawSetup } from './edit-raw'

/** Whether the link holds the whole that a number is part of: one number of a catalogue's tank or piece cannot be said alone. */
function canSay(path: string, raw: RawSetup): boolean {
  const [section, key = '', ...rest] = path.split('.')
  if (section === 'items') return raw[`items.${key}.gear`] === undefined
  if (section !== 'tank' || rest.length === 0 || raw['tank.gear'] === undefined) return true
  return Object.keys(raw).some((one) => one.startsWith(`tank.${key}.`))
}

/** The setup as typed with the number that would turn a verdict; undefined where a link cannot say that. */
export function findTrial({ path, to, unit }: Turn, raw: RawSetup, printer: Printer): RawSetup | undefined {
  if (!canSay(path, raw)) return undefined
  // As it would be typed, with an ordinary space.
  const typed = printer.measure(to, findScaleUnit(unit), { exact: true }).replaceAll('\u00a0', ' ')
  return changeRaw(raw, { [path]: typed })
}
