import type { CatalogueEntry, Snapshot } from '../catalogue/build-snapshot'

interface Orders {
  readonly byId: ReadonlyMap<number, CatalogueEntry>
  /** Place of each id in the order of names. */
  readonly nameRank: ReadonlyMap<number, number>
}

function createOrders({ entries }: Snapshot): Orders {
  const named = entries.map((entry) => ({ entry, name: `${entry.gear.brand}\n${entry.gear.model}`.toLowerCase() }))
  named.sort((a, b) => (a.name < b.name ? -1 : a.name > b.name ? 1 : a.entry.id - b.entry.id))
  return {
    byId: new Map(entries.map((entry) => [entry.id, entry])),
    nameRank: new Map(named.map(({ entry }, rank) => [entry.id, rank])),
  }
}

const ordersOf = new WeakMap<Snapshot, Orders>()

/** Made once for each state of the catalogue. */
export function getOrders(snapshot: Snapshot): Orders {
  const orders = ordersOf.get(snapshot) ?? createOrders(snapshot)
  ordersOf.set(snapshot, orders)
  return orders
}

/** Places in an order: equal ones by name, what has no value last whichever way round. */
export function sortEntries(
  snapshot: Snapshot,
  entries: readonly CatalogueEntry[],
  sort: string,
): readonly CatalogueEntry[] {
  if (sort === 'relevance') return entries
  const { nameRank } = getOrders(snapshot)
  const sign = sort.startsWith('-') ? -1 : 1
  const key = sort.replace(/^-/, '')
  const rankOf = ({ id }: CatalogueEntry) => nameRank.get(id) ?? Infinity
  if (key === 'name') return entries.toSorted((a, b) => sign * (rankOf(a) - rankOf(b)))
  const valueOf = (entry: CatalogueEntry) => (key === 'updated' ? entry.updatedAt : entry.piece.specs[key]?.value)
  return entries.toSorted((a, b) => {
    const [first, second] = [valueOf(a), valueOf(b)]
    if (typeof first === 'number' && typeof second === 'number' && first !== second) return sign * (first - second)
    if (key === 'updated') return sign * (a.id - b.id)
    const known = Number(typeof second === 'number') - Number(typeof first === 'number')
    return known || rankOf(a) - rankOf(b)
  })
}
