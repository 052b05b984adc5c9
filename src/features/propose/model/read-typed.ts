import { findInconsistencies } from '#shared/kinds/consistency'
import { getAttribute, getKind } from '#shared/kinds/index'
import type { Attribute, BareSpecs } from '#shared/kinds/types'
import type { ProposalRequest } from '#shared/schemas/proposals'
import type { ProposedValue, ProposedValues } from '#shared/schemas/proposed-values'
import type { UnitSystem } from '#shared/units/systems'
import { capitalise } from '../../../lib/capitalise'
import { isSameTyped, saysMore } from './compare-typed'
import { readIdentity } from './read-identity'
import { readPlusMinus, readSpec, type Problem, type ReadSpec } from './read-spec'
import type { FormBase, TypedForm, TypedSpec } from './typed-form'

export interface ReadForm {
  readonly identity: NonNullable<ProposalRequest['identity']>
  /** What changes, and can be read. */
  readonly values: ProposedValues
  /** The whole specs as they would be. */
  readonly specs: BareSpecs
  readonly problems: readonly Problem[]
  readonly places: Readonly<Record<string, readonly number[]>>
}

export const isReadable = ({ problems }: ReadForm): boolean => problems.length === 0

const printToday = (): string => new Date().toISOString().slice(0, 10)

function back(
  attribute: Attribute,
  read: ReadSpec & { readonly value: NonNullable<unknown> },
  spec: TypedSpec,
  typed: TypedForm,
  system: UnitSystem,
) {
  const plusMinus = readPlusMinus(attribute, spec.plusMinus, system)
  const evidence = spec.evidence.trim() || typed.backing.evidence.trim()
  const files = typed.files.filter(({ only }) => only === null || only.includes(attribute.key)).map(({ id }) => id)
  const proposed: ProposedValue = {
    value: read.value,
    ...(read.raw !== undefined && { raw: read.raw }),
    source: spec.source || typed.backing.source,
    ...(typeof plusMinus === 'number' && { plusMinus }),
    ...(evidence !== '' && { evidence }),
    ...(files.length > 0 && { files }),
    date: spec.date || typed.backing.date || printToday(),
  }
  const problems =
    typeof plusMinus === 'string' ? [{ path: `specs.${attribute.key}.plusMinus`, message: plusMinus }] : []
  return { proposed, problems }
}

function findContradictions(base: FormBase, specs: BareSpecs): readonly Problem[] {
  const known = new Set(findInconsistencies(base.kind, base.gear?.specs ?? {}).map(({ detail }) => detail))
  return findInconsistencies(base.kind, specs)
    .filter(({ detail }) => !known.has(detail))
    .map(({ path, detail }) => {
      const [key = '', ...rest] = path.split('.')
      const inside = getAttribute(base.kind, key)?.type === 'group' ? ['entries', ...rest] : ['text']
      return { path: ['specs', key, ...inside].join('.'), message: `${capitalise(detail)}.` }
    })
}

/** What the form says so far: everything that differs from the record, and everything that cannot be read. */
export function readTyped(base: FormBase, typed: TypedForm, system: UnitSystem): ReadForm {
  const problems: Problem[] = []
  const values: ProposedValues = {}
  const places: Record<string, readonly number[]> = {}
  const specs: Record<string, unknown> = { ...base.gear?.specs }
  for (const attribute of getKind(base.kind).attributes) {
    const { key } = attribute
    const spec = typed.specs[key]
    const was = base.typed.specs[key]
    if (!spec || !was) continue
    const recorded = base.gear?.specs[key]
    const isSame = isSameTyped(spec, was)
    if (isSame && !(saysMore(spec) && recorded !== undefined)) continue
    const read = isSame
      ? { value: recorded, problems: [] }
      : readSpec(attribute, spec, system, { typed: was, value: recorded })
    problems.push(...read.problems)
    if ('places' in read && read.places) places[key] = read.places
    if (read.problems.length > 0) continue
    if (read.value === undefined || read.value === null) {
      if (recorded !== undefined) values[key] = null
      delete specs[key]
      continue
    }
    const backed = back(attribute, { ...read, value: read.value }, spec, typed, system)
    problems.push(...backed.problems)
    values[key] = backed.proposed
    specs[key] = read.value
  }
  const identity = readIdentity(base, typed)
  problems.push(...identity.problems, ...(problems.length === 0 ? findContradictions(base, specs) : []))
  return { identity: identity.value, values, specs, problems, places }
}

export const hasChanges = ({ values, identity }: Pick<ReadForm, 'values' | 'identity'>): boolean =>
  Object.keys(values).length > 0 || Object.keys(identity).length > 0
