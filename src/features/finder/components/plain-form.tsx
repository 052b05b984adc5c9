import { useState } from 'react'
import { Form } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { ErrorSummary } from '../../../components/ui/error-summary'
import { kindKeys, kinds } from '#shared/kinds/index'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import type { Finder } from '../hooks/use-finder'
import { countChambers, type RawSetup } from '../../../components/setup/edit-raw'
import { readAssumed } from '../../../components/setup/assumed'
import { spellBare } from '../../../components/setup/spell-bare'
import { checkField, explainProblem } from '../../../components/setup/check-field'
import { fieldId, listFieldGroups } from '../../../components/setup/field-groups'
import { FieldControl } from '../../../components/setup/field-control'
import { useTypedTexts } from '../../../components/setup/use-typed-texts'
import { HiddenFields } from './hidden-fields'

export interface PlainFormProps {
  readonly finder: Finder
}

/** Wrong texts of the link, each with the field it belongs to; one without a field is about the whole link. */
export function ProblemSummary({ finder }: PlainFormProps) {
  const { visit, printer } = finder
  const known = new Set(
    listFieldGroups(visit.state.kind, countChambers(visit.state.raw)).flatMap(({ fields }) =>
      fields.map(({ path }) => path),
    ),
  )
  return (
    <ErrorSummary
      title="Some of what was typed could not be read"
      errors={visit.problems.map((problem) => ({
        message: explainProblem(problem, printer.system),
        ...(known.has(problem.path) && { fieldId: fieldId(problem.path) }),
      }))}
    />
  )
}

/** Every field in groups, as a plain form: works without scripts, and beside the drawing with them. */
export function PlainForm({ finder }: PlainFormProps) {
  const { state, plan, printer, visit } = finder
  const { system } = printer
  const [sent] = useState<RawSetup>(() => spellBare(state.raw, printer))
  const { texts, onType } = useTypedTexts(sent, system)
  const wrong = new Set(visit.problems.map(({ path }) => path))
  const chambers = countChambers(state.raw)
  const groups = listFieldGroups(state.kind, chambers)
  const asked = new Set(groups.flatMap(({ fields }) => fields.map(({ path }) => path)))
  const kept = Object.entries(sent).filter(([path]) => !asked.has(path))
  return (
    <Form action={paths.find} method="get" preventScrollReset noValidate className="space-y-8">
      <input type="hidden" name="typed" value={system} />
      <HiddenFields state={state} without={['kind', 'setup']} />
      {kept.map(([path, text]) => (
        <input key={path} type="hidden" name={path} value={text} />
      ))}
      <div className="max-w-xs">
        <SelectField
          id="field-kind"
          name="kind"
          label="Kind of gear"
          defaultValue={state.kind}
          options={kindKeys.map((kind) => ({ value: kind, label: kinds[kind].label }))}
        />
      </div>
      {groups.map(({ title, fields }) => (
        <fieldset key={title}>
          <legend className="font-heading text-lg font-bold">{title}</legend>
          <div className="mt-2 grid gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
            {fields.map(({ path, attribute }) => {
              const text = texts[path] ?? ''
              const isAsSent = wrong.has(path) && sent[path] === text
              return (
                <FieldControl
                  key={path}
                  id={fieldId(path)}
                  path={path}
                  attribute={attribute}
                  text={text}
                  system={system}
                  onChange={(next) => onType(path, next)}
                  error={isAsSent ? checkField(text, attribute, system) : undefined}
                  assumed={readAssumed(path, plan, printer)?.shown}
                />
              )
            })}
          </div>
        </fieldset>
      ))}
      <Button type="submit" variant="primary">
        Show what fits
      </Button>
    </Form>
  )
}
