import type pg from 'pg'

export interface ReadLetter {
  readonly kind: string
  readonly subject: string
  readonly text: string
  readonly html: string
}

/** Letters to an address, oldest first, as they stand in the outbox. */
export async function readLetters(pool: pg.Pool, recipient: string): Promise<ReadLetter[]> {
  const { rows } = await pool.query<ReadLetter>(
    `SELECT kind, subject, text_body AS text, html_body AS html
     FROM outbox WHERE lower(recipient) = lower($1) ORDER BY created_at`,
    [recipient],
  )
  return rows
}

/** The address that the newest letter to somebody leads to. */
export async function findLink(pool: pg.Pool, recipient: string): Promise<URL> {
  const letter = (await readLetters(pool, recipient)).at(-1)
  const link = /https?:\/\/\S+/.exec(letter?.text ?? '')?.[0]
  if (link === undefined) throw new Error(`No letter to ${recipient} has a link`)
  return new URL(link)
}

export async function findToken(pool: pg.Pool, recipient: string): Promise<string> {
  return (await findLink(pool, recipient)).searchParams.get('token') ?? ''
}
