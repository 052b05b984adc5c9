import { setupFields } from '../kinds/setup-fields'
import { itemFieldKeys } from './setup-link-items'

const sections = new Set(['name', 'units', 'country', 'tank', 'support', 'room', 'mains', 'water', 'goals', 'items'])
const placeByPath = new Map(setupFields.map(({ path }, place) => [path, place]))

/** Whether a query key belongs to the setup rather than to the page that carries it. */
export function isSetupKey(key: string): boolean {
  return sections.has(key.split('.', 1)[0] ?? '')
}

/** Chambers may be named by place or by id; from here on they go by place, and an id becomes a field of its own. */
export function numberChambers(entries: readonly (readonly [string, string])[]): [string, string][] {
  const words = new Set<string>()
  for (const [key] of entries) {
    const [tank, chambers, word] = key.split('.')
    if (tank === 'tank' && chambers === 'chambers' && word !== undefined) words.add(word)
  }
  const isPlace = (word: string) => /^\d{1,3}$/.test(word)
  const byPlace = [...words].filter(isPlace).sort((a, b) => Number(a) - Number(b))
  const order = [...byPlace, ...[...words].filter((word) => !isPlace(word))]
  const numbered = entries.map(([key, text]): [string, string] => {
    const [tank, chambers, word, ...rest] = key.split('.')
    if (tank !== 'tank' || chambers !== 'chambers' || word === undefined) return [key, text]
    return [['tank', 'chambers', order.indexOf(word), ...rest].join('.'), text]
  })
  const known = new Set(numbered.map(([key]) => key))
  const ids = order.map((word, place): [string, string] => [
    `tank.chambers.${place}.id`,
    isPlace(word) ? `rear-${place + 1}` : word,
  ])
  return [...numbered, ...ids.filter(([key]) => !known.has(key))]
}

/** Where a key stands in the canonical link: as the form asks, then items as they came. */
export function comparePaths(a: string, b: string): number {
  const [placeA, placeB] = [rankPath(a), rankPath(b)]
  return placeA[0] - placeB[0] || placeA[1] - placeB[1] || placeA[2] - placeB[2]
}

function rankPath(path: string): readonly [number, number, number] {
  const words = path.split('.')
  if (words[0] === 'items') {
    const place = itemFieldKeys.indexOf(words[2] ?? '')
    return [setupFields.length, 0, place < 0 ? itemFieldKeys.length : place]
  }
  if (words[1] !== 'chambers') return [placeByPath.get(path) ?? setupFields.length - 1, 0, 0]
  const first = placeByPath.get('tank.chambers.*.id') ?? 0
  const field = placeByPath.get(`tank.chambers.*.${words[3]}`) ?? 0
  return [first, Number(words[2]), field]
}
