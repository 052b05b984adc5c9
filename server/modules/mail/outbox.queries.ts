import type { Database } from '../../db/database'
import { outbox } from '../../db/schema/index'

export type NewLetter = Pick<
  typeof outbox.$inferInsert,
  'personId' | 'recipient' | 'kind' | 'subject' | 'textBody' | 'htmlBody' | 'unsubscribeUrl'
>

export async function insertLetter(db: Database, letter: NewLetter): Promise<void> {
  await db.insert(outbox).values(letter)
}
