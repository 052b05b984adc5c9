import { and, asc, desc, eq, inArray, isNull, like, lt, or, sql, type SQL } from 'drizzle-orm'
import { isKindKey } from '#shared/kinds/index'
import type { Candidate } from '#shared/search/rank-matches'
import { listTermReadings, type Search } from '#shared/search/read-search'
import { searchTextVersion } from '#shared/search/piece-terms'
import type { Database } from '../../db/database'
import { gear } from '../../db/schema/index'
import { toSearchColumns } from './search-columns'

/**
 * Names at least this like what was typed come into the shortlist; the ranking that follows is far stricter. Where the
 * closer ones are many, the others could not win, and comparing thousands of them takes most of a search's time.
 */
const nameLikenesses = [0.55, 0.45, 0.35]
const enoughNames = 20
/** One word alone is like many names. */
const wordLikeness = 0.42
const namesListed = 200
const codesListed = 100
/** More pieces with every word than this are not ranked one by one: those called so come first, the others follow. */
const wholeMatchesListed = 400

const toArray = (terms: readonly string[]): SQL => sql`${sql.param([...terms])}::text[]`

const hasAny = (terms: readonly string[]): SQL => sql`${gear.searchTerms} && ${toArray(terms)}`

const candidateColumns = {
  id: gear.id,
  kind: gear.kind,
  name: gear.searchName,
  code: gear.searchCode,
  gtin: gear.gtin,
  terms: sql<string>`array_to_string(${gear.searchTerms}, ' ')`,
}

interface CandidateRow {
  readonly id: number
  readonly kind: string
  readonly name: string
  readonly code: string
  readonly gtin: string | null
  readonly terms: string
}

function toCandidate({ id, kind, name, code, gtin, terms }: CandidateRow): Candidate | [] {
  return !isKindKey(kind)
    ? []
    : { id, kind, name: name.trim().split(' '), code, gtin, terms: new Set(terms.split(' ')) }
}

/** Neither merged into another piece nor retired. */
const isLive = and(isNull(gear.mergedInto), isNull(gear.retiredAt))

function ofKind(kind: string | undefined): SQL | undefined {
  return and(isLive, kind === undefined ? undefined : eq(gear.kind, kind))
}

/** The code itself, as a model, with its brand or as a barcode, and whatever begins with it. */
async function listByCode(db: Database, { code }: Search, kind: string | undefined): Promise<CandidateRow[]> {
  const begins = `${code}%`
  const isSame = or(eq(gear.searchCode, code), eq(gear.searchFullCode, code), eq(gear.gtin, code))
  return db
    .select(candidateColumns)
    .from(gear)
    .where(and(ofKind(kind), or(isSame, like(gear.searchCode, begins), like(gear.searchFullCode, begins))))
    .orderBy(desc(sql`${isSame} is true`), asc(gear.searchFullCode), asc(gear.id))
    .limit(codesListed)
}

/** The kind is a term too, so that one index answers all of it. */
function matchWhole(search: Search, kind: string | undefined): SQL | undefined {
  const isOfKind = kind === undefined ? undefined : hasAny([`kind:${kind}`])
  return and(isLive, isOfKind, or(...listTermReadings(search).map((reading) => and(...reading.map(hasAny)))))
}

/** All pieces that have everything that was typed. */
async function listWholeMatches(db: Database, search: Search, kind: string | undefined): Promise<number[]> {
  const [row] = await db
    .select({ ids: sql<number[]>`coalesce(array_agg(${gear.id}), '{}')` })
    .from(gear)
    .where(matchWhole(search, kind))
  return row?.ids ?? []
}

/** Where too many have everything, those that are called so. */
async function listSoCalled(db: Database, search: Search, kind: string | undefined): Promise<CandidateRow[]> {
  const words = search.tokens.map((token) => like(gear.searchName, `% ${token} %`))
  return db
    .select(candidateColumns)
    .from(gear)
    .where(and(matchWhole(search, kind), or(...words)))
    .orderBy(asc(gear.id))
    .limit(wholeMatchesListed)
}

/** The names likest to any of the texts, those first that have most of the words and measures. */
async function listLikeNames(
  db: Database,
  { spellings }: Search,
  kind: string | undefined,
  texts: readonly string[],
): Promise<CandidateRow[]> {
  const likenesses = texts.map((text) => sql`word_similarity(${text}, ${gear.searchName})`)
  const met = spellings.map((terms) => sql`(${hasAny(terms)})::int`)
  return db
    .select(candidateColumns)
    .from(gear)
    .where(and(ofKind(kind), or(...texts.map((text) => sql`${text} <% ${gear.searchName}`))))
    .orderBy(desc(sql`${sql.join(met, sql` + `)} + 2 * (${sql.join(likenesses, sql` + `)})`), asc(gear.id))
    .limit(namesListed)
}

export interface Shortlist {
  readonly candidates: readonly Candidate[]
  /** Have every word, and are too many to be ranked one by one; in no order. */
  readonly rest: readonly number[]
}

async function setLikeness(db: Database, likeness: number): Promise<void> {
  await db.execute(sql`select set_config('pg_trgm.word_similarity_threshold', ${String(likeness)}, true)`)
}

/** Where nothing is like the whole text: names that are like one of its longer words. */
export async function listByWords(
  db: Database,
  search: Search,
  kind: string | undefined,
): Promise<readonly Candidate[]> {
  if (search.nameWords.length === 0) return []
  return db.transaction(
    async (tx) => {
      await setLikeness(tx, wordLikeness)
      return (await listLikeNames(tx, search, kind, search.nameWords)).flatMap(toCandidate)
    },
    { accessMode: 'read only' },
  )
}

/** The names like the whole text: the closer ones, and where those are few the others too. */
async function listAlikeNames(tx: Database, search: Search, kind: string | undefined): Promise<CandidateRow[]> {
  let found: CandidateRow[] = []
  for (const likeness of nameLikenesses) {
    await setLikeness(tx, likeness)
    found = await listLikeNames(tx, search, kind, [search.nameText])
    if (found.length >= enoughNames) break
  }
  return found
}

/** Everything that may answer the search, found by indexes alone. */
export async function listCandidates(db: Database, search: Search, kind: string | undefined): Promise<Shortlist> {
  if (search.tokens.length === 0) return { candidates: [], rest: [] }
  return db.transaction(
    async (tx) => {
      const whole = await listWholeMatches(tx, search, kind)
      const isBroad = whole.length > wholeMatchesListed
      const byTerms = isBroad
        ? await listSoCalled(tx, search, kind)
        : whole.length === 0
          ? []
          : await tx.select(candidateColumns).from(gear).where(inArray(gear.id, whole))
      const byCode = await listByCode(tx, search, kind)
      const byName = isBroad || search.nameText.length < 3 ? [] : await listAlikeNames(tx, search, kind)
      const found = new Map([...byTerms, ...byCode, ...byName].map((row) => [row.id, row]))
      const rest = whole.filter((id) => !found.has(id))
      return { candidates: [...found.values()].flatMap(toCandidate), rest }
    },
    { accessMode: 'read only' },
  )
}

/** Writes some texts anew that an earlier release wrote; answers how many. */
export async function refreshSearchBatch(db: Database, limit: number): Promise<number> {
  return db.transaction(async (tx) => {
    const rows = await tx
      .select({ id: gear.id, kind: gear.kind, brand: gear.brand, model: gear.model, specs: gear.specs })
      .from(gear)
      .where(lt(gear.searchVersion, searchTextVersion))
      .orderBy(asc(gear.id))
      .limit(limit)
      .for('update', { skipLocked: true })
    for (const row of rows) await tx.update(gear).set(toSearchColumns(row)).where(eq(gear.id, row.id))
    return rows.length
  })
}
