import type { UnitSystem } from './systems'
import type { CanonicalUnit, Quantity } from './units'

const examples: Readonly<Record<CanonicalUnit, string | { readonly us: string; readonly metric: string }>> = {
  mm: { us: '4 1/2 in', metric: '114 mm' },
  m: { us: '6 ft', metric: '1.8 m' },
  L: { us: '20 gal', metric: '75 L' },
  W: '100 W',
  'L/h': { us: '300 gal/h', metric: '1100 L/h' },
  'L/d': { us: '75 gal/day', metric: '280 L/day' },
  'L/wk': { us: '10 gal/week', metric: '40 L/week' },
  C: { us: '78 °F', metric: '25.5 °C' },
  K: { us: '4 °F', metric: '2 °C' },
  kg: { us: '20 lb', metric: '9 kg' },
  'kg/L': { us: '9.2 lb/gal', metric: '1.1 kg/L' },
  kPa: { us: '40 psi', metric: '280 kPa' },
  ppt: '35 ppt',
  ppm: '250 ppm',
  dKH: '8 dKH',
  'umol/m2/s': '120 µmol/m²/s',
  'umol/s': '90 µmol/s',
  V: '120 V',
  A: '15 A',
  deg: '90°',
  nm: '450 nm',
  h: '8 h',
  '/h': '8/h',
  count: '4',
  fraction: '50%',
  ratio: '3 : 1',
}

/** Something that could be typed, for placeholders and refusals. Plain spaces, as on a keyboard. */
export const describeExample = (unit: CanonicalUnit, system: UnitSystem): string => {
  const example = examples[unit]
  return typeof example === 'string' ? example : example[system]
}

/** "a length", for sentences. */
export const quantityNames: Readonly<Record<Quantity, string>> = {
  length: 'a length',
  volume: 'a volume',
  power: 'a power',
  flow: 'a flow',
  temperature: 'a temperature',
  'temperature difference': 'a temperature difference',
  mass: 'a weight',
  density: 'a density',
  pressure: 'a pressure',
  salinity: 'a salinity',
  concentration: 'a concentration',
  hardness: 'an alkalinity',
  'photon flux density': 'a light intensity (PAR)',
  'photon flux': 'a photon output',
  voltage: 'a voltage',
  current: 'a current',
  angle: 'an angle',
  wavelength: 'a wavelength',
  duration: 'a time',
  turnover: 'a turnover',
  count: 'a number',
  fraction: 'a percentage',
  ratio: 'a ratio',
}
