import { z } from 'zod'
import type { LetterItem, LetterList, LetterQuery } from '#shared/schemas/admin'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { createCursor, readCursor } from '../../lib/cursor'
import { AppError } from '../../lib/errors'
import { canManageLetters } from './mail.policy'
import { presentLetter } from './mail.presenter'
import { countLetters, findLetter, listLetters, reviveLetter } from './outbox.queries'

const placeSchema = z.object({ createdAt: z.iso.datetime(), id: z.uuid() })

function requireRight(actor: Actor): void {
  if (!canManageLetters(actor)) throw new AppError('forbidden', 'Only admins see the letters of this site.')
}

async function summarise(db: Database): Promise<Pick<LetterList, 'counts' | 'oldestWaiting'>> {
  const rows = await countLetters(db)
  const find = (status: string) => rows.find((row) => row.status === status)
  const oldest = find('waiting')?.oldest
  return {
    counts: {
      waiting: find('waiting')?.count ?? 0,
      sent: find('sent')?.count ?? 0,
      dead: find('dead')?.count ?? 0,
    },
    oldestWaiting: oldest ? new Date(oldest).toISOString() : null,
  }
}

/** Letters of one state, newest first, and how many there are of each. */
export async function searchLetters(db: Database, actor: Actor, query: LetterQuery): Promise<LetterList> {
  requireRight(actor)
  const { status, limit, cursor } = query
  const place = cursor === undefined ? null : readCursor(cursor, status, placeSchema)
  const [rows, summary] = await Promise.all([listLetters(db, status, place, limit + 1), summarise(db)])
  const shown = rows.slice(0, limit)
  const last = shown.at(-1)
  const next =
    rows.length > limit && last !== undefined
      ? createCursor({ createdAt: last.createdAt.toISOString(), id: last.id }, status)
      : null
  return { items: shown.map(presentLetter), next, ...summary }
}

/** Gives a letter that was given up its tries again. */
export async function retryLetter(db: Database, actor: Actor, id: string, requestId: string): Promise<LetterItem> {
  requireRight(actor)
  return db.transaction(async (tx) => {
    const letter = await reviveLetter(tx, id)
    if (letter === undefined) {
      const found = await findLetter(tx, id)
      if (found === undefined) throw new AppError('not-found', 'There is no letter by that name.')
      const state = found.status === 'sent' ? 'was sent already' : 'is waiting to be sent'
      throw new AppError('conflict', `This letter ${state}: only one that was given up can be tried again.`)
    }
    const event = { action: 'letter.retry', subjectType: 'letter', subjectId: id, requestId }
    await recordAudit(tx, { actorId: actor.id, ...event })
    return presentLetter(letter)
  })
}
