/** The unit in which a measure is stored and exchanged; a key ends with it (`lengthMm`, `flowLph`). */
export type CanonicalUnit =
  | 'mm'
  | 'm'
  | 'L'
  | 'W'
  | 'L/h'
  | 'L/d'
  | 'L/wk'
  | 'C'
  | 'K'
  | 'kg'
  | 'kg/L'
  | 'kPa'
  | 'ppt'
  | 'ppm'
  | 'dKH'
  | 'umol/m2/s'
  | 'umol/s'
  | 'V'
  | 'A'
  | 'deg'
  | 'nm'
  | 'h'
  | '/h'
  | 'count'
  | 'fraction'
  | 'ratio'

/** A code of the Unified Code for Units of Measure. */
export type UcumCode = string

export type Quantity =
  | 'length'
  | 'volume'
  | 'power'
  | 'flow'
  | 'temperature'
  | 'temperature difference'
  | 'mass'
  | 'density'
  | 'pressure'
  | 'salinity'
  | 'concentration'
  | 'hardness'
  | 'photon flux density'
  | 'photon flux'
  | 'voltage'
  | 'current'
  | 'angle'
  | 'wavelength'
  | 'duration'
  | 'turnover'
  | 'count'
  | 'fraction'
  | 'ratio'

export interface UnitFacts {
  readonly quantity: Quantity
  readonly ucum: UcumCode
  /** How many of the quantity's base unit (see `unit-names.ts`) one of this is. */
  readonly perBase: number
  /** Symbols of the units it is shown in, each a unit of the quantity in `unit-names.ts`. */
  readonly us: string
  readonly metric: string
}

const facts = (quantity: Quantity, ucum: UcumCode, us: string, metric = us, perBase = 1): UnitFacts => ({
  quantity,
  ucum,
  perBase,
  us,
  metric,
})

/**
 * UCUM 2.2 (`ucum-essence.xml`). UCUM has no degree of carbonate hardness: `{dKH}` is its annotated unity, which
 * a reader that knows no annotation takes as `1`. Counts, fractions and ratios are unity too.
 */
export const units: Readonly<Record<CanonicalUnit, UnitFacts>> = {
  mm: facts('length', 'mm', 'in', 'mm'),
  m: facts('length', 'm', 'ft', 'm', 1000),
  L: facts('volume', 'L', 'gal', 'L'),
  W: facts('power', 'W', 'W'),
  'L/h': facts('flow', 'L/h', 'gal/h', 'L/h', 168),
  'L/d': facts('flow', 'L/d', 'gal/day', 'L/day', 7),
  'L/wk': facts('flow', 'L/wk', 'gal/week', 'L/week'),
  C: facts('temperature', 'Cel', '°F', '°C'),
  K: facts('temperature difference', 'K', '°F', '°C'),
  kg: facts('mass', 'kg', 'lb', 'kg'),
  'kg/L': facts('density', 'kg/L', 'lb/gal', 'kg/L'),
  kPa: facts('pressure', 'kPa', 'psi', 'kPa'),
  ppt: facts('salinity', '[ppth]', 'ppt'),
  ppm: facts('concentration', '[ppm]', 'ppm'),
  dKH: facts('hardness', '{dKH}', 'dKH'),
  'umol/m2/s': facts('photon flux density', 'umol/(m2.s)', 'µmol/m²/s'),
  'umol/s': facts('photon flux', 'umol/s', 'µmol/s'),
  V: facts('voltage', 'V', 'V'),
  A: facts('current', 'A', 'A'),
  deg: facts('angle', 'deg', '°'),
  nm: facts('wavelength', 'nm', 'nm'),
  h: facts('duration', 'h', 'h'),
  '/h': facts('turnover', '/h', '/h'),
  count: facts('count', '1', ''),
  fraction: facts('fraction', '1', '%'),
  ratio: facts('ratio', '1', ': 1'),
}

export const canonicalUnits = Object.keys(units) as readonly CanonicalUnit[]
