import type { Env } from '../config/env'
import { createFileStore, type FileStore } from './files/file-store'
import { createMailer, type Mailer } from './mail/mailer'

/** Null where no mail server is named. */
export function createMailerFrom({ SMTP_URL, MAIL_FROM }: Env): Mailer | null {
  return SMTP_URL === undefined ? null : createMailer(SMTP_URL, MAIL_FROM)
}

/** Null where no object store is named. */
export function createFileStoreFrom(env: Env): FileStore | null {
  if (env.S3_ENDPOINT === undefined) return null
  return createFileStore({
    endpoint: env.S3_ENDPOINT,
    region: env.S3_REGION,
    bucket: env.S3_BUCKET,
    accessKeyId: env.S3_ACCESS_KEY_ID,
    secretAccessKey: env.S3_SECRET_ACCESS_KEY,
  })
}
