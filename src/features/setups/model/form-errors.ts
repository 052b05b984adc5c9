import { labelSetupPath } from '#shared/engine/assumptions'
import type { Plan } from '#shared/engine/setup/plan'
import { getAttribute, getKind } from '#shared/kinds/index'
import { findItemField } from '#shared/schemas/setup-link-items'
import type { SetupRequest } from '#shared/schemas/setup'
import type { UnitSystem } from '#shared/units/systems'
import type { FieldError } from '../../../components/ui/error-summary'
import { explainProblem } from '../../../components/setup/check-field'
import { fieldId } from '../../../components/setup/field-groups'
import { hasTankSize } from '../../../components/setup/has-tank-size'
import { listItems } from '../../../components/setup/items-raw'
import type { SetupVisit } from '../../../components/setup/read-setup-visit'
import type { Refused } from '../../../lib/problem'
import { capitalise } from '../../../lib/capitalise'

/** `#/setup/items/0/specs/powerW` as the link spells it: `items.heater.specs.powerW`. */
export function toLinkPath(pointer: string, { items = [] }: SetupRequest): string {
  const words = pointer.replace(/^#\/(setup\/)?/, '').split('/')
  const [section, place] = words
  if (section !== 'items') return words.join('.')
  return ['items', items[Number(place)]?.id ?? place, ...words.slice(2)].join('.')
}

/** What of a piece has a control of its own. */
const typedKeys: ReadonlySet<string> = new Set(['specs', 'quantity', 'state', 'mountHeightMm'])

/** The control of a path, or the part of the form that it is in: which piece it is was chosen, not typed. */
export function findControl(path: string): string {
  const [section, id, key] = path.split('.')
  if (section === 'items') return key !== undefined && typedKeys.has(key) ? fieldId(path) : `item-${id}`
  if (path === 'tank' || path === 'tank.gear') return fieldId('tank.volumeL')
  return fieldId(path)
}

/** What a path is called in a sentence, pieces by their kind. */
export function labelPath(path: string, visit: SetupVisit, plan: Plan): string {
  const [section, id, ...rest] = path.split('.')
  if (section !== 'items') return capitalise(labelSetupPath(path, plan))
  const kind = listItems(visit.raw).find((item) => item.id === id)?.kind ?? null
  const name = kind === null ? `piece “${id}”` : getKind(kind).label
  const key = rest[0] === 'specs' ? rest[1] : rest[0]
  const field = findItemField(rest.join('.'), kind ?? undefined)
  const label = field?.label ?? (kind !== null && key !== undefined ? getAttribute(kind, key)?.label : undefined) ?? key
  return capitalise(label === undefined || label === 'gear' ? name : `${name}, ${label}`)
}

/** What was typed and could not be read, each with the field it belongs to. */
export const listUnread = (visit: SetupVisit, plan: Plan, system: UnitSystem): readonly FieldError[] =>
  visit.problems.map((problem) => {
    const isItem = problem.path.startsWith('items.')
    const said = explainProblem(isItem ? { ...problem, path: '' } : problem, system)
    const message = isItem ? `${labelPath(problem.path, visit, plan)}: ${quote(problem.text, said)}` : said
    return problem.path === '' ? { message } : { fieldId: findControl(problem.path), message }
  })

/** What else keeps a setup that could be read from being judged. */
export function listUnjudged(visit: SetupVisit, refused: Refused | null, plan: Plan): readonly FieldError[] {
  if (refused)
    return refused.refused.map(({ pointer, detail }) => {
      const path = toLinkPath(pointer, visit.setup)
      return { fieldId: findControl(path), message: `${labelPath(path, visit, plan)}: ${detail}` }
    })
  const isTankUnread = visit.problems.some(({ path }) => path.startsWith('tank.'))
  if (hasTankSize(visit.setup) || isTankUnread) return []
  const message = 'Tank: say its volume, its outside length, width and height, or which one it is.'
  return [{ fieldId: fieldId('tank.volumeL'), message }]
}

const quote = (text: string, said: string): string => (said.includes(text) ? said : `“${text.slice(0, 60)}”. ${said}`)
