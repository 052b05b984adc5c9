export interface ReadMessage {
  readonly messageId: string
  readonly from: string
  readonly to: string
  readonly subject: string
  readonly unsubscribeUrl: string | null
  readonly text: string
  readonly html: string
}

type Headers = ReadonlyMap<string, string>

/** RFC 2047 words such as `=?UTF-8?Q?caf=C3=A9?=`. */
function decodeWords(text: string): string {
  return text
    .replace(/(\?=)\s+(=\?)/g, '$1$2')
    .replace(/=\?utf-8\?([bq])\?([^?]*)\?=/gi, (_, kind: string, body: string) =>
      kind.toLowerCase() === 'b'
        ? Buffer.from(body, 'base64').toString()
        : decodeQuotedPrintable(body.replaceAll('_', ' ')),
    )
}

function decodeQuotedPrintable(text: string): string {
  const bytes = text
    .replace(/=\r?\n/g, '')
    .replace(/=([0-9a-f]{2})/gi, (_, code: string) => String.fromCharCode(parseInt(code, 16)))
  return Buffer.from(bytes, 'latin1').toString()
}

function splitPart(raw: string): { readonly headers: Headers; readonly body: string } {
  const [head = '', ...rest] = raw.split(/\r?\n\r?\n/)
  const lines = head.replace(/\r?\n[ \t]+/g, ' ').split(/\r?\n/)
  const headers = new Map(
    lines.map((line) => {
      const colon = line.indexOf(':')
      return [line.slice(0, colon).toLowerCase(), line.slice(colon + 1).trim()]
    }),
  )
  return { headers, body: rest.join('\r\n\r\n') }
}

function decodeBody(headers: Headers, body: string): string {
  const encoding = headers.get('content-transfer-encoding')?.toLowerCase()
  const decoded =
    encoding === 'base64'
      ? Buffer.from(body, 'base64').toString()
      : encoding === 'quoted-printable'
        ? decodeQuotedPrintable(body)
        : Buffer.from(body, 'latin1').toString()
  return decoded.replaceAll('\r\n', '\n').trim()
}

/** Reads a letter as our own mailer writes it: text and HTML as two alternatives. `raw` holds a byte per character. */
export function readMessage(raw: string): ReadMessage {
  const { headers, body } = splitPart(raw)
  const boundary = /boundary="?([^";]+)"?/i.exec(headers.get('content-type') ?? '')?.[1]
  const parts =
    boundary === undefined
      ? [{ headers, body }]
      : body
          .split(`--${boundary}`)
          .slice(1, -1)
          .map((part) => splitPart(part.trimStart()))
  const find = (type: string) => {
    const part = parts.find((candidate) => candidate.headers.get('content-type')?.startsWith(type))
    return part === undefined ? '' : decodeBody(part.headers, part.body)
  }
  const header = (name: string) => decodeWords(headers.get(name) ?? '')
  return {
    messageId: header('message-id').replace(/[<>]/g, ''),
    from: header('from'),
    to: header('to').replace(/[<>]/g, ''),
    subject: header('subject'),
    unsubscribeUrl: /<([^>]+)>/.exec(header('list-unsubscribe').replace(/\s/g, ''))?.[1] ?? null,
    text: find('text/plain'),
    html: find('text/html'),
  }
}
