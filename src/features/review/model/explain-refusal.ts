import type { Proposal } from '#shared/schemas/proposals'
import { toApiError } from '../../../lib/problem'
import { decisionWordsId, fieldChoiceId, fieldWordsId, reasonId, type DraftError } from './decision-draft'
import { capitalise } from '../../../lib/capitalise'
import { nameKey } from './list-fields'
import { listAmendments } from './list-amendments'

/** Why a decision did not count. What was typed is kept in every case. */
export type Refusal =
  | { readonly kind: 'wrong'; readonly errors: readonly DraftError[] }
  /** Its author was quicker. */
  | { readonly kind: 'amended'; readonly changed: readonly string[] }
  /** Another moderator was quicker, or is at it. */
  | { readonly kind: 'overtaken'; readonly detail: string }
  | { readonly kind: 'failed'; readonly detail: string }

function locate(pointer: string): string {
  const [part, key = '', end] = pointer.replace(/^#\//, '').split('/')
  if (part === 'reasonCode') return reasonId
  if (part !== 'fields') return decisionWordsId
  return end === 'words' ? fieldWordsId(key) : fieldChoiceId(key)
}

/** Which value a message is about: the API's own words leave it to the pointer. */
function nameField(pointer: string, kind: string): string {
  const key = /^#\/fields\/([^/]+)/.exec(pointer)?.[1]
  return key === undefined ? '' : `${capitalise(nameKey(kind, key))}: `
}

/** `read` is what the decision was about, `now` how it stands: null where that could not be read either. */
export function explainRefusal(error: unknown, read: Proposal, now: Proposal | null): Refusal {
  const { status, message, errors } = toApiError(error)
  if (status === 412 && now?.status === 'pending') return { kind: 'amended', changed: listAmendments(read, now) }
  // Also of the record having moved on meanwhile: then it names the values that have to be chosen.
  if ((status === 422 || status === 409) && errors.length > 0)
    return {
      kind: 'wrong',
      errors: errors.map(({ pointer, detail }) => ({
        fieldId: locate(pointer),
        message: `${nameField(pointer, read.kind)}${detail}`,
      })),
    }
  if (status === 409 || status === 412) return { kind: 'overtaken', detail: message }
  return { kind: 'failed', detail: message }
}
