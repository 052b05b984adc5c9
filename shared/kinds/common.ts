import { choice, measure, set, text } from './build'
import type { Attribute, MeasureAttribute } from './types'

/** What names a piece. Columns of its catalogue entry rather than specs, published beside them. */
export const identityAttributes: readonly Attribute[] = [
  text('brand', 'brand', 60, {
    role: 'display',
    guide: 'The name printed on the piece or its box.',
  }),
  text('model', 'model', 100, {
    role: 'display',
    guide: 'The model as its maker writes it, with the size if it comes in sizes.',
  }),
  text('gtin', 'barcode number (GTIN)', 14, {
    role: 'display',
    guide: 'The 8, 12, 13 or 14 digits under the bars.',
  }),
  choice(
    'status',
    'status',
    {
      current: 'in production',
      discontinued: 'discontinued',
      unknown: 'not known',
    },
    {
      role: 'display',
      guide: 'Whether its maker still makes it, not whether one shop has it.',
    },
  ),
  {
    ...text('notes', 'notes', 4000, {
      role: 'display',
      guide: 'What the numbers do not say.',
    }),
    rich: true,
  },
]

/** Kinds whose pieces may be made for another sort of tank altogether. */
export const madeFor: Attribute = set(
  'madeFor',
  'made for',
  {
    reef: 'reef',
    'marine-fish': 'marine fish',
    freshwater: 'freshwater',
    plants: 'planted tanks',
  },
  { role: 'check', guide: 'What its maker says it is for.' },
)

export const plugTypes = {
  'A/B': 'A/B (North America, Japan)',
  G: 'G (British)',
  F: 'F (continental Europe)',
  I: 'I (Australia, New Zealand)',
  other: 'other',
} as const

export const mainsVolts = { 100: '100 V', 120: '120 V', 230: '230 V' } as const

/** Plugs, mains voltage and cord: everything that goes into a wall outlet. */
export const plugAttributes: readonly Attribute[] = [
  measure('plugs', 'plugs', 'count', {
    plausible: [0, 8],
    usual: [1, 2],
    role: 'check',
    better: 'less',
    guide: 'Count the mains plugs on its cords, power bricks included.',
  }),
  {
    ...set('volts', 'mains voltage', mainsVolts, {
      role: 'check',
      guide: 'Read the input line of the rating plate: 100–240 V counts as all three.',
    }),
    numeric: true,
  },
  choice('plugType', 'plug type', plugTypes, {
    role: 'check',
    guide: 'Compare the pins with the outlets of the room.',
  }),
  measure('cordMm', 'cord length', 'mm', {
    plausible: [100, 20000],
    usual: [1000, 3500],
    role: 'difference',
    better: 'more',
    guide: 'From where the cord leaves the body to the face of the plug.',
  }),
]

/** Rated power, then plugs. */
export function electricAttributes(
  plausibleW: readonly [number, number],
  usualW: readonly [number, number],
): readonly Attribute[] {
  return [powerAttribute(plausibleW, usualW), ...plugAttributes]
}

export function powerAttribute(
  plausible: readonly [number, number],
  usual: readonly [number, number],
): MeasureAttribute {
  return measure('powerW', 'power', 'W', {
    plausible,
    usual,
    role: 'check',
    guide: 'Read the rating plate; a plug-in meter at full power is better still.',
  })
}

type Range = readonly [number, number]

/** A body in three sizes: the largest plan side is its length. */
export function bodyAttributes(plausible: Range, usual: Range): readonly Attribute[] {
  return [
    measure('lengthMm', 'length', 'mm', {
      plausible,
      usual,
      role: 'check',
      guide: 'The longer side of the body seen from above, with everything that cannot be taken off.',
    }),
    measure('widthMm', 'width', 'mm', {
      plausible,
      usual,
      role: 'check',
      guide: 'The shorter side of the body seen from above, at its widest point.',
    }),
    measure('heightMm', 'height', 'mm', {
      plausible,
      usual,
      role: 'check',
      guide: 'From what it stands on to its highest fixed point.',
    }),
  ]
}

/** A rod, or a body as round: longest straight length and thickest diameter. */
export function rodAttributes(
  length: { plausible: Range; usual: Range },
  diameter: { plausible: Range; usual: Range },
  lengthGuide = 'From the lower tip to the top of the cap, without the cord.',
): readonly Attribute[] {
  return [
    measure('lengthMm', 'length', 'mm', {
      ...length,
      role: 'check',
      guide: lengthGuide,
    }),
    measure('diameterMm', 'diameter', 'mm', {
      ...diameter,
      role: 'check',
      guide: 'Calipers across the thickest part, the cap or a guard included.',
    }),
  ]
}

export function packAttribute(usual: Range, guide: string): MeasureAttribute {
  return measure('packKg', 'mass of a pack', 'kg', {
    plausible: [0.1, 1000],
    usual,
    role: 'check',
    guide,
  })
}
