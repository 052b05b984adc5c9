import { padGtin } from '#shared/schemas/gtin'
import type { Duplicates, DuplicatesQuery } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { listPieces } from '../gear/gear.service'
import { searchCatalogue } from '../gear/gear-search.service'

const mostListed = 6

/** Letters and digits alone: how a name is written says nothing about what it names. */
const flatten = (text: string): string =>
  text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]/gu, '')

const isSameGtin = (a: string | null, b: string | undefined): boolean =>
  a !== null && b !== undefined && padGtin(a) === padGtin(b)

/** Pieces that may be the one somebody is about to add: the surest first. */
export async function findDuplicates(db: Database, query: DuplicatesQuery): Promise<Duplicates> {
  const { kind, brand = '', model = '', gtin } = query
  const text = `${brand} ${model}`.trim()
  const searches = [text, gtin ?? ''].filter((words) => words !== '')
  const found = await Promise.all(searches.map((words) => searchCatalogue(db, words, kind)))
  const ids = [...new Set(found.flatMap((result) => result.ids.slice(0, mostListed * 2)))]
  const items = (await listPieces(db, ids)).map((row) => {
    const isSameName = flatten(`${row.brand}${row.model}`) === flatten(text)
    const match = isSameGtin(row.gtin, gtin) ? 'gtin' : isSameName ? 'name' : 'alike'
    return { slug: row.slug, kind: row.kind, brand: row.brand, model: row.model, gtin: row.gtin, match } as const
  })
  const order = ['gtin', 'name', 'alike']
  return { items: items.toSorted((a, b) => order.indexOf(a.match) - order.indexOf(b.match)).slice(0, mostListed) }
}
