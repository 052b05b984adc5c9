import type { KindKey } from '../kinds/index'
import type { BareSpecs } from '../kinds/types'

/** Two or more numbers of a piece that go together. */
export interface Pair {
  readonly kind: KindKey
  /** The one that is questioned, then those that it is held against. */
  readonly key: string
  readonly beside: readonly string[]
  /** What the pair says in one figure, in proportion to the number in question. */
  readonly figure: (value: number, beside: readonly number[]) => number
  readonly usual: readonly [number, number]
  /** "watts for each litre of the largest tank it is rated for" */
  readonly words: string
  readonly appliesTo?: (specs: BareSpecs) => boolean
}

const divide = (value: number, [by = 1]: readonly number[]): number => value / by

/** Others hold less than the box that their outside sizes span. */
const isBox = ({ shape }: BareSpecs): boolean => shape === undefined || shape === 'rectangle' || shape === 'cube'

/** Ranges are common practice, wide enough for every believable piece; salt: 35 g/kg of seawater with its bound water. */
export const pairs: readonly Pair[] = [
  {
    kind: 'tank',
    key: 'nominalVolumeL',
    beside: ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'],
    figure: (litres, [length = 0, width = 0, height = 0]) => (litres * 1e6) / (length * width * height),
    usual: [0.7, 1.2],
    words: 'of what its outside sizes hold',
    appliesTo: isBox,
  },
  {
    kind: 'heater',
    key: 'powerW',
    beside: ['ratedVolumeMaxL'],
    figure: divide,
    usual: [0.2, 6],
    words: 'watts for each litre of the largest tank it is rated for',
  },
  {
    kind: 'light',
    key: 'photonFluxUmolS',
    beside: ['powerW'],
    figure: divide,
    usual: [0.3, 4],
    words: 'µmol/s for each watt',
  },
  {
    kind: 'salt-mix',
    key: 'packKg',
    beside: ['makesL'],
    figure: divide,
    usual: [0.028, 0.05],
    words: 'kilograms for each litre of seawater',
  },
]
