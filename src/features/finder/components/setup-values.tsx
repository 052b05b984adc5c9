import { labelSetupPath } from '#shared/engine/assumptions'
import { findSetupField } from '#shared/kinds/setup-fields'
import { Disclosure } from '../../../components/ui/disclosure'
import type { Finder } from '../hooks/use-finder'
import { listAssumed } from '../../../components/setup/assumed'
import { fieldId } from '../../../components/setup/field-groups'
import { showTyped } from '../model/show-typed'
import { ValueList, type ValueLine } from '../../../components/setup/value-list'

export interface SetupValuesProps {
  readonly finder: Finder
  /** Paths that some answer rests on. */
  readonly telling: ReadonlySet<string>
  readonly onEdit: (path: string, target: Element) => void
}

const shownAtOnce = 7

const drawn =
  /^(tank\.(outer\w+Mm|wallMm|bottomMm|waterLineMm|chambers\.\d+\.(id|name|lengthMm|widthMm|waterDepthMm))|room\.(coldest|warmest|temperature)C|goals\.temperatureC)$/

/** What is drawn can be read and pressed there, and needs no second line before the rest. */
const isDrawn = (path: string): boolean => drawn.test(path)

/** What the person said, and what is assumed until they do. */
export function SetupValues({ finder, telling, onEdit }: SetupValuesProps) {
  const { state, plan, printer, given, isExample } = finder
  const hrefOf = (path: string) => `#${fieldId(path)}`
  const said = Object.entries(state.raw).flatMap(([path, text]): ValueLine[] => {
    const field = findSetupField(path)
    if (!field || !given.has(path) || isDrawn(path)) return []
    return [{ path, label: labelSetupPath(path, plan), shown: showTyped(field, text, printer), href: hrefOf(path) }]
  })
  const isTelling = telling.size > 0 ? telling : new Set(['room.coldestC', 'goals.temperatureC'])
  const assumed = listAssumed(plan, printer, isTelling)
    .filter(({ path }) => !isExample || !path.startsWith('tank.'))
    .map((one): ValueLine => ({ ...one, href: hrefOf(one.path) }))
    .toSorted((a, b) => Number(isDrawn(a.path)) - Number(isDrawn(b.path)))
  const [first, rest] = [assumed.slice(0, shownAtOnce), assumed.slice(shownAtOnce)]
  return (
    <div className="space-y-6">
      <section>
        <h2>Assumed until you say</h2>
        <ValueList lines={first} look="assumed" onEdit={onEdit} />
        {rest.length > 0 && (
          <Disclosure summary={`${rest.length} more`}>
            <ValueList lines={rest} look="assumed" onEdit={onEdit} />
          </Disclosure>
        )}
      </section>
      {said.length > 0 && (
        <section>
          <h2>Also said</h2>
          <ValueList lines={said} look="given" onEdit={onEdit} />
        </section>
      )}
    </div>
  )
}
