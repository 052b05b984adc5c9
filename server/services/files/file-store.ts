import type { Readable } from 'node:stream'
import {
  DeleteObjectsCommand,
  GetObjectCommand,
  ListObjectsV2Command,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3'
import { FileStoreError } from './file-store-error'

export interface StoredObject {
  readonly key: string
  readonly modifiedAt: Date
}

/** Where files lie. Every call rejects with a `FileStoreError` when the store does not answer. */
export interface FileStore {
  put(key: string, body: Buffer, contentType: string): Promise<void>
  /** Null where there is no such object. */
  get(key: string): Promise<Readable | null>
  remove(keys: readonly string[]): Promise<void>
  list(): AsyncIterable<StoredObject>
  close(): void
}

export interface FileStoreOptions {
  readonly endpoint: string
  readonly region: string
  readonly bucket: string
  readonly accessKeyId: string
  readonly secretAccessKey: string
}

async function guard<T>(work: Promise<T>): Promise<T> {
  try {
    return await work
  } catch (error) {
    // The SDK hangs the whole request on its errors, the signature included: nothing for a log.
    const cause = error instanceof Error ? new Error(`${error.name}: ${error.message}`) : undefined
    throw new FileStoreError('The file store does not answer', { cause })
  }
}

/** An object store that speaks S3. Every wait has an end. */
export function createFileStore(options: FileStoreOptions): FileStore {
  const { endpoint, region, bucket: Bucket, accessKeyId, secretAccessKey } = options
  const client = new S3Client({
    endpoint,
    region,
    credentials: { accessKeyId, secretAccessKey },
    forcePathStyle: true,
    maxAttempts: 2,
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    requestHandler: { connectionTimeout: 3_000, requestTimeout: 20_000, throwOnRequestTimeout: true },
  })
  return {
    async put(Key, Body, ContentType) {
      await guard(client.send(new PutObjectCommand({ Bucket, Key, Body, ContentType })))
    },
    async get(Key) {
      const found = client.send(new GetObjectCommand({ Bucket, Key })).catch((error: unknown) => {
        if (error instanceof NoSuchKey) return null
        throw error
      })
      return ((await guard(found))?.Body as Readable | undefined) ?? null
    },
    async remove(keys) {
      if (keys.length === 0) return
      const Objects = keys.map((Key) => ({ Key }))
      await guard(client.send(new DeleteObjectsCommand({ Bucket, Delete: { Objects, Quiet: true } })))
    },
    async *list() {
      let ContinuationToken: string | undefined
      do {
        const page = await guard(
          client.send(
            new ListObjectsV2Command({ Bucket, ...(ContinuationToken !== undefined && { ContinuationToken }) }),
          ),
        )
        for (const { Key, LastModified } of page.Contents ?? []) {
          if (Key !== undefined && LastModified !== undefined) yield { key: Key, modifiedAt: LastModified }
        }
        ContinuationToken = page.NextContinuationToken
      } while (ContinuationToken !== undefined)
    },
    close: () => client.destroy(),
  }
}
