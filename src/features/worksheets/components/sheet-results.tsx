import type { ResultField } from '#shared/engine/worksheets/types'
import type { Printer } from '#shared/units/print'
import { LiveStatus } from '../../../components/ui/live-status'
import type { Sheet } from '../hooks/use-sheet'
import { sheetFieldId } from '../model/group-fields'
import { printLabel, printResult } from '../model/print-result'
import { capitalise } from '../../../lib/capitalise'

/** What came out, the first two large; or what is still to be typed. */
export function SheetResults({ sheet: shown }: { readonly sheet: Sheet }) {
  const { sheet, solved, printer } = shown
  const { working } = solved
  const [main, second, ...rest] = sheet.results
  const print = (field: ResultField) => (working ? printResult(field, working.result[field.key], printer) : '')
  const said = working && main ? `${printLabel(main, printer)}: ${print(main)}` : ''
  return (
    <section aria-labelledby="sheet-results" className="border-t-[1.5px] border-ink pt-3">
      <h2 id="sheet-results">Result</h2>
      <LiveStatus message={said} />
      {working ? (
        <>
          <dl className="mt-2 grid gap-x-8 gap-y-3 sm:grid-cols-2">
            {[main, second].map(
              (field) =>
                field && (
                  <div key={field.key} className="min-w-0">
                    <dt className="text-sm text-ink-soft">{printLabel(field, printer)}</dt>
                    <dd className="font-mono text-xl font-semibold break-words">{print(field)}</dd>
                  </div>
                ),
            )}
          </dl>
          <OtherResults fields={rest} printer={printer} print={print} />
        </>
      ) : (
        <Needed sheet={shown} />
      )}
    </section>
  )
}

interface OtherResultsProps {
  readonly fields: readonly ResultField[]
  readonly printer: Printer
  readonly print: (field: ResultField) => string
}

function OtherResults({ fields, printer, print }: OtherResultsProps) {
  if (fields.length === 0) return null
  return (
    <dl className="mt-4">
      {fields.map((field) => (
        <div key={field.key} className="flex flex-wrap justify-between gap-x-4 border-t border-rule py-1.5 text-sm">
          <dt>{printLabel(field, printer)}</dt>
          <dd className="ml-auto text-right font-mono">{print(field)}</dd>
        </div>
      ))}
    </dl>
  )
}

function Needed({ sheet: { solved } }: { readonly sheet: Sheet }) {
  const { needed, need, errors } = solved
  if (errors.size > 0) return <p className="mt-2">The marked numbers need another look; then the result stands here.</p>
  if (need !== null) return <p className="mt-2">{need}</p>
  return (
    <p className="mt-2">
      Still needed:{' '}
      {needed.map(({ path, attribute }, at) => (
        <span key={path}>
          {at > 0 && ', '}
          <a href={`#${sheetFieldId(path)}`} className="link">
            {at === 0 ? capitalise(attribute.label) : attribute.label}
          </a>
        </span>
      ))}
      .
    </p>
  )
}
