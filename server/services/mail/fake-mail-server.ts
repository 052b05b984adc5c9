import { randomUUID } from 'node:crypto'
import { mkdir } from 'node:fs/promises'
import type { AddressInfo } from 'node:net'
import { SMTPServer } from 'smtp-server'
import type { FakeServer } from '../fake-server'
import { keepMessage } from './mailroom'

const largestBytes = 1024 * 1024

/** Stands in for a mail server: takes every letter, delivers none, and keeps them for `/mailroom`. */
export async function startFakeMailServer(folder: string, port = 0): Promise<FakeServer> {
  await mkdir(folder, { recursive: true })
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: largestBytes,
    onData(stream, _session, callback) {
      const chunks: Buffer[] = []
      stream.on('data', (chunk: Buffer) => chunks.push(chunk))
      stream.once('error', callback)
      stream.once('end', () => {
        keepMessage(folder, Buffer.concat(chunks), new Date(), randomUUID()).then(
          () => callback(null),
          (error: Error) => callback(error),
        )
      })
    },
  })
  // A client that hangs up is no concern of the others.
  server.on('error', () => undefined)
  const listener = await new Promise<ReturnType<SMTPServer['listen']>>((resolve, reject) => {
    const listening = server.listen(port, '127.0.0.1', () => resolve(listening))
    listening.once('error', reject)
  })
  return {
    port: (listener.address() as AddressInfo).port,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  }
}
