import type { DecisionRequest, ReasonCode } from '#shared/schemas/review'
import { capitalise } from '../../../lib/capitalise'
import type { DeskField } from './list-fields'

export type Course = DecisionRequest['decision']

export interface FieldDraft {
  readonly choice: 'approve' | 'decline' | null
  readonly words: string
}

/** A decision as far as it is thought through. Words stay, whichever course is chosen meanwhile. */
export interface DecisionDraft {
  readonly course: Course
  readonly fields: Readonly<Record<string, FieldDraft>>
  readonly reasonCode: string
  readonly words: string
}

export const emptyDraft: DecisionDraft = { course: 'approve', fields: {}, reasonCode: '', words: '' }

export interface DraftError {
  readonly fieldId: string
  readonly message: string
}

/** Ids of controls, which errors point at. */
export const fieldChoiceId = (key: string): string => `choice-${key}`
export const fieldWordsId = (key: string): string => `words-${key}`
export const reasonId = 'reason-code'
export const decisionWordsId = 'decision-words'

/** A conflict is never settled by default: which side stands has to be said. */
export function readFieldDraft(draft: DecisionDraft, { key, state, isChoosable }: DeskField): FieldDraft {
  const kept = draft.fields[key]
  if (!isChoosable) return { choice: 'approve', words: '' }
  return { choice: kept?.choice ?? (state === 'conflict' ? null : 'approve'), words: kept?.words ?? '' }
}

export const countApproved = (draft: DecisionDraft, fields: readonly DeskField[]): number =>
  fields.filter((field) => readFieldDraft(draft, field).choice === 'approve').length

function checkField(draft: DecisionDraft, field: DeskField): DraftError[] {
  const { choice, words } = readFieldDraft(draft, field)
  const { key, attribute } = field
  if (choice === null)
    return [{ fieldId: fieldChoiceId(key), message: `${capitalise(attribute.label)}: choose which value stands` }]
  if (choice === 'decline' && words.trim() === '')
    return [{ fieldId: fieldWordsId(key), message: `${capitalise(attribute.label)}: say why it is declined` }]
  return []
}

function checkApproval(draft: DecisionDraft, fields: readonly DeskField[]): DraftError[] {
  const wrong = fields.flatMap((field) => checkField(draft, field))
  if (wrong.length > 0 || countApproved(draft, fields) > 0) return wrong
  const fieldId = fieldChoiceId(fields[0]?.key ?? '')
  return [{ fieldId, message: 'Nothing would be approved: decline the proposal as a whole, or send it back' }]
}

/** What is still needed before the decision can be sent, in the words of the error summary. */
export function checkDraft(draft: DecisionDraft, fields: readonly DeskField[]): readonly DraftError[] {
  if (draft.course === 'approve') return checkApproval(draft, fields)
  return [
    ...(draft.reasonCode === '' ? [{ fieldId: reasonId, message: 'Choose a reason' }] : []),
    ...(draft.words.trim() === ''
      ? [{ fieldId: decisionWordsId, message: 'Say it in words: the author reads them' }]
      : []),
  ]
}

type FieldDecision = NonNullable<DecisionRequest['fields']>[string]

function writeField(draft: DecisionDraft, field: DeskField): FieldDecision | null {
  const { choice, words } = readFieldDraft(draft, field)
  if (choice === 'decline') return { decision: 'decline', words: words.trim() }
  return field.state === 'conflict' ? { decision: 'approve' } : null
}

/** What is approved without a word is left out, but for conflicts: those are settled explicitly. */
function writeFields(draft: DecisionDraft, fields: readonly DeskField[]): DecisionRequest['fields'] {
  const written = fields.flatMap((field) => {
    const decision = writeField(draft, field)
    return decision === null ? [] : [[field.key, decision] as const]
  })
  return written.length === 0 ? undefined : Object.fromEntries(written)
}

/** The decision as it is sent, of a draft that lacks nothing. */
export function writeDecision(draft: DecisionDraft, fields: readonly DeskField[]): DecisionRequest {
  const words = draft.words.trim()
  const shared = { decision: draft.course, ...(words !== '' && { words }) }
  if (draft.course !== 'approve') return { ...shared, reasonCode: draft.reasonCode as ReasonCode }
  const explicit = writeFields(draft, fields)
  return { ...shared, ...(explicit && { fields: explicit }) }
}
