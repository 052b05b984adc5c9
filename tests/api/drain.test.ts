import { once } from 'node:events'
import { createServer } from 'node:http'
import { connect, type AddressInfo } from 'node:net'
import request from 'supertest'
import { expect, it } from 'vitest'
import { drain } from '../../server/http/drain'
import { createLifecycle } from '../../server/http/lifecycle'
import { startApp } from '../support/app'
import { expectProblem } from './problems'

it('is not ready while it drains, and answers everything else', async () => {
  const lifecycle = createLifecycle()
  const app = await startApp({ app: { lifecycle } })
  try {
    await request(app.url).get('/ready').expect(200)
    lifecycle.isDraining = true
    expectProblem(await request(app.url).get('/ready'), 503)
    await request(app.url).get('/health').expect(200)
    await request(app.url).get('/api/v1/gear').expect(200)
  } finally {
    await app.stop()
  }
})

async function startSlow(answerAfterMs: number) {
  const server = createServer((_req, res) => void setTimeout(() => res.end('done'), answerAfterMs))
  server.listen(0, '127.0.0.1')
  await once(server, 'listening')
  const { port } = server.address() as AddressInfo
  return { server, port, url: `http://127.0.0.1:${port}/` }
}

it('finishes what it has begun, and waits for no idle connection', async () => {
  const { server, port, url } = await startSlow(400)
  const silent = connect(port, '127.0.0.1').on('error', () => undefined)
  await once(silent, 'connect')
  const answer = fetch(url).then((response) => response.text())
  await new Promise((resolve) => setTimeout(resolve, 50))
  const startedAt = Date.now()
  await drain(server, createLifecycle(), { noticeMs: 0, deadlineMs: 2000 })
  expect(await answer).toBe('done')
  expect(Date.now() - startedAt).toBeLessThan(2500)
  silent.destroy()
})

it('cuts off what is still running at the deadline', async () => {
  const { server, url } = await startSlow(60_000)
  const answer = fetch(url).then(
    () => 'answered',
    () => 'cut off',
  )
  await new Promise((resolve) => setTimeout(resolve, 50))
  const startedAt = Date.now()
  await drain(server, createLifecycle(), { noticeMs: 0, deadlineMs: 300 })
  expect(await answer).toBe('cut off')
  expect(Date.now() - startedAt).toBeLessThan(2000)
})
