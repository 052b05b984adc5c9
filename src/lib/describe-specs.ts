import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { Printer } from '#shared/units/print'
import { printValue } from '#shared/kinds/print-value'

type BareSpecs = Readonly<Record<string, unknown>>

/** What a person asks first of each kind, in the order of a sentence; sizes and rods are put together. */
const firstKeys: Readonly<Record<KindKey, readonly string[]>> = {
  tank: ['nominalVolumeL', 'size', 'material', 'filtration'],
  stand: ['size', 'loadRatingKg', 'madeForVolumeL'],
  light: ['powerW', 'layout', 'size', 'ppfdUmol', 'control'],
  'light-mount': ['type', 'maxLoadKg', 'rimMaxMm', 'spanMaxMm'],
  'light-controller': ['controlGroup', 'channels'],
  heater: ['powerW', 'form', 'rod', 'thermostat'],
  'temperature-controller': ['maxLoadW', 'outlets', 'highAlarm'],
  'return-pump': ['powerW', 'boreMm', 'size', 'dcControl'],
  wavemaker: ['flowMaxLph', 'wallMaxMm', 'powerW'],
  skimmer: ['ratedVolumeL', 'size', 'waterDepthMaxMm', 'powerW'],
  'auto-top-off': ['reservoirL', 'pumpHeadM', 'powerW'],
  rock: ['state', 'form', 'packKg', 'bulkDensityKgL'],
  sand: ['mineral', 'grainMaxMm', 'state', 'packKg'],
  'ro-unit': ['membraneLpd', 'stages', 'wasteRatio'],
  'booster-pump': ['outletKPa', 'maxLpd', 'powerW'],
  'salinity-meter': ['method', 'scales', 'resolutionPpt'],
  'test-kit': ['parameters', 'testsEach'],
  'salt-mix': ['packKg', 'makesL', 'alkalinityDkh'],
  scraper: ['form', 'wallMaxMm', 'blades'],
  siphon: ['tubeLengthMm', 'hoseLengthMm'],
  net: ['openingMm', 'meshMm', 'handleMm'],
  'power-strip': ['outlets', 'switchedOutlets', 'ratedA', 'surgeProtected'],
}

const bodyKeys = ['lengthMm', 'widthMm', 'heightMm'] as const

function describeSize(specs: BareSpecs, printer: Printer): string | undefined {
  const keys =
    specs.outerLengthMm === undefined ? bodyKeys : (['outerLengthMm', 'outerWidthMm', 'outerHeightMm'] as const)
  const top = specs.topLengthMm === undefined ? keys : (['topLengthMm', 'topWidthMm', 'heightMm'] as const)
  const sizes = top.map((key) => specs[key])
  return sizes.every((size) => typeof size === 'number') ? printer.size(sizes) : undefined
}

function describeRod(specs: BareSpecs, printer: Printer): string | undefined {
  const { lengthMm, diameterMm } = specs
  const long = typeof lengthMm === 'number' ? `${printer.length(lengthMm)} long` : undefined
  const thick = typeof diameterMm === 'number' ? `${printer.length(diameterMm)} thick` : undefined
  return [long, thick].filter(Boolean).join(', ') || undefined
}

/** Words that say nothing without their attribute's name. */
function isBare(type: string, key: string): boolean {
  return (
    (type === 'choice' && ['thermostat', 'control', 'filtration'].includes(key)) || type === 'boolean' || type === 'set'
  )
}

/** "100 W, glass rod, 10.6 in long, 0.9 in thick, thermostat built in": one line of what is known. */
export function describeSpecs(kind: KindKey, specs: BareSpecs, printer: Printer): string {
  const parts = firstKeys[kind].map((key) => {
    if (key === 'size') return describeSize(specs, printer)
    if (key === 'rod') return describeRod(specs, printer)
    const attribute = getAttribute(kind, key)
    const value = specs[key]
    if (!attribute || value === undefined) return undefined
    const printed = printValue(attribute, value, printer)
    if (attribute.type === 'boolean') return value === true ? attribute.label : `no ${attribute.label}`
    const isNamed =
      isBare(attribute.type, key) || (attribute.type === 'measure' && !['powerW', 'nominalVolumeL'].includes(key))
    return isNamed ? `${attribute.label} ${printed}` : printed
  })
  return parts.filter((part) => part !== undefined).join(', ')
}
