import { readGroup, readGroups } from '../values'
import type { ChamberInput, Setup, TankInput } from '../types'

type Given = number | string | boolean

/** A value of the tank, of one of its chambers (`chambers.0.heightMm`) or of its sump. */
function giveTank(tank: TankInput, [key = '', part = '', field = '']: readonly string[], value: Given): TankInput {
  const { specs } = tank
  // Said by whoever said the rest, so that sizes are compared as closely as theirs.
  const source = Object.values(specs)[0]?.source ?? 'estimate'
  const put = (whole: unknown) => ({ ...tank, specs: { ...specs, [key]: { source, ...specs[key], value: whole } } })
  if (key === 'chambers') {
    const chambers = readGroups<ChamberInput>(specs, key) ?? []
    return put(chambers.map((chamber, index) => (String(index) === part ? { ...chamber, [field]: value } : chamber)))
  }
  return put(part === '' ? value : { ...readGroup(specs, key), [part]: value })
}

/** The setup as if its owner had said `value` at a dotted path; what follows from it by default follows anew. */
export function giveValue(setup: Setup, path: string, value: Given): Setup {
  const [section = '', key = '', ...rest] = path.split('.')
  if (section === 'tank') return { ...setup, tank: giveTank(setup.tank, [key, ...rest], value) }
  const was: Readonly<Record<string, unknown>> =
    setup[section as 'room' | 'mains' | 'water' | 'goals' | 'support'] ?? {}
  const whole = rest[0] === undefined ? value : (was[key] as readonly number[]).with(Number(rest[0]), value as number)
  return { ...setup, [section]: { ...was, [key]: whole } }
}
