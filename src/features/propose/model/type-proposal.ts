import { getAttribute } from '#shared/kinds/index'
import type { Proposal } from '#shared/schemas/proposals'
import type { ProposedValue } from '#shared/schemas/proposed-values'
import type { Printer } from '#shared/units/print'
import { notesToText } from './notes-text'
import { typeEntries, typeValue } from './type-value'
import type { FormBase, TypedFile, TypedForm, TypedSpec } from './typed-form'

function typeProposed(base: FormBase, key: string, proposed: ProposedValue | null, printer: Printer): TypedSpec {
  const attribute = getAttribute(base.kind, key)
  const nothing = { text: '', entries: [], source: '', plusMinus: '', evidence: '', date: '' } as const
  if (!attribute || proposed === null) return nothing
  const { value, raw, source, plusMinus, evidence = '', date } = proposed
  const unit = attribute.type === 'measure' ? (attribute.unit === 'C' ? 'K' : attribute.unit) : null
  return {
    text: attribute.type === 'group' ? '' : (raw ?? typeValue(attribute, value, printer, { exact: true })),
    entries: attribute.type === 'group' ? typeEntries(attribute, value, printer) : [],
    source,
    plusMinus:
      unit === null || plusMinus === undefined
        ? ''
        : printer.measure(plusMinus, unit, { exact: true }).replaceAll('\u00a0', ' '),
    evidence,
    date,
  }
}

function typeFiles({ files, values }: Proposal): readonly TypedFile[] {
  const proposed = Object.entries(values).filter(([, value]) => value !== null)
  return files.map(({ id, kind, caption }) => {
    const backed = proposed.filter(([, value]) => value?.files?.includes(id)).map(([key]) => key)
    const name = caption ?? (kind === 'photo' ? 'photo' : 'document')
    return { id, kind, name, only: backed.length === proposed.length ? null : backed }
  })
}

/** A proposal that is saved already, as the form that it came from. */
export function typeProposal(base: FormBase, proposal: Proposal, printer: Printer): TypedForm {
  const { identity, values, summary, flags } = proposal
  const typed = base.typed
  const specs = Object.entries(values).map(([key, value]) => [key, typeProposed(base, key, value, printer)] as const)
  return {
    ...typed,
    identity: {
      brand: identity.brand ?? typed.identity.brand,
      model: identity.model ?? typed.identity.model,
      status: identity.status ?? typed.identity.status,
      gtin: identity.gtin === undefined ? typed.identity.gtin : (identity.gtin ?? ''),
      notes: identity.notes === undefined ? typed.identity.notes : notesToText(identity.notes ?? ''),
    },
    specs: { ...typed.specs, ...Object.fromEntries(specs) },
    files: typeFiles(proposal),
    summary: summary ?? '',
    reasons: Object.fromEntries(
      flags.flatMap(({ path, rule, value, reason }) =>
        reason === null ? [] : [[`${path}|${rule}|${value}`.replaceAll('.', '_'), reason]],
      ),
    ),
  }
}
