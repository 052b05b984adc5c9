import type { KindKey } from '../../../kinds/index'
import type { CanonicalUnit, Quantity } from '../../../units/units'
import type { Bound } from './compare-words'
import type { Dimension } from './dimension-words'

const body = {
  long: 'lengthMm',
  wide: 'widthMm',
  'front-to-back': 'widthMm',
  tall: 'heightMm',
} as const
const rod = {
  long: 'lengthMm',
  tall: 'lengthMm',
  deep: 'lengthMm',
  thick: 'diameterMm',
  across: 'diameterMm',
  wide: 'diameterMm',
} as const

/** Which attribute a length of the piece is; `long` also where no dimension is said. */
const lengthKeys: Readonly<Partial<Record<KindKey, Readonly<Partial<Record<Dimension, string>>>>>> = {
  stand: {
    long: 'topLengthMm',
    wide: 'topWidthMm',
    deep: 'topWidthMm',
    'front-to-back': 'topWidthMm',
    tall: 'heightMm',
  },
  light: body,
  'light-mount': { long: 'reachMm' },
  heater: rod,
  'return-pump': body,
  wavemaker: rod,
  skimmer: body,
  scraper: { long: 'lengthMm' },
  siphon: { long: 'tubeLengthMm' },
  net: { long: 'openingMm', wide: 'openingMm', across: 'openingMm' },
}

export const chooseLengthKey = (kind: KindKey, dimension: Dimension | undefined): string | undefined =>
  lengthKeys[kind]?.[dimension ?? 'long']

export interface PieceKey {
  readonly key: string
  readonly unit: CanonicalUnit
  /** What a number alone means: a stand that holds 200 kg may hold more. */
  readonly bound?: Bound
}

/** Which attribute another measure of the piece is. */
export const pieceKeys: Readonly<Partial<Record<KindKey, Readonly<Partial<Record<Quantity, PieceKey>>>>>> = {
  stand: { mass: { key: 'loadRatingKg', unit: 'kg', bound: 'least' } },
  light: { power: { key: 'powerW', unit: 'W' }, mass: { key: 'massKg', unit: 'kg' } },
  'light-mount': { mass: { key: 'maxLoadKg', unit: 'kg', bound: 'least' } },
  heater: { power: { key: 'powerW', unit: 'W' } },
  'temperature-controller': { power: { key: 'maxLoadW', unit: 'W', bound: 'least' } },
  'return-pump': { power: { key: 'powerW', unit: 'W' } },
  wavemaker: { power: { key: 'powerW', unit: 'W' }, flow: { key: 'flowMaxLph', unit: 'L/h' } },
  skimmer: { power: { key: 'powerW', unit: 'W' } },
  'auto-top-off': { power: { key: 'powerW', unit: 'W' } },
  sand: { mass: { key: 'packKg', unit: 'kg' } },
  'ro-unit': { flow: { key: 'membraneLpd', unit: 'L/d' } },
  'salt-mix': { mass: { key: 'packKg', unit: 'kg' } },
  'power-strip': { current: { key: 'ratedA', unit: 'A' } },
}
