import { rankMatches, type Candidate, type Match } from '#shared/search/rank-matches'
import { readSearch, type Search } from '#shared/search/read-search'
import type { Database } from '../../db/database'
import { listByWords, listCandidates, refreshSearchBatch } from './gear-search.queries'

export interface SearchResult {
  readonly search: Search
  /** The pieces that answer, best first. */
  readonly ids: readonly number[]
  /** More that have every word, in no order; they come after the others. */
  readonly rest: readonly number[]
}

function rankByName(search: Search, candidates: readonly Candidate[]): readonly Match[] {
  const named = candidates.map((candidate) => ({ candidate, key: candidate.name.join(' ') }))
  named.sort((a, b) => (a.key < b.key ? -1 : a.key > b.key ? 1 : a.candidate.id - b.candidate.id))
  return rankMatches(
    search,
    named.map(({ candidate }) => candidate),
  )
}

export async function searchCatalogue(db: Database, text: string, kind: string | undefined): Promise<SearchResult> {
  const search = readSearch(text)
  const { candidates, rest } = await listCandidates(db, search, kind)
  const found = rankByName(search, candidates)
  const isFound = found.length + rest.length > 0
  const matches = isFound ? found : rankByName(search, await listByWords(db, search, kind))
  return { search, ids: matches.map(({ id }) => id), rest }
}

const rowsPerBatch = 200

/** Brings the texts up to date that an earlier release wrote. Two processes at once share the work. */
export async function refreshSearchTexts(db: Database): Promise<number> {
  let refreshed = 0
  for (let count = rowsPerBatch; count === rowsPerBatch; refreshed += count) {
    count = await refreshSearchBatch(db, rowsPerBatch)
  }
  return refreshed
}
