import { fromCanonical, toCanonical } from '../units/convert'
import { units, type CanonicalUnit } from '../units/units'

interface UnitWord {
  /** How the unit is written in a search token: "100w", "10in". */
  readonly code: string
  readonly symbol: string
  readonly unit: CanonicalUnit
  readonly spellings: string
}

/** Longer spellings come first within the reader, so that "l/h" is not read as "l". */
const table: readonly UnitWord[] = [
  { code: 'w', symbol: 'W', unit: 'W', spellings: 'w|watts?' },
  { code: 'kw', symbol: 'kW', unit: 'W', spellings: 'kw|kilowatts?' },
  { code: 'mm', symbol: 'mm', unit: 'mm', spellings: 'mms?|milli ?met(?:er|re)s?' },
  { code: 'cm', symbol: 'cm', unit: 'mm', spellings: 'cms?|centi ?met(?:er|re)s?' },
  { code: 'in', symbol: 'in', unit: 'mm', spellings: 'in|inch|inches|"' },
  { code: 'ft', symbol: 'ft', unit: 'mm', spellings: "ft|foot|feet|'" },
  { code: 'm', symbol: 'm', unit: 'mm', spellings: 'm|met(?:er|re)s?' },
  { code: 'lph', symbol: 'L/h', unit: 'L/h', spellings: 'lph|(?:l|lit(?:er|re)s?) ?(?:/|per|an) ?(?:hr?|hour)' },
  { code: 'gph', symbol: 'gal/h', unit: 'L/h', spellings: 'gph|(?:gal|gallons?) ?(?:/|per|an) ?(?:hr?|hour)' },
  { code: 'lpd', symbol: 'L/day', unit: 'L/d', spellings: 'lpd|(?:l|lit(?:er|re)s?) ?(?:/|per|a) ?(?:d|day)' },
  { code: 'gpd', symbol: 'gal/day', unit: 'L/d', spellings: 'gpd|(?:gal|gallons?) ?(?:/|per|a) ?(?:d|day)' },
  { code: 'l', symbol: 'L', unit: 'L', spellings: 'l|ltrs?|lit(?:er|re)s?' },
  { code: 'gal', symbol: 'gal', unit: 'L', spellings: 'gals?|gallons?|us gal|us gallons?' },
  { code: 'kg', symbol: 'kg', unit: 'kg', spellings: 'kgs?|kilos?|kilograms?|kilogrammes?' },
  { code: 'lb', symbol: 'lb', unit: 'kg', spellings: 'lbs?|pounds?' },
  { code: 'v', symbol: 'V', unit: 'V', spellings: 'v|volts?|vac' },
  { code: 'a', symbol: 'A', unit: 'A', spellings: 'a|amps?|amperes?' },
  { code: 'c', symbol: '°C', unit: 'C', spellings: '° ?c|c|celsius' },
  { code: 'f', symbol: '°F', unit: 'C', spellings: '° ?f|f|fahrenheit' },
]

/** A number with its unit anywhere in plain text: the number, then one of the spellings. */
export const measurePattern = new RegExp(
  `(?<![\\p{L}\\p{N}.])(\\d+(?:\\.\\d+)?) ?-? ?(?:${table.map(({ spellings }) => `(${spellings})`).join('|')})(?![\\p{L}\\p{N}])`,
  'gu',
)

/** The table row that a match of `measurePattern` stands for, by which of its groups took part. */
export const findMatchedCode = (groups: readonly (string | undefined)[]): string | undefined =>
  table[groups.findIndex((group) => group !== undefined)]?.code

/** Fine enough to tell pieces apart, coarse enough that both unit systems meet: 254 mm and 10 in, 75.7 L and 20 gal. */
const coarsen = (value: number): number => {
  if (value >= 1000) return Number(value.toPrecision(3))
  if (value >= 10) return Math.round(value)
  return value >= 0.75 ? Math.round(value * 2) / 2 : Number(value.toPrecision(2))
}

/** How a canonical value reads in the units of both systems, as search tokens: "254mm" and "10in". */
export const writeMeasureTerms = (value: number, unit: CanonicalUnit): readonly string[] => {
  const symbols = [...new Set([units[unit].metric, units[unit].us])]
  const terms = symbols.flatMap((symbol) => {
    const word = table.find((row) => row.symbol === symbol && row.unit === unit)
    return word === undefined ? [] : [`${coarsen(fromCanonical(value, unit, symbol))}${word.code}`]
  })
  return [...new Set(terms)]
}

const tokenPattern = /^(\d+(?:\.\d+)?)([a-z]+)$/

/** "10in" and everything else that means the same: "254mm". Just the token itself where it is no measure. */
export const expandMeasure = (token: string): readonly string[] => {
  const [, digits, code] = tokenPattern.exec(token) ?? []
  const word = table.find((row) => row.code === code)
  if (digits === undefined || word === undefined) return [token]
  return [...new Set([token, ...writeMeasureTerms(toCanonical(Number(digits), word.symbol, word.unit), word.unit)])]
}

const loneUnits: ReadonlySet<string> = new Set(
  'mm cm in inch inches ft feet gal gals gallon gallons lb lbs pounds kg kgs kilos watt watts litre litres liter liters volt volts amps'.split(
    ' ',
  ),
)

/** "gallons" without its number. A single letter may be a size, as in "Lantern M", and is none. */
export const isLoneUnit = (token: string): boolean => loneUnits.has(token)
