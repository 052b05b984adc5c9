/** The part of the page's query that the list is asked with; empty fields of a form say nothing. */
export function readPeopleSearch(search: URLSearchParams): string {
  const known = ['q', 'role', 'standing', 'cursor']
  const given = known.flatMap((key) => {
    const value = search.get(key)
    return value === null || value === '' ? [] : [[key, value]]
  })
  return new URLSearchParams(given).toString()
}
