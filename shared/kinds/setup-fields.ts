import { boolean, choice, measure, set, text } from './build'
import { mainsVolts, plugTypes } from './common'
import { tank } from './tank'
import type { Attribute, FieldAttribute } from './types'

/** One thing that somebody says of their setup. */
export interface SetupField {
  /** Dotted path into the setup; `*` stands for one place of a list: `tank.chambers.*.lengthMm`. */
  readonly path: string
  /** Its `key` is the last word of the path. */
  readonly attribute: FieldAttribute
}

const at = (section: string, attributes: readonly FieldAttribute[]): SetupField[] =>
  attributes.map((attribute) => ({
    path: section ? `${section}.${attribute.key}` : attribute.key,
    attribute,
  }))

function expandTank(attribute: Attribute): SetupField[] {
  if (attribute.type !== 'group') return at('tank', [attribute])
  const fields = attribute.fields.filter((field) => field.type !== 'group')
  return at(`tank.${attribute.key}${attribute.many ? '.*' : ''}`, fields)
}

const own = [
  text('name', 'name of the setup', 80, { role: 'display' }),
  choice('units', 'units', { us: 'inches, gallons, °F', metric: 'millimetres, litres, °C' }, { role: 'display' }),
  text('country', 'country', 3, {
    role: 'check',
    guide: 'Two letters, such as US or GB; it decides the mains.',
  }),
]

const tankBeyondSpecs = [
  text('gear', 'tank', 160, {
    role: 'check',
    guide: 'Your tank, if it is in the catalogue.',
  }),
  measure('volumeL', 'tank volume', 'L', {
    plausible: [2, 20000],
    usual: [15, 1200],
    role: 'check',
    guide: 'The volume it is sold by, if you do not know its size.',
  }),
]

const support = [
  choice('kind', 'stands on', { stand: 'an aquarium stand', furniture: 'furniture' }, { role: 'check' }),
  measure('lengthMm', 'support length', 'mm', {
    plausible: [100, 6000],
    usual: [280, 2500],
    role: 'check',
    guide: 'The flat surface under the tank, along the front.',
  }),
  measure('widthMm', 'support width', 'mm', {
    plausible: [100, 3000],
    usual: [250, 900],
    role: 'check',
    guide: 'The flat surface under the tank, front to back.',
  }),
]

const room = [
  measure('temperatureC', 'room temperature', 'C', {
    plausible: [-10, 50],
    usual: [17, 27],
    role: 'check',
    guide: 'A thermometer beside the tank on an ordinary day.',
  }),
  measure('coldestC', 'coldest room', 'C', {
    plausible: [-20, 45],
    usual: [12, 24],
    role: 'check',
    guide: 'The room on the coldest night of the year.',
  }),
  measure('warmestC', 'warmest room', 'C', {
    plausible: [-5, 55],
    usual: [21, 34],
    role: 'check',
    guide: 'The room on the hottest afternoon of the year.',
  }),
  measure('relativeHumidity', 'humidity', 'fraction', {
    plausible: [0, 1],
    usual: [0.25, 0.75],
    role: 'check',
    guide: 'A hygrometer in the room, away from the tank.',
  }),
  measure('ceilingMm', 'ceiling height', 'mm', {
    plausible: [500, 20000],
    usual: [2200, 3200],
    role: 'check',
    guide: 'From the floor to the ceiling above the tank.',
  }),
  measure('tankTopMm', 'height of the tank’s top edge', 'mm', {
    plausible: [100, 5000],
    usual: [900, 1700],
    role: 'check',
    guide: 'From the floor to the top edge of the tank.',
  }),
]

const mains: readonly FieldAttribute[] = [
  {
    ...choice('volts', 'mains voltage', mainsVolts, {
      role: 'check',
      guide: 'Of the room’s outlets.',
    }),
    numeric: true,
  },
  measure('circuitA', 'circuit', 'A', {
    plausible: [1, 125],
    usual: [10, 20],
    role: 'check',
    guide: 'The figure on the breaker or fuse that feeds the outlet.',
  }),
  choice('plugType', 'plug type', plugTypes, {
    role: 'check',
    guide: 'Of the room’s outlets.',
  }),
  measure('outlets', 'free wall outlets', 'count', {
    plausible: [0, 60],
    usual: [1, 6],
    role: 'check',
    guide: 'Count the free outlets within reach of the tank.',
  }),
  boolean('residualCurrentProtected', 'residual-current or ground-fault protection', {
    role: 'check',
    guide: 'Whether pressing a test button cuts the outlet.',
  }),
]

const water = [
  measure('feedKPa', 'tap pressure', 'kPa', {
    plausible: [0, 2000],
    usual: [200, 600],
    role: 'check',
    guide: 'A gauge on the tap that feeds the RO/DI unit, nothing else running.',
  }),
  measure('feedTempC', 'tap water temperature', 'C', {
    plausible: [0, 45],
    usual: [5, 25],
    role: 'check',
    guide: 'A thermometer in the stream after it has run for a minute.',
  }),
  measure('feedTdsPpm', 'tap dissolved solids', 'ppm', {
    plausible: [0, 5000],
    usual: [50, 500],
    role: 'check',
    guide: 'A TDS meter in tap water.',
  }),
  measure('litresPerWeek', 'pure water a week', 'L/wk', {
    plausible: [0, 20000],
    usual: [5, 300],
    role: 'check',
    guide: 'Water changes and top-off together.',
  }),
]

const goals: readonly FieldAttribute[] = [
  measure('temperatureC', 'water temperature', 'C', {
    plausible: [5, 40],
    usual: [23, 28],
    role: 'check',
    guide: 'The temperature that you want to hold.',
  }),
  measure('salinityPpt', 'salinity', 'ppt', {
    plausible: [0, 50],
    usual: [30, 36],
    role: 'check',
    guide: 'The salinity that you want to hold.',
  }),
  set(
    'coral',
    'corals',
    { soft: 'soft', lps: 'large-polyp stony', sps: 'small-polyp stony' },
    {
      role: 'check',
      guide: 'What you mean to keep; none of them for fish only.',
    },
  ),
  measure('sandDepthMm', 'sand depth', 'mm', {
    plausible: [0, 500],
    usual: [0, 100],
    role: 'check',
    guide: 'The depth of sand that you want, 0 for a bare bottom.',
  }),
  measure('rockKg', 'rock', 'kg', {
    plausible: [0, 3000],
    usual: [2, 150],
    role: 'check',
    guide: 'The mass of rock that you want, dry.',
  }),
  boolean('appControl', 'light set by app', { role: 'check' }),
  measure('switchedOutlets', 'switched outlets', 'count', {
    plausible: [0, 40],
    usual: [0, 8],
    role: 'check',
    guide: 'How many outlets you want to switch one by one.',
  }),
]

const turnover = (place: 0 | 1, label: string) =>
  measure(String(place), label, '/h', {
    plausible: [0.1, 200],
    usual: [3, 20],
    role: 'check',
    guide: 'How often an hour the return pump should move all the water.',
  })

/** Every input of a setup but its items, in the order in which a form asks for them. */
export const setupFields: readonly SetupField[] = [
  ...at('', own),
  ...at('tank', tankBeyondSpecs),
  ...tank.attributes.flatMap(expandTank),
  ...at('support', support),
  ...at('room', room),
  ...at('mains', mains),
  ...at('water', water),
  ...at('goals', goals),
  ...at('goals.turnoverPerHour', [turnover(0, 'least turnover'), turnover(1, 'greatest turnover')]),
]

const fieldsByPath = new Map(setupFields.map((field) => [field.path, field]))

/** The field at a dotted path, a chamber given by its place or its id; undefined where the setup has none. */
export function findSetupField(path: string): SetupField | undefined {
  if (path.includes('*')) return undefined
  const exact = fieldsByPath.get(path)
  if (exact) return exact
  const words = path.split('.')
  if (words[0] !== 'tank' || words[1] !== 'chambers' || words.length !== 4 || !words[2]) return undefined
  return fieldsByPath.get(`tank.chambers.*.${words[3]}`)
}
