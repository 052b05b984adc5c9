import { gradePiece, type JudgedPiece } from './grade-pieces'
import type { JudgedQuery } from './judged-queries'

export interface Answered {
  readonly judged: JudgedQuery
  /** Best first; ten are enough. */
  readonly slugs: readonly string[]
  readonly milliseconds: number
}

export interface ClassScore {
  readonly queries: number
  /** Of those that have an answer. */
  readonly ndcg: number
  readonly mrr: number
  readonly zeroRate: number
  readonly p95Ms: number
}

const depth = 10

/** Gain 2^grade − 1, discount log2(rank + 1): Burges et al., "Learning to Rank using Gradient Descent", ICML 2005. */
function sumGains(grades: readonly number[]): number {
  return grades.slice(0, depth).reduce((sum, grade, index) => sum + (2 ** grade - 1) / Math.log2(index + 2), 0)
}

/** nDCG@10 (Järvelin and Kekäläinen, ACM TOIS 20(4), 2002) of one answer, against the best order of all pieces. */
export function scoreOrder(grades: readonly number[], all: readonly number[]): number {
  const ideal = sumGains(all.toSorted((a, b) => b - a))
  return ideal === 0 ? 0 : sumGains(grades) / ideal
}

/** One over the rank of the first piece that was meant; 0 where it is not among the ten. */
export function scoreFirst(grades: readonly number[], best: number): number {
  const index = grades.slice(0, depth).findIndex((grade) => grade === best)
  return index === -1 ? 0 : 1 / (index + 1)
}

const mean = (values: readonly number[]): number =>
  values.length === 0 ? Number.NaN : values.reduce((sum, value) => sum + value, 0) / values.length

export function findPercentile(values: readonly number[], share: number): number {
  const sorted = values.toSorted((a, b) => a - b)
  return sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)] ?? Number.NaN
}

export interface QueryScore extends Answered {
  readonly ndcg: number
  readonly reciprocalRank: number
}

export function scoreQuery(answered: Answered, catalogue: ReadonlyMap<string, JudgedPiece>): QueryScore {
  const { judgements } = answered.judged
  const gradeBySlug = new Map([...catalogue].map(([slug, piece]) => [slug, gradePiece(piece, judgements)]))
  const grades = answered.slugs.map((slug) => gradeBySlug.get(slug) ?? 0)
  const all = [...gradeBySlug.values()]
  return { ...answered, ndcg: scoreOrder(grades, all), reciprocalRank: scoreFirst(grades, Math.max(...all)) }
}

export function scoreClass(scores: readonly QueryScore[]): ClassScore {
  const answerable = scores.filter(({ judged }) => Object.keys(judged.judgements).length > 0)
  return {
    queries: scores.length,
    ndcg: mean(answerable.map(({ ndcg }) => ndcg)),
    mrr: mean(answerable.map(({ reciprocalRank }) => reciprocalRank)),
    zeroRate: mean(scores.map(({ slugs }) => (slugs.length === 0 ? 1 : 0))),
    p95Ms: findPercentile(
      scores.map(({ milliseconds }) => milliseconds),
      0.95,
    ),
  }
}
