import { readGroup, readGroups } from '../values'
import type { Plan } from './plan'

/** The number at a dotted setup path, said or assumed; undefined where there is none. */
export function findSaidNumber({ setup, assumed }: Plan, path: string): number | undefined {
  const value = assumed.get(path) ?? findGiven(setup, path.split('.'))
  return typeof value === 'number' ? value : undefined
}

function findGiven(setup: Plan['setup'], [section, key = '', ...rest]: readonly string[]): unknown {
  const { specs } = setup.tank
  if (section === 'tank' && rest.length === 0) return specs[key]?.value
  if (section === 'tank') {
    const [first = '', field = first] = rest
    const group = rest.length > 1 ? readGroups<object>(specs, key)?.[Number(first)] : readGroup<object>(specs, key)
    return (group as Readonly<Record<string, unknown>> | undefined)?.[field]
  }
  const part = setup[section as 'room' | 'mains' | 'water' | 'goals' | 'support']
  const value = (part as Readonly<Record<string, unknown>> | undefined)?.[key]
  return rest[0] === undefined ? value : (value as readonly unknown[] | undefined)?.[Number(rest[0])]
}
