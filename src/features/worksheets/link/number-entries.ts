const entryPattern = /^(\w+)\.(\d{1,3})\.(.+)$/

/** Entries of lists in the order of their places, with no place left out: an empty row of a form is no entry. */
export function numberEntries(entries: readonly (readonly [string, string])[]): [string, string][] {
  const placesOf = new Map<string, Set<number>>()
  for (const [key] of entries) {
    const [, list, place] = entryPattern.exec(key) ?? []
    if (list === undefined) continue
    const places = placesOf.get(list) ?? new Set()
    placesOf.set(list, places.add(Number(place)))
  }
  const orderOf = new Map([...placesOf].map(([list, places]) => [list, [...places].sort((a, b) => a - b)]))
  return entries.map(([key, text]) => {
    const [, list = '', place, rest] = entryPattern.exec(key) ?? []
    const order = orderOf.get(list)
    return order === undefined ? [key, text] : [`${list}.${order.indexOf(Number(place))}.${rest}`, text]
  })
}
