import type { LetterItem } from '#shared/schemas/admin'
import { canRetry } from './mail.policy'

interface LetterRow extends Pick<
  LetterItem,
  'id' | 'recipient' | 'kind' | 'subject' | 'status' | 'attempts' | 'lastError'
> {
  readonly createdAt: Date
  readonly sentAt: Date | null
}

export function presentLetter(row: LetterRow): LetterItem {
  const { id, recipient, kind, subject, status, attempts, lastError, createdAt, sentAt } = row
  return {
    id,
    recipient,
    kind,
    subject,
    status,
    attempts,
    lastError,
    createdAt: createdAt.toISOString(),
    sentAt: sentAt?.toISOString() ?? null,
    can: { retry: canRetry(row) },
  }
}
