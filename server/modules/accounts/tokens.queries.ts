import { and, eq, gt, isNull } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { emailTokens } from '../../db/schema/index'

type TokenRow = typeof emailTokens.$inferSelect
export type NewToken = Pick<TokenRow, 'tokenHash' | 'personId' | 'purpose' | 'email' | 'createdAt' | 'expiresAt'>

/** Only the newest letter's link works. */
export async function insertToken(db: Database, token: NewToken): Promise<void> {
  await db
    .delete(emailTokens)
    .where(and(eq(emailTokens.personId, token.personId), eq(emailTokens.purpose, token.purpose)))
  await db.insert(emailTokens).values(token)
}

/** Uses a token up; of several who try at once, one does. */
export async function takeToken(db: Database, tokenHash: string, now: Date): Promise<TokenRow | null> {
  const [row] = await db
    .update(emailTokens)
    .set({ usedAt: now })
    .where(and(eq(emailTokens.tokenHash, tokenHash), isNull(emailTokens.usedAt), gt(emailTokens.expiresAt, now)))
    .returning()
  return row ?? null
}

export async function deleteTokensOf(db: Database, personId: number): Promise<void> {
  await db.delete(emailTokens).where(eq(emailTokens.personId, personId))
}
