import { isKindKey, type KindKey } from '#shared/kinds/index'
import type { TypedForm } from './typed-form'

/** What somebody typed and did not send, in their browser alone. */
export interface Draft {
  readonly kind: KindKey
  /** Revision that the typing started from; null for a new piece. */
  readonly baseRevision: number | null
  /** The proposal that it belongs to, once there is one. */
  readonly proposalId: string | null
  readonly typed: TypedForm
  /** Moment of the last change, in ISO 8601. */
  readonly at: string
}

const storageKey = (place: string): string => `stillfits.draft.${place}`
const longest = 200_000

/** Storage can be full or forbidden; then nothing is kept, and the form says nothing of it. */
function attempt<T>(access: () => T): T | null {
  try {
    return access()
  } catch {
    return null
  }
}

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

/** Written by an earlier version of the page, or by somebody else: taken only if it is whole. */
function isDraft(value: unknown): value is Draft {
  if (!isRecord(value) || typeof value.kind !== 'string' || !isKindKey(value.kind)) return false
  const { typed } = value
  return (
    typeof value.at === 'string' &&
    isRecord(typed) &&
    isRecord(typed.identity) &&
    isRecord(typed.specs) &&
    isRecord(typed.backing) &&
    Array.isArray(typed.files)
  )
}

export function readDraft(place: string): Draft | null {
  const text = attempt(() => localStorage.getItem(storageKey(place)))
  const value = text === null ? null : attempt(() => JSON.parse(text) as unknown)
  return isDraft(value) ? value : null
}

export function keepDraft(place: string, draft: Draft): boolean {
  const text = JSON.stringify(draft)
  if (text.length > longest) return false
  return (
    attempt(() => {
      localStorage.setItem(storageKey(place), text)
      return true
    }) ?? false
  )
}

export function dropDraft(place: string): void {
  attempt(() => localStorage.removeItem(storageKey(place)))
}
