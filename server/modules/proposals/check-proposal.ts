import { isKindKey } from '#shared/kinds/index'
import type { ProposedIdentity, ProposedValues, StoredProvenances, StoredSpecs } from '../../db/schema/index'
import { AppError, createInvalidError, type Issue } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import { findStateIssues, mergeValues } from '../gear/gear-revise.service'
import type { FileRow } from './proposal-talk.queries'
import { toNewValues } from './to-new-values'

interface Checked {
  readonly kind: string
  readonly authorId: number
  readonly isNew: boolean
  readonly head: { readonly specs: StoredSpecs; readonly provenance: StoredProvenances }
  readonly identity: ProposedIdentity
  readonly values: ProposedValues
}

/** Files that are not this proposal's own, by the fields that name them. */
export function findFileIssues(values: ProposedValues, files: readonly FileRow[], authorId: number): Issue[] {
  const own = new Set(files.filter(({ uploaderId }) => uploaderId === authorId).map(({ id }) => id))
  return Object.entries(values).flatMap(([key, proposed]) =>
    (proposed?.files ?? []).flatMap((id, index) => {
      const pointer = toPointer(['values', key, 'files', index])
      return own.has(id) ? [] : [{ pointer, detail: 'is no file that you added to this proposal' }]
    }),
  )
}

function findMissing({ isNew, identity, values }: Checked): Issue[] {
  const missing = (key: string) => ({ pointer: `#/identity/${key}`, detail: 'is needed for a new piece' })
  if (isNew) return (['brand', 'model'] as const).filter((key) => identity[key] === undefined).map(missing)
  const isEmpty = Object.keys(values).length === 0 && Object.keys(identity).length === 0
  return isEmpty ? [{ pointer: '#/values', detail: 'must change something' }] : []
}

/** What keeps a proposal from being sent in: what is missing, and values that contradict each other or the record. */
export function checkComplete(checked: Checked): void {
  const { kind, head, values, authorId } = checked
  if (!isKindKey(kind)) throw new AppError('conflict', `The kind ${kind} is no longer kept.`)
  const state = mergeValues(head, toNewValues(values, authorId), 1)
  const contradictions = findStateIssues(kind, state).map(({ pointer, detail }) => {
    const [key = '', ...rest] = pointer.slice(2).split('/')
    const inside = rest[0] === 'value' || rest.length === 0 ? rest : ['value', ...rest]
    return { pointer: ['#/values', key, ...(inside.length === 0 ? ['value'] : inside)].join('/'), detail }
  })
  const issues = [...findMissing(checked), ...contradictions]
  if (issues.length > 0) throw createInvalidError(issues)
}
