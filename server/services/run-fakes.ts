import { join } from 'node:path'
import { fakeAccount, startFakeFileServer } from './files/fake-file-server'
import { startFakeMailServer } from './mail/fake-mail-server'

const { FAKES_FOLDER, FAKE_MAIL_PORT, FAKE_FILES_PORT } = process.env
if (!FAKES_FOLDER) {
  process.stderr.write('FAKES_FOLDER is missing: where letters and files are kept.\n')
  process.exit(2)
}

const bucket = 'stillfits'
const mailroomFolder = join(FAKES_FOLDER, 'mailroom')
const mail = await startFakeMailServer(mailroomFolder, Number(FAKE_MAIL_PORT ?? 0))
const files = await startFakeFileServer(join(FAKES_FOLDER, 'files'), bucket, Number(FAKE_FILES_PORT ?? 0))

async function stop(): Promise<void> {
  await Promise.all([mail.stop(), files.stop()])
  process.exit(0)
}
process.on('SIGINT', () => void stop())
process.on('SIGTERM', () => void stop())

/** One line for whoever started this: the settings of a server that uses the stand-ins. */
const settings = {
  SMTP_URL: `smtp://127.0.0.1:${mail.port}`,
  MAILROOM_FOLDER: mailroomFolder,
  S3_ENDPOINT: `http://127.0.0.1:${files.port}`,
  S3_BUCKET: bucket,
  S3_ACCESS_KEY_ID: fakeAccount.accessKeyId,
  S3_SECRET_ACCESS_KEY: fakeAccount.secretAccessKey,
}
process.stdout.write(`${JSON.stringify(settings)}\n`)
