import { isKindKey } from '#shared/kinds/index'
import type { BareSpecs } from '#shared/kinds/types'
import type { Proposal } from '#shared/schemas/proposals'
import { findDoubts } from '#shared/unlikely/find-doubts'
import type { Printer } from '#shared/units/print'

export interface FlagWords {
  readonly flag: Proposal['flags'][number]
  /** What is unlikely about it, in the reader's units. */
  readonly detail: string
  /** What would be likelier: "10.6 in (inches taken for millimetres)". */
  readonly suggestions: readonly string[]
}

const ruleWords = {
  usual: 'Unusual for this kind of gear.',
  slip: 'Off by a factor that people slip by.',
  pair: 'At odds with another value of the piece.',
} as const

/** Each warning in words. `specs`: the piece as it is now; nothing for a new one. */
export function findFlagWords(
  proposal: Pick<Proposal, 'kind' | 'values' | 'flags'>,
  specs: BareSpecs,
  printer: Printer,
): readonly FlagWords[] {
  const { kind, values, flags } = proposal
  const proposed = Object.entries(values).map(([key, value]) => [key, value?.value] as const)
  const wanted: BareSpecs = { ...specs, ...Object.fromEntries(proposed) }
  const doubts = isKindKey(kind) ? findDoubts(kind, { values: wanted, before: specs }, printer) : []
  return flags.map((flag) => {
    const doubt = doubts.find(({ path, rule }) => path === flag.path && rule === flag.rule)
    return {
      flag,
      detail: doubt?.detail ?? ruleWords[flag.rule],
      suggestions: doubt?.suggestions.map(({ printed, because }) => `${printed} (${because})`) ?? [],
    }
  })
}
