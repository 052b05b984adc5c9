import { useEffect, useState } from 'react'
import { Form, Link, useLocation } from 'react-router-dom'
import type { GearItem } from '#shared/schemas/gear'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { spellBare } from '../../../components/setup/spell-bare'
import { readAssumed } from '../../../components/setup/assumed'
import { listItems } from '../../../components/setup/items-raw'
import { findPlan } from '../../../components/setup/find-plan'
import { useTypedTexts } from '../../../components/setup/use-typed-texts'
import { toEngineSetup } from '../../../components/setup/to-engine-setup'
import { Button } from '../../../components/ui/button'
import { ErrorSummary } from '../../../components/ui/error-summary'
import { TextField } from '../../../components/ui/text-field'
import type { Refused } from '../../../lib/problem'
import { paths } from '../../../config/paths'
import { usePrinter } from '../../../lib/use-printer'
import { useKeptAddress } from '../hooks/use-kept-address'
import { useNamedItems } from '../hooks/use-named-items'
import type { FormVisit } from '../link/read-form-visit'
import { aroundParts, chamberPart, sizePart, sumpPart } from '../model/form-sections'
import { listUnjudged, listUnread } from '../model/form-errors'
import { listAskedPaths } from '../model/item-paths'
import type { FormTexts } from './field-grid'
import { FormPartFields } from './form-part'
import { FormStep } from './form-step'
import { GearStep } from './gear-step'
import { TankStep } from './tank-step'

export interface SetupFormProps {
  readonly form: FormVisit
  /** Why the setup could not be judged, where it was sent to be. */
  readonly refused: Refused | null
  /** Whether it was sent: then what is missing altogether is said too. */
  readonly isSent: boolean
  readonly foundTanks: readonly GearItem[] | undefined
  readonly foundPieces: readonly GearItem[] | undefined
}

/** The part of the form that the address ends with takes focus: it has just been added or looked for. */
function useFragmentFocus(): void {
  const { hash } = useLocation()
  useEffect(() => {
    if (hash.length < 2) return
    const part = document.getElementById(decodeURIComponent(hash.slice(1)))
    part?.scrollIntoView({ block: 'nearest' })
    part?.focus({ preventScroll: true })
  }, [hash])
}

/** The whole setup as one plain form in four steps; it works the same without scripts. */
export function SetupForm({ form, refused, isSent, foundTanks, foundPieces }: SetupFormProps) {
  const { visit, chambers } = form
  const { raw } = visit
  const printer = usePrinter()
  const { system } = printer
  const named = useNamedItems(raw)
  const [sent] = useState<RawSetup>(() => spellBare(raw, printer))
  const { texts, onType } = useTypedTexts(sent, system)
  useKeptAddress(sent, texts, system, chambers)
  useFragmentFocus()
  const { plan, isExample } = findPlan(toEngineSetup(visit.setup, named.tank))
  const errors = [...listUnread(visit, plan, system), ...(isSent ? listUnjudged(visit, refused, plan) : [])]
  const places = plan.tank.chambers.map(({ id, name }) => ({ id, name }))
  const typed: FormTexts = {
    texts,
    onType,
    system,
    errors: new Map(
      visit.problems.flatMap(({ path, detail }): [string, string][] =>
        texts[path] === sent[path] ? [[path, detail]] : [],
      ),
    ),
    assumedOf: (path) => (isExample ? undefined : readAssumed(path, plan, printer)?.shown),
  }
  const asked = new Set([
    'name',
    'tank.gear',
    ...[sizePart, sumpPart, ...aroundParts, ...Array.from({ length: chambers }, (_, at) => chamberPart(at))].flatMap(
      ({ fields, more }) => [...fields, ...more].map(({ path }) => path),
    ),
    ...Array.from({ length: chambers }, (_, at) => `tank.chambers.${at}.id`),
    ...listItems(raw).flatMap(listAskedPaths),
  ])
  const kept = Object.entries(sent).filter(([path]) => !asked.has(path))
  return (
    <>
      <div className="mt-4">
        <ErrorSummary
          title={isSent ? 'The setup cannot be judged yet' : 'Some of what was typed could not be read'}
          errors={errors}
        />
      </div>
      <Form action={paths.setup} method="get" preventScrollReset noValidate className="mt-6 space-y-12">
        {/* Enter in any field sends the whole form, not the first button that adds something. */}
        <button type="submit" tabIndex={-1} aria-hidden="true" className="sr-only">
          Show the report
        </button>
        <input type="hidden" name="typed" value={system} />
        {kept.map(([path, text]) => (
          <input key={path} type="hidden" name={path} value={text} />
        ))}
        {chambers > 1 && <input type="hidden" name="chambers" value={chambers} />}
        <div className="max-w-md">
          <TextField
            id="field-name"
            name="name"
            label="Name of the setup"
            hint="For you and whoever you share the link with. May stay empty."
            maxLength={80}
            value={texts.name ?? ''}
            onChange={(text) => typed.onType('name', text)}
          />
        </div>
        <TankStep slug={raw['tank.gear']} tank={named.tank} findTank={form.findTank} found={foundTanks} form={typed} />
        <FormStep number={2} id="chambers" title="Chambers or sump">
          <p className="max-w-prose text-ink-soft">
            Where heater and pump stand. Leave it empty where there is neither, or where the tank above has its chambers
            recorded.
          </p>
          {Array.from({ length: chambers }, (_, at) => (
            <FormPartFields key={at} id={`chamber-${at}`} part={chamberPart(at)} form={typed}>
              {raw[`tank.chambers.${at}.id`] !== undefined && (
                <>
                  <input type="hidden" name={`tank.chambers.${at}.id`} value={raw[`tank.chambers.${at}.id`]} />
                  <Button
                    type="submit"
                    size="sm"
                    className="mt-2"
                    formAction={paths.setupNew}
                    name="dropChamber"
                    value={String(at)}
                  >
                    Take chamber {at + 1} out
                  </Button>
                </>
              )}
            </FormPartFields>
          ))}
          <Button type="submit" size="sm" formAction={paths.setupNew} name="more" value="chamber">
            Ask about another chamber
          </Button>
          <FormPartFields part={sumpPart} form={typed} />
        </FormStep>
        <FormStep number={3} id="around" title="Room, outlets and goals">
          {aroundParts.map((part) => (
            <FormPartFields key={part.title} part={part} form={typed} />
          ))}
        </FormStep>
        <GearStep raw={raw} named={named} find={form.find} found={foundPieces} chambers={places} form={typed} />
        <div className="flex flex-wrap items-center gap-4 border-t-[1.5px] border-ink pt-5">
          <Button type="submit" variant="primary">
            Show the report
          </Button>
          <p className="max-w-prose text-sm text-ink-soft">
            Nothing is stored: the setup lives in the link of its report. A{' '}
            <Link to={paths.measuringSheet} className="link">
              measuring sheet to print
            </Link>{' '}
            helps at the tank.
          </p>
        </div>
      </Form>
    </>
  )
}
