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

type Rank = readonly [place: number, inside: number, field: number]

function rankPath(path: string, itemPlaces: ReadonlyMap<string, number>): Rank {
  const [section, second = '', third = '', fourth] = path.split('.')
  if (section === 'items') {
    const field = itemFieldKeys.indexOf(third)
    return [setupFields.length, itemPlaces.get(second) ?? 0, field < 0 ? itemFieldKeys.length : field]
  }
  if (section !== 'tank' || second !== 'chambers') return [placeByPath.get(path) ?? setupFields.length - 1, 0, 0]
  const first = placeByPath.get('tank.chambers.*.id') ?? 0
  return [first, Number(third), placeByPath.get(`tank.chambers.*.${fourth}`) ?? 0]
}

/** As the form asks, then items as they came, each with its fields together. */
export function sortPaths(paths: readonly string[]): string[] {
  const itemPlaces = new Map<string, number>()
  for (const path of paths) {
    const [section, id = ''] = path.split('.')
    if (section === 'items' && !itemPlaces.has(id)) itemPlaces.set(id, itemPlaces.size)
  }
  return paths
    .map((path) => ({ path, rank: rankPath(path, itemPlaces) }))
    .sort(({ rank: a }, { rank: b }) => a[0] - b[0] || a[1] - b[1] || a[2] - b[2])
    .map(({ path }) => path)
}
