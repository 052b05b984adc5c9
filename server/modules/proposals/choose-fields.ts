import type { DecisionRequest } from '#shared/schemas/review'
import type { ProposedIdentity, ProposedValues } from '../../db/schema/index'
import { AppError, createInvalidError } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import { listConflicts, type ComparedValue } from './compare-with-record'

interface Proposed {
  readonly identity: ProposedIdentity
  readonly values: ProposedValues
}

const identityPrefix = 'identity.'

const listFieldKeys = ({ identity, values }: Proposed): string[] => [
  ...Object.keys(identity).map((key) => identityPrefix + key),
  ...Object.keys(values),
]

const keep = <T extends object>(from: T, isKept: (key: string) => boolean): T =>
  Object.fromEntries(Object.entries(from).filter(([key]) => isKept(key))) as T

function refuseUnknown(proposed: Proposed, fields: NonNullable<DecisionRequest['fields']>): void {
  const known = new Set(listFieldKeys(proposed))
  const unknown = Object.keys(fields).filter((key) => !known.has(key))
  if (unknown.length === 0) return
  throw createInvalidError(
    unknown.map((key) => ({ pointer: toPointer(['fields', key]), detail: 'is nothing that is proposed' })),
  )
}

/**
 * What is approved of a proposal: all but the fields that are declined. What was changed on both sides has to be
 * chosen by name, so that nobody approves over a change that they have not seen.
 */
export function chooseFields(
  proposed: Proposed,
  compared: ReadonlyMap<string, ComparedValue>,
  fields: NonNullable<DecisionRequest['fields']> = {},
): Proposed {
  refuseUnknown(proposed, fields)
  const open = listConflicts(compared).filter((key) => fields[key] === undefined)
  if (open.length > 0) {
    const detail = 'The record changed since this was proposed. Approve or decline each of these fields by itself.'
    const issues = open.map((key) => ({ pointer: toPointer(['fields', key]), detail: 'was changed on both sides' }))
    throw new AppError('conflict', detail, issues)
  }
  const isApproved = (key: string) => fields[key]?.decision !== 'decline'
  const chosen = {
    identity: keep(proposed.identity, (key) => isApproved(identityPrefix + key)),
    values: keep(proposed.values, isApproved),
  }
  if (listFieldKeys(chosen).length === 0) {
    throw createInvalidError([
      { pointer: '#/fields', detail: 'leave nothing to approve: decline the proposal instead' },
    ])
  }
  return chosen
}
