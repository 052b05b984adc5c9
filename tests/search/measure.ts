import { startApp } from '../support/app'
import { answerQueries } from './answer-queries'
import { queryClasses } from './queries/types'
import { scoreClass, type QueryScore } from './score-class'

const print = (value: number, width: number, decimals: number): string =>
  (Number.isNaN(value) ? '–' : value.toFixed(decimals)).padStart(width)

function printHalf(title: string, scores: readonly QueryScore[]): string {
  const rows = queryClasses.map((queryClass) => {
    const { queries, ndcg, mrr, zeroRate, p95Ms } = scoreClass(
      scores.filter(({ judged }) => judged.queryClass === queryClass),
    )
    const numbers = [
      print(queries, 8, 0),
      print(ndcg, 8, 3),
      print(mrr, 8, 3),
      print(zeroRate, 8, 3),
      print(p95Ms, 8, 0),
    ]
    return `${queryClass.padEnd(16)}${numbers.join('')}`
  })
  return [`\n${title}`, `${'class'.padEnd(16)} queries nDCG@10     MRR    none  p95 ms`, ...rows].join('\n')
}

const app = await startApp()
try {
  const scores = await answerQueries(app.url, app.client.pool)
  const isBlind = ({ judged }: QueryScore) => judged.isBlind
  process.stdout.write(`${printHalf('Blind half', scores.filter(isBlind))}\n`)
  process.stdout.write(
    `${printHalf(
      'Open half',
      scores.filter((score) => !isBlind(score)),
    )}\n`,
  )
} finally {
  await app.stop()
}
