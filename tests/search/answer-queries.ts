import type pg from 'pg'
import { gearListSchema } from '../../shared/schemas/gear'
import type { JudgedPiece } from './grade-pieces'
import { judgedQueries, type JudgedQuery } from './judged-queries'
import { scoreQuery, type Answered, type QueryScore } from './score-class'

async function answerQuery(url: string, judged: JudgedQuery): Promise<Answered> {
  const address = `${url}/api/v1/gear?${new URLSearchParams({ q: judged.query, limit: '10' })}`
  const before = performance.now()
  const response = await fetch(address)
  const body: unknown = await response.json()
  const milliseconds = performance.now() - before
  if (!response.ok) throw new Error(`"${judged.query}" was answered ${response.status}`)
  return { judged, slugs: gearListSchema.parse(body).items.map(({ slug }) => slug), milliseconds }
}

/** Sends every judged query to a running app, one after the other, and scores the answers. */
export async function answerQueries(url: string, pool: pg.Pool): Promise<readonly QueryScore[]> {
  const { rows } = await pool.query<JudgedPiece>('SELECT slug, kind, specs FROM gear')
  const catalogue = new Map(rows.map((piece) => [piece.slug, piece]))
  const [first] = judgedQueries
  if (first !== undefined) await answerQuery(url, first)
  const scores: QueryScore[] = []
  for (const judged of judgedQueries) scores.push(scoreQuery(await answerQuery(url, judged), catalogue))
  return scores
}
