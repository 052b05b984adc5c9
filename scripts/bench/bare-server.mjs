import { readFileSync } from 'node:fs'
import express from 'express'

/** The least that a route can do: read the request's JSON and send an answer that is ready. */
const app = express()
app.disable('x-powered-by')
app.disable('etag')

const body = readFileSync(process.env.BODY_FILE ?? '', 'utf8')
const answer = /** @type {unknown} */ (JSON.parse(body))

app.get('/ready', (_req, res) => void res.end())
app.post('/bytes', express.json(), (_req, res) => {
  res.set('Cache-Control', 'private, no-store')
  res.type('application/json').send(body)
})
app.post('/json', express.json(), (_req, res) => {
  res.set('Cache-Control', 'private, no-store')
  res.json(answer)
})
app.listen(Number(process.env.PORT), process.env.HOST ?? '127.0.0.1')
process.on('SIGTERM', () => process.exit(0))
