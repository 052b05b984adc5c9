import { findSetupField, type SetupField } from '#shared/kinds/setup-fields'
import type { Plan } from '#shared/engine/setup/plan'
import { capitalise } from '../../lib/capitalise'

/** What a press in the drawing or list opens: one field, or a few that belong together. */
export interface EditTarget {
  readonly title: string
  readonly fields: readonly SetupField[]
  /** Place of the chamber, where it can be taken out. */
  readonly chamber?: number
}

const pick = (paths: readonly string[]): SetupField[] =>
  paths.flatMap((path) => {
    const field = findSetupField(path)
    return field ? [{ ...field, path }] : []
  })
const chamberSizes = ['lengthMm', 'widthMm', 'waterDepthMm'] as const

/** What a path stands for in the interface; `tank.chambers` adds one, `tank.size` is the outside in three. */
export function findEditTarget(path: string, plan: Plan): EditTarget | null {
  if (path === 'tank.size')
    return { title: 'Tank size', fields: pick(['tank.outerLengthMm', 'tank.outerWidthMm', 'tank.outerHeightMm']) }
  if (path === 'goals.turnoverPerHour')
    return { title: 'Turnover', fields: pick(['goals.turnoverPerHour.0', 'goals.turnoverPerHour.1']) }
  if (path === 'room') return { title: 'Room', fields: pick(['room.coldestC', 'room.temperatureC', 'room.warmestC']) }
  const words = path.split('.')
  if (words[0] === 'tank' && words[1] === 'chambers' && words.length <= 3) {
    const isNew = words[2] === undefined
    const at = isNew ? plan.tank.chambers.length : Number(words[2])
    const fields = pick(chamberSizes.map((key) => `tank.chambers.${at}.${key}`))
    const title = isNew ? 'Add a rear chamber' : capitalise(plan.tank.chambers[at]?.name ?? 'Rear chamber')
    return { title, fields, ...(!isNew && { chamber: at }) }
  }
  const fields = pick([path])
  const [field] = fields
  if (!field) return null
  const at = words[1] === 'chambers' ? Number(words[2]) : undefined
  return { title: capitalise(field.attribute.label), fields, ...(at !== undefined && { chamber: at }) }
}
