import { mkdir } from 'node:fs/promises'
import S3rver from '@20minutes/s3rver'
import type { FakeServer } from '../fake-server'

/** The one account that the stand-in knows. */
export const fakeAccount = { accessKeyId: 'S3RVER', secretAccessKey: 'S3RVER' } as const

/** Stands in for an object store: keeps objects as files in a folder. */
export async function startFakeFileServer(folder: string, bucket: string, port = 0): Promise<FakeServer> {
  await mkdir(folder, { recursive: true })
  const fake = new S3rver({
    address: '127.0.0.1',
    port,
    directory: folder,
    silent: true,
    allowMismatchedSignatures: true,
    configureBuckets: [{ name: bucket }],
  })
  const address = await fake.run()
  return {
    port: address.port,
    async stop() {
      fake.httpServer.closeAllConnections()
      await fake.close()
    },
  }
}
