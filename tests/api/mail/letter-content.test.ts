import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readFile, readdir } from 'node:fs/promises'
import { join } from 'node:path'
import { composeLetter } from '../../../server/modules/mail/templates/compose-letter'
import { createMailer, type Mailer } from '../../../server/services/mail/mailer'
import { startTestMail, type TestMail } from '../../support/fakes'

let mail: TestMail
let mailer: Mailer

beforeAll(async () => {
  mail = await startTestMail()
  mailer = createMailer(mail.url, 'stillfits@example.org')
})

afterAll(async () => {
  mailer.close()
  await mail.stop()
})

async function send(content: Parameters<typeof composeLetter>[0], more: { recipient?: string } = {}) {
  const { subject, textBody, htmlBody } = composeLetter(content)
  const recipient = more.recipient ?? 'reader@example.org'
  await mailer.send({ messageId: 'a@b.example', recipient, subject, textBody, htmlBody, unsubscribeUrl: null })
  const [newest] = (await readdir(mail.folder)).sort().reverse()
  const [letter] = await mail.list()
  return { raw: await readFile(join(mail.folder, newest ?? ''), 'utf8'), letter: letter! }
}

/** Names of the headers before the first empty line. */
const listHeaders = (raw: string) =>
  [...(raw.split('\r\n\r\n')[0] ?? '').matchAll(/^([\w-]+):/gm)].map(([, name]) => name)

describe('a letter', () => {
  it.each([
    '\r\nBcc: thief@example.com',
    '\nBcc: thief@example.com\n\nAnother body',
    '\u2028Bcc: thief@example.com',
    '\0\r',
  ])('gets no header from a line break in a subject or name (%j)', async (attack) => {
    const { raw, letter } = await send({ subject: `About ${attack}`, paragraphs: [`Hello ${attack}`] })
    expect(listHeaders(raw)).not.toContain('Bcc')
    expect(listHeaders(raw).filter((name) => name === 'Subject')).toHaveLength(1)
    expect(letter.subject).not.toMatch(/[\r\n]/)
  })

  it('is refused for an address that would name a second recipient', async () => {
    const recipient = 'a@example.org>\r\nRCPT TO:<b@example.org'
    const before = (await mail.list()).length
    await send({ subject: 'S', paragraphs: [] }, { recipient }).catch(() => undefined)
    const added = (await mail.list()).slice(0, (await mail.list()).length - before)
    expect(added.filter(({ to }) => /(^|[\s,<])b@example\.org/.test(to))).toEqual([])
  })

  it('keeps letters beyond ASCII in subject and text', async () => {
    const { letter } = await send({ subject: 'Höhe: ½ in – größer', paragraphs: ['Länge ✓ 漢字 = 4½″'] })
    expect(letter.subject).toBe('Höhe: ½ in – größer')
    expect(letter.text).toContain('Länge ✓ 漢字 = 4½″')
  })
})
