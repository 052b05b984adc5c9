import type { ReactNode } from 'react'
import type { EvidenceRef, SourceOfValue } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import type { FlagWords } from '../model/find-flag-words'
import { describeField } from '../model/field-words'
import type { DeskField } from '../model/list-fields'
import { printSides } from '../model/print-sides'
import { FieldBacking } from './field-backing'
import { FlagList } from './flag-list'
import { OtherSources } from './other-sources'
import { ValueSide } from './value-side'

export interface FieldCardProps {
  readonly field: DeskField
  /** All files of the proposal. */
  readonly files: readonly EvidenceRef[]
  readonly flags: readonly FlagWords[]
  readonly sources: readonly SourceOfValue[]
  readonly printer: Printer
  /** The choice, where there is one. */
  readonly children?: ReactNode
}

/** What backs the proposed value; identity alone needs no backing of its own. */
function Backing({ field, files }: Pick<FieldCardProps, 'field' | 'files'>) {
  const { proposed, attribute, key } = field
  const named = files.filter(({ id }) => proposed?.files?.includes(id))
  const needsBacking = proposed !== null && !key.startsWith('identity.')
  return (
    <div className="min-w-0">
      <p className="text-sm text-ink-soft">Evidence</p>
      <FieldBacking
        evidence={proposed?.evidence}
        files={named}
        of={attribute.label}
        emptyText={needsBacking ? 'Nothing backs it.' : 'None needed.'}
      />
      {attribute.guide && <p className="mt-1 text-sm text-ink-soft">Guide: {attribute.guide}</p>}
    </div>
  )
}

/** One value of a proposal: what is on record, what is proposed and what backs it, side by side. */
export function FieldCard({ field, files, flags, sources, printer, children }: FieldCardProps) {
  const { key, attribute, state, base, now, proposed } = field
  const sides = printSides(field, printer)
  const { note } = describeField(field)
  const isConflict = state === 'conflict'
  const shared = { attribute, printer }
  return (
    <section
      tabIndex={-1}
      data-field-card={key}
      aria-labelledby={`field-${key}`}
      className="scroll-mt-4 border-t-[1.5px] border-ink py-4 outline-offset-4"
    >
      <h3 id={`field-${key}`} className="font-heading text-base font-bold first-letter:uppercase">
        {attribute.label}
      </h3>
      {note && <p className={`text-sm font-semibold ${isConflict ? 'text-changes' : 'text-ink-soft'}`}>{note}</p>}
      <div
        className={`mt-2 grid gap-x-4 gap-y-4 ${isConflict ? 'sm:grid-cols-2 xl:grid-cols-4' : 'sm:grid-cols-2 xl:grid-cols-3'}`}
      >
        {isConflict && (
          <ValueSide
            {...shared}
            title="When it was proposed"
            side={base}
            text={sides.base}
            emptyText="not recorded then"
          />
        )}
        <ValueSide {...shared} title="On record now" side={now} text={sides.now} emptyText="not recorded yet">
          {now && <FieldBacking evidence={now.evidence} files={now.files ?? []} of={attribute.label} />}
        </ValueSide>
        <ValueSide
          {...shared}
          title="Proposed"
          side={proposed && { ...proposed, files: undefined }}
          text={sides.proposed}
          emptyText="take the value away"
          isProposed
        />
        <Backing field={field} files={files} />
      </div>
      <FlagList flags={flags} />
      <OtherSources attribute={attribute} sources={sources} printer={printer} />
      {children}
    </section>
  )
}
