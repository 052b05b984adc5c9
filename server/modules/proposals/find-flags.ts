import type { KindKey } from '#shared/kinds/index'
import type { Proposal, ProposalRequest } from '#shared/schemas/proposals'
import { findDoubts } from '#shared/unlikely/find-doubts'
import { createPrinter } from '#shared/units/print'
import type { ProposedValues, StoredSpecs } from '../../db/schema/index'

export type StoredFlag = Proposal['flags'][number]

/** The specs as they would be with every proposed value in use. */
export function applyValues(before: StoredSpecs, values: ProposedValues): StoredSpecs {
  const after = { ...before }
  for (const [key, proposed] of Object.entries(values)) {
    if (proposed === null) delete after[key]
    else after[key] = proposed.value
  }
  return after
}

/** What looks unlikely, found anew whatever was sent along, with what the author said of it. */
export function findFlags(
  kind: KindKey,
  before: StoredSpecs,
  values: ProposedValues,
  given: ProposalRequest['flags'] = [],
): StoredFlag[] {
  const doubts = findDoubts(kind, { values: applyValues(before, values), before }, createPrinter('metric'))
  return doubts.map(({ path, rule, value }) => {
    const said = given.find((flag) => flag.path === path && flag.rule === rule)
    return { path, rule, value, reason: said?.reason ?? null }
  })
}
