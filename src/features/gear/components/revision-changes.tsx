import type { Attribute } from '#shared/kinds/types'
import type { Printer } from '#shared/units/print'
import { printValue } from '#shared/kinds/print-value'
import type { Recorded, RevisionChange } from '../find-revision-changes'
import { printPlusMinus, SpecSource } from './spec-source'

export interface RevisionChangesProps {
  readonly changes: readonly RevisionChange[]
  readonly before: number
  readonly after: number
  readonly printer: Printer
}

/** Two numbers that differ are written so that they look different. */
function printSides({ attribute, before, after }: RevisionChange, printer: Printer): readonly (string | null)[] {
  const print = (side: Recorded | null) => (side === null ? null : printValue(attribute, side.value, printer))
  const [was, is] = [before?.value, after?.value]
  if (attribute.type === 'measure' && typeof was === 'number' && typeof is === 'number')
    return printer.apart(was, is, attribute.unit)
  return [print(before), print(after)]
}

function Side(props: {
  readonly attribute: Attribute
  readonly title: string
  readonly side: Recorded | null
  readonly text: string | null
  readonly printer: Printer
}) {
  const { attribute, title, side, text, printer } = props
  const plusMinus = side?.provenance && printPlusMinus(attribute, side.provenance, printer)
  return (
    <td role="cell" className="block py-1 align-top sm:table-cell sm:border-t sm:border-rule sm:px-3 sm:py-2">
      <span aria-hidden="true" className="block text-xs text-ink-soft sm:hidden">
        {title}
      </span>
      {side === null ? (
        <span className="text-ink-soft">not recorded yet</span>
      ) : (
        <>
          <span className="font-mono break-words">{text}</span>
          {plusMinus && <span className="font-mono text-ink-soft"> {plusMinus}</span>}
          <span className="block text-sm text-ink-soft">
            <SpecSource provenance={side.provenance} />
          </span>
        </>
      )}
    </td>
  )
}

/** Every value that two revisions tell differently, side by side; one under the other on a phone. */
export function RevisionChanges({ changes, before, after, printer }: RevisionChangesProps) {
  if (changes.length === 0) return <p className="mt-3">These two revisions say the same of every value.</p>
  const titles = [before === 0 ? 'Before' : `Revision ${before}`, `Revision ${after}`] as const
  return (
    <table role="table" className="mt-3 block w-full border-b border-rule sm:table sm:table-fixed">
      <caption className="sr-only">
        {before === 0 ? `What revision ${after} says` : `What changed between revision ${before} and ${after}`}
      </caption>
      <thead role="rowgroup" className="hidden sm:table-header-group">
        <tr role="row">
          {['Value', ...titles.slice(before === 0 ? 1 : 0)].map((title) => (
            <th key={title} role="columnheader" scope="col" className="px-3 py-1 text-left text-sm first:pl-0">
              {title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="block sm:table-row-group">
        {changes.map((change) => {
          const { attribute, isConfirmed } = change
          const [was = null, is = null] = printSides(change, printer)
          return (
            <tr key={attribute.key} role="row" className="block border-t border-rule py-2 sm:table-row sm:border-0">
              <th
                role="rowheader"
                scope="row"
                className="block text-left align-top font-semibold sm:table-cell sm:border-t sm:border-rule sm:py-2 sm:pr-3"
              >
                <span className="inline-block first-letter:uppercase">{attribute.label}</span>
                {isConfirmed && (
                  <span className="block text-sm font-normal text-ink-soft">same value, told otherwise</span>
                )}
              </th>
              {before > 0 && (
                <Side attribute={attribute} title={titles[0]} side={change.before} text={was} printer={printer} />
              )}
              <Side attribute={attribute} title={titles[1]} side={change.after} text={is} printer={printer} />
            </tr>
          )
        })}
      </tbody>
    </table>
  )
}
