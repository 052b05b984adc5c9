import { Link } from 'react-router-dom'
import type { Worksheet } from '#shared/engine/worksheets/types'
import { CautionBox } from '../../../components/ui/caution-box'
import { ErrorSummary } from '../../../components/ui/error-summary'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { useLastSetup } from '../../../lib/last-setup'
import { useSheet, type Sheet } from '../hooks/use-sheet'
import { findAttribute } from '../link/spell-values'
import { groupFields, groupRows, sheetFieldId } from '../model/group-fields'
import { SheetDrawing } from './sheet-drawing'
import { SheetForm } from './sheet-form'
import { SheetResults } from './sheet-results'
import { SheetSteps } from './sheet-steps'

/** One calculation: its inputs, what comes out, drawn where that helps, and how. */
export function WorksheetPage({ sheet }: { readonly sheet: Worksheet }) {
  const shown = useSheet(sheet)
  const { solved, printer } = shown
  const { working } = solved
  return (
    <>
      <p className="text-sm print:hidden">
        <Link to={paths.worksheets} className="link">
          All worksheets
        </Link>
      </p>
      <h1 className="mt-2">{sheet.title}</h1>
      <p className="mt-2 max-w-prose">{sheet.intro}</p>
      <Start sheet={shown} />
      <SentErrors sheet={shown} />
      <div className="mt-6 grid items-start gap-x-12 gap-y-10 lg:grid-cols-2">
        <div className="order-2 min-w-0 lg:order-1">
          <SheetForm sheet={shown} />
        </div>
        <div className="order-1 min-w-0 space-y-6 lg:sticky lg:top-4 lg:order-2 print:static">
          <SheetResults sheet={shown} />
          <SheetDrawing sheet={shown} />
          {working && working.cautions.length > 0 && (
            <CautionBox title="Worth knowing.">
              <ul className="mt-1 list-disc space-y-1 pl-5">
                {working.cautions.map((caution) => (
                  <li key={caution}>{caution}</li>
                ))}
              </ul>
            </CautionBox>
          )}
        </div>
      </div>
      {working && (
        <div className="mt-12 max-w-4xl space-y-10">
          <SheetSteps sheet={sheet} working={working} printer={printer} />
          {working.assumptions.length > 0 && (
            <section aria-labelledby="sheet-assumed">
              <h2 id="sheet-assumed">Assumed until you say</h2>
              <ul className="mt-2 gap-x-8 text-sm sm:columns-2">
                {working.assumptions.map(({ key, message }) => (
                  <li key={key} className="break-inside-avoid border-t border-rule py-1.5">
                    {message}
                  </li>
                ))}
              </ul>
            </section>
          )}
        </div>
      )}
    </>
  )
}

/** Whose numbers these are, and where others come from. */
function Start({ sheet: { sheet, isExample } }: { readonly sheet: Sheet }) {
  const setup = useLastSetup()
  const path = paths.worksheet(sheet.name)
  return (
    <div className="mt-4 flex flex-wrap items-center gap-3 print:hidden">
      {isExample && (
        <p className="border-[1.5px] border-dashed border-action px-3 py-2 text-sm">
          <strong>An example.</strong> Type over any number to make it yours.
        </p>
      )}
      {setup !== null && (
        <Link to={`${path}?from=setup&${setup}`} className={buttonClass({ size: 'sm' })}>
          Fill in from my setup
        </Link>
      )}
      <Link to={`${path}?clear=yes`} className={buttonClass({ size: 'sm' })}>
        Empty the form
      </Link>
      {!isExample && (
        <Link to={path} className={buttonClass({ size: 'sm' })}>
          Show the example
        </Link>
      )}
    </div>
  )
}

/** Beside its field an error needs no name, in a list it does. */
function nameError(sheet: Worksheet, path: string, message: string): string {
  const label = findAttribute(sheet, path)?.label
  return label === undefined ? message : `${label.slice(0, 1).toUpperCase()}${label.slice(1)}: ${message}`
}

/** What is wrong, in one place, where a form was sent; while somebody types it stands beside the fields alone. */
function SentErrors({ sheet: shown }: { readonly sheet: Sheet }) {
  const { solved, sheet, texts, isTyping } = shown
  if (isTyping) return null
  const known = new Set(
    [
      ...groupFields(sheet).flatMap(({ fields }) => fields),
      ...groupRows(sheet, texts).flatMap((group) => [...group.rows.flat(), group]),
    ].map(({ path }) => path),
  )
  const errors = [...solved.errors].map(([path, message]) => ({
    message: nameError(sheet, path, message),
    ...(known.has(path) && { fieldId: sheetFieldId(path) }),
  }))
  if (errors.length === 0) return null
  return (
    <div className="mt-6">
      <ErrorSummary title="Some of these numbers cannot be right" errors={errors} />
    </div>
  )
}
